import type { Draft } from './draft'
import type { Token } from './token'
import { readUnit } from './units-in-text'
import { stopWords, vagueSizes } from './words/stop-words'

const most = 20

/** "small" adds nothing to a chamber or tank whose size was read. */
const hasSize = ({ fields }: Draft): boolean =>
  Object.keys(fields).some((path) => path.endsWith('Mm') || path === 'tank.volumeL')

/** The letter of "6500K" and "T-90". */
const isInName = (tokens: readonly Token[], at: number): boolean =>
  tokens[at]?.glued === true || (tokens[at + 1]?.glued === true && tokens[at + 1]?.type !== 'stop')

/** A number that was not used keeps its unit beside it: "1,500 l". */
const lastOfUnit = (tokens: readonly Token[], at: number): number => (readUnit(tokens, at + 1)?.to ?? at + 1) - 1

/** Stretches that seem to matter and that nobody used, as typed. */
export const findLeftovers = (text: string, tokens: readonly Token[], draft: Draft): readonly string[] => {
  const isVague = hasSize(draft)
  const matters = (token: Token, at: number): boolean => {
    if (draft.isUsed(at) || token.type === 'stop' || token.type === 'sign') return false
    if (token.spelled === true) return token.value !== undefined && token.value > 1
    return (
      !stopWords.has(token.text) &&
      !(isVague && vagueSizes.has(token.text)) &&
      (token.text.length > 1 || token.type === 'number' || isInName(tokens, at))
    )
  }
  const stretches: { start: number; end: number; last: number }[] = []
  tokens.forEach((token, at) => {
    if (!matters(token, at)) return
    const open = stretches.at(-1)
    const between = open === undefined ? undefined : tokens.slice(open.last + 1, at)
    const joins =
      between?.every(
        (each, offset) => (each.type === 'sign' || each.text === 'x') && !draft.isUsed((open?.last ?? 0) + 1 + offset),
      ) ?? false
    const last = token.type === 'number' ? lastOfUnit(tokens, at) : at
    const end = tokens[last]?.end ?? token.end
    if (open !== undefined && at <= open.last) return
    if (open !== undefined && joins) Object.assign(open, { end, last })
    else stretches.push({ start: token.start, end, last })
  })
  return [...new Set(stretches.map(({ start, end }) => text.slice(start, end)))].slice(0, most)
}
