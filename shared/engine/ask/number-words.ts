import type { Token } from './token'

const ones =
  'one two three four five six seven eight nine ten eleven twelve thirteen fourteen fifteen sixteen seventeen eighteen nineteen'
const tens = 'twenty thirty forty fifty sixty seventy eighty ninety'
const shares: ReadonlyMap<string, number> = new Map([
  ['half', 0.5],
  ['quarter', 0.25],
])

const values = new Map([
  ...ones.split(' ').map((word, index) => [word, index + 1] as const),
  ...tens.split(' ').map((word, index) => [word, (index + 2) * 10] as const),
  ['fourty', 40] as const,
])

interface Found {
  readonly value: number
  /** Index of the last token used. */
  readonly last: number
}

const readBelowHundred = (tokens: readonly Token[], at: number): Found | undefined => {
  const value = values.get(tokens[at]?.text ?? '')
  if (value === undefined) return undefined
  const unit = values.get(tokens[at + 1]?.text ?? '')
  return value >= 20 && unit !== undefined && unit < 10 ? { value: value + unit, last: at + 1 } : { value, last: at }
}

const readWhole = (tokens: readonly Token[], at: number): Found | undefined => {
  const isHundred = (index: number) => tokens[index]?.text === 'hundred'
  const first: Found | undefined = isHundred(at) ? { value: 1, last: at - 1 } : readBelowHundred(tokens, at)
  if (first === undefined || !isHundred(first.last + 1)) return first
  const hundreds = { value: first.value * 100, last: first.last + 1 }
  const afterAnd = tokens[hundreds.last + 1]?.text === 'and' ? hundreds.last + 2 : hundreds.last + 1
  const rest = readBelowHundred(tokens, afterAnd)
  return rest === undefined ? hundreds : { value: hundreds.value + rest.value, last: rest.last }
}

/** "half an inch", "quarter inch". */
const readShare = (tokens: readonly Token[], at: number): Found | undefined => {
  const value = shares.get(tokens[at]?.text ?? '')
  if (value === undefined) return undefined
  const article = tokens[at + 1]?.text
  return { value, last: article === 'an' || article === 'a' ? at + 1 : at }
}

/** "four and a half". */
const addShare = (tokens: readonly Token[], whole: Found): Found => {
  const at = whole.last + 1
  if (tokens[at]?.text !== 'and' || tokens[at + 1]?.text !== 'a') return whole
  const share = shares.get(tokens[at + 2]?.text ?? '')
  return share === undefined ? whole : { value: whole.value + share, last: at + 2 }
}

const readAt = (tokens: readonly Token[], at: number): Found | undefined => {
  const whole = readWhole(tokens, at)
  return whole === undefined ? readShare(tokens, at) : addShare(tokens, whole)
}

/** Puts one number in place of "seventy five" or "four and a half". */
export const joinNumberWords = (tokens: readonly Token[]): readonly Token[] => {
  const joined: Token[] = []
  for (let at = 0; at < tokens.length; at++) {
    const token = tokens[at]
    if (token === undefined) break
    const found = token.type === 'word' ? readAt(tokens, at) : undefined
    if (found === undefined) joined.push(token)
    else {
      const end = tokens[found.last]?.end ?? token.end
      joined.push({ ...token, type: 'number', text: String(found.value), end, value: found.value, spelled: true })
      at = found.last
    }
  }
  return joined
}
