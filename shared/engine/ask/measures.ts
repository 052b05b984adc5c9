import type { NamedUnit } from '../../units/unit-names'
import type { Quantity } from '../../units/units'
import { readAmount, withUnit, type Amount } from './amounts'
import { dimensionLetters, dimensionOf, type Dimension } from './words/dimension-words'
import type { Token } from './token'

/** One number, two ends of a range, or two or three lengths in a row. */
export interface Measure {
  readonly shape: 'single' | 'range' | 'size'
  readonly amounts: readonly Amount[]
  /** Of a size, what each length was called: "24L x 18W x 20H". */
  readonly labels: readonly (Dimension | undefined)[]
  readonly from: number
  readonly to: number
}

const separators: ReadonlySet<string> = new Set(['x', '×', '*', 'by'])
const longestSize = 3

const isSeparator = (tokens: readonly Token[], at: number): boolean =>
  separators.has(tokens[at]?.text ?? '') && tokens[at + 1]?.type === 'number'

/** "24L" in a row of lengths is a length called so, not 24 litres. */
const readLabelled = (
  tokens: readonly Token[],
  at: number,
  isLater: boolean,
): { amount: Amount; label?: Dimension; to: number } | undefined => {
  const amount = readAmount(tokens, at)
  if (amount === undefined) return undefined
  const letter = dimensionLetters.get(tokens[at + 1]?.text ?? '')
  if (letter !== undefined && (isSeparator(tokens, at + 2) || isLater)) {
    const bare = {
      ...amount,
      quantity: undefined,
      parts: amount.parts.slice(0, 1).map(({ value }) => ({ value, unit: undefined })),
    }
    return { amount: { ...bare, to: at + 1 }, label: letter, to: at + 2 }
  }
  const word = tokens[amount.to]?.text ?? ''
  const label = dimensionLetters.get(word) ?? dimensionOf.get(word)
  const isLabelled = label !== undefined && (isSeparator(tokens, amount.to + 1) || isLater)
  return isLabelled ? { amount, label, to: amount.to + 1 } : { amount, to: amount.to }
}

const readSize = (tokens: readonly Token[], at: number): Measure | undefined => {
  const amounts: Amount[] = []
  const labels: (Dimension | undefined)[] = []
  let next = at
  for (;;) {
    const read = readLabelled(tokens, next, amounts.length > 0)
    const { quantity } = read?.amount ?? {}
    if (read === undefined || (quantity !== undefined && quantity !== 'length')) return undefined
    amounts.push(read.amount)
    labels.push(read.label)
    if (amounts.length === longestSize || !isSeparator(tokens, read.to)) {
      return amounts.length > 1 ? { shape: 'size', amounts, labels, from: at, to: read.to } : undefined
    }
    next = read.to + 1
  }
}

const isRangeSign = (tokens: readonly Token[], at: number, from: number): boolean => {
  const text = tokens[at]?.text
  if (text === 'and' || text === '&') return tokens[from - 1]?.text === 'between'
  return text === '-' || text === 'to' || text === 'through'
}

/** "100-150 watts", "between 8 and 10 inches": one unit serves both ends. */
const readRange = (tokens: readonly Token[], low: Amount): Measure | undefined => {
  if (!isRangeSign(tokens, low.to, low.from)) return undefined
  const high = readAmount(tokens, low.to + 1)
  if (high === undefined || isSeparator(tokens, high.to)) return undefined
  const lowUnit = low.parts[0]?.unit
  const highUnit = high.parts[0]?.unit
  if (low.quantity !== undefined && high.quantity !== undefined && low.quantity !== high.quantity) return undefined
  const share = (amount: Amount, quantity: Quantity | undefined, unit: NamedUnit | undefined) =>
    quantity === undefined ? amount : unit === undefined ? { ...amount, quantity } : withUnit(amount, quantity, unit)
  const amounts = [
    share(low, high.quantity ?? low.quantity, highUnit),
    share(high, low.quantity ?? high.quantity, lowUnit),
  ]
  return { shape: 'range', amounts, labels: [], from: low.from, to: high.to }
}

/** Every number of the text that is not part of a name, from left to right. */
export const findMeasures = (tokens: readonly Token[]): readonly Measure[] => {
  const measures: Measure[] = []
  for (let at = 0; at < tokens.length; at++) {
    const amount = readAmount(tokens, at)
    if (amount === undefined) continue
    const measure: Measure = readSize(tokens, at) ??
      readRange(tokens, amount) ?? { shape: 'single', amounts: [amount], labels: [], from: at, to: amount.to }
    measures.push(measure)
    at = measure.to - 1
  }
  return measures
}
