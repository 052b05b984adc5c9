import { toCanonical } from '../../units/convert'
import type { NamedUnit } from '../../units/unit-names'
import type { CanonicalUnit, Quantity } from '../../units/units'
import type { Token } from './token'
import { isPartOfName } from './tokens'
import { readUnit } from './units-in-text'

/** A number and its unit, if it has one: "4 1/2 in", "1' 6\"", "300". */
export interface Amount {
  readonly quantity: Quantity | undefined
  readonly parts: readonly { readonly value: number; readonly unit: NamedUnit | undefined }[]
  readonly from: number
  readonly to: number
}

/** Whoever writes gallons or pounds groups thousands with commas; with litres a comma may stand for either. */
const customary: ReadonlySet<string> = new Set(['in', 'ft', 'gal', 'gal/h', 'gal/day', 'gal/week', 'lb', '°F', 'psi'])

const valueOf = (token: Token, unit: NamedUnit | undefined): number | undefined => {
  if (token.grouped === undefined) return token.value
  const isSure = token.text.includes('.') || token.text.split(',').length > 2
  if (isSure || (unit !== undefined && customary.has(unit.symbol))) return token.grouped
  return token.value
}

/** A hyphen between number and unit, as in "20-gallon", is no part of either. */
const skipHyphen = (tokens: readonly Token[], at: number): number =>
  tokens[at]?.text === '-' && tokens[at]?.glued && tokens[at + 1]?.glued && tokens[at + 1]?.type === 'word'
    ? at + 1
    : at

/** The inches of "2 ft 3 in". */
const readSmaller = (tokens: readonly Token[], large: Amount): Amount => {
  const { unit } = large.parts[0] ?? {}
  const number = tokens[large.to]
  if (unit?.then === undefined || number?.type !== 'number' || number.value === undefined) return large
  const found = readUnit(tokens, large.to + 1)
  if (found?.unit?.symbol !== unit.then || found.quantity !== large.quantity) return large
  return { ...large, parts: [...large.parts, { value: number.value, unit: found.unit }], to: found.to }
}

export const readAmount = (tokens: readonly Token[], at: number): Amount | undefined => {
  const number = tokens[at]
  if (number?.type !== 'number' || isPartOfName(tokens, at)) return undefined
  const found = readUnit(tokens, skipHyphen(tokens, at + 1))
  const size = valueOf(number, found?.unit)
  if (size === undefined) return undefined
  const value = number.isNegative === true && found?.quantity === 'temperature' ? -size : size
  const to = found?.to ?? at + 1
  return readSmaller(tokens, {
    quantity: found?.quantity,
    parts: [{ value, unit: found?.unit }],
    from: at,
    to,
  })
}

/** The amount with a unit for numbers that have none. */
export const withUnit = (amount: Amount, quantity: Quantity, unit: NamedUnit): Amount => ({
  ...amount,
  quantity,
  parts: amount.parts.map((part) => ({ value: part.value, unit: part.unit ?? unit })),
})

/** Canonical value of an amount whose parts all have units of that quantity. */
export const amountIn = (amount: Amount, unit: CanonicalUnit): number => {
  const sum = amount.parts.reduce((total, part) => total + toCanonical(part.value, part.unit?.symbol ?? '', unit), 0)
  return Number(sum.toPrecision(14))
}

/** Enough for what is typed, without the noise of binary fractions. */
const digits = { shown: 6, written: 12 } as const

const attached: ReadonlySet<string> = new Set(['%', '/h'])

const print = (amount: Amount, precision: number, hasUnit: boolean): string =>
  amount.parts
    .map(({ value, unit }) => {
      const number = String(Number(value.toPrecision(precision)))
      if (!hasUnit || unit === undefined) return number
      return attached.has(unit.symbol) ? `${number}${unit.symbol}` : `${number} ${unit.symbol}`
    })
    .join(' ')

/** "4.5 in"; the unit may be left to the last of a row. */
export const printAmount = (amount: Amount, hasUnit = true): string => print(amount, digits.shown, hasUnit)

/** The same for a setup link: every digit that was typed. */
export const writeAmount = (amount: Amount): string => print(amount, digits.written, true)

/** A bare number as an amount of a unit. */
export const createAmount = (value: number, quantity: Quantity, unit: NamedUnit | undefined): Amount => ({
  quantity,
  parts: [{ value, unit }],
  from: 0,
  to: 0,
})
