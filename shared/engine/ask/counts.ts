import { findBound } from './cues'
import type { Measure } from './measures'
import { indexPhrases, matchAt } from './phrases'
import type { Reading } from './reading'

const outletWords = 'outlet, socket, plug, way, gang, receptacle, port'
const outlets = indexPhrases<'plain' | 'wall' | 'switched'>([
  ...outletWords.split(', ').map((word) => [word, 'plain'] as const),
  ...['switched', 'switchable', 'controllable'].flatMap(
    (word) =>
      [
        [`${word} outlet`, 'switched'],
        [`${word} socket`, 'switched'],
      ] as const,
  ),
  ...['free', 'wall', 'free wall', 'spare'].flatMap(
    (word) =>
      [
        [`${word} outlet`, 'wall'],
        [`${word} socket`, 'wall'],
      ] as const,
  ),
])
const owning: ReadonlySet<string> = new Set(['has', 'have', 'had', 'got'])
const hasOutlets: ReadonlySet<string | null> = new Set(['power-strip', 'temperature-controller'])

/** "mine only has 4 outlets" asks for other than 4. */
const isOwned = ({ tokens }: Reading, measure: Measure): boolean =>
  [1, 2].some((back) => owning.has(tokens[measure.from - back]?.text ?? ''))

/** Reads "8 outlets", "4 switched outlets", "2 free wall outlets". */
export const readOutlets = (reading: Reading, measure: Measure): boolean => {
  const { tokens, draft, kind } = reading
  const amount = measure.amounts.at(-1)
  const isBare = measure.shape === 'single' && amount?.quantity === undefined
  const at = tokens[measure.to]?.text === '-' ? measure.to + 1 : measure.to
  const mention = isBare ? matchAt(outlets, tokens, at) : undefined
  const count = amount?.parts[0]?.value
  if (mention === undefined || count === undefined || !Number.isInteger(count)) return false
  const isOfPiece = hasOutlets.has(kind) && mention.means !== 'wall'
  if (isOfPiece && isOwned(reading, measure)) return false
  const bound = findBound(reading, measure)
  const cues = bound === undefined ? [mention] : [mention, bound]
  if (isOfPiece && !(mention.means === 'switched' && kind !== 'power-strip')) {
    const key = mention.means === 'switched' ? 'switchedOutlets' : 'outlets'
    if (!draft.setFilter(key, bound?.means === 'most' ? [null, count] : [count, null])) return false
    draft.note(
      {
        meaning: `${bound?.means === 'most' ? 'at most' : 'at least'} ${count} ${mention.means === 'switched' ? 'switched ' : ''}outlets`,
      },
      measure,
      ...cues,
    )
    return true
  }
  const path = mention.means === 'switched' ? 'goals.switchedOutlets' : 'mains.outlets'
  if (!draft.setField(path, count, String(count))) return false
  draft.note(
    { meaning: `${count} ${mention.means === 'switched' ? 'switched outlets' : 'free wall outlets'}`, path },
    measure,
    ...cues,
  )
  return true
}
