import { findShownUnit, toCanonical } from './convert'
import { describeExample, quantityNames } from './examples'
import { longestTyped, normaliseTyped } from './normalise'
import { createPrinter, joinUnit } from './print'
import { refuse, type Refusal } from './read-number'
import { readParts, type Parts } from './read-parts'
import { findQuantityOf } from './read-unit'
import { unitSystems, type UnitSystem } from './systems'
import { units, type CanonicalUnit } from './units'

export interface Reading {
  readonly ok: true
  /** In the canonical unit asked for. */
  readonly value: number
  /** Symbol of the unit it was read in: "in", or "ft in" for two. */
  readonly unitRead: string
  /** No unit was typed; the system's own was taken. */
  readonly assumedUnit: boolean
  /** As understood, then in the units of both systems: "4 1/2 in = 114.3 mm" (U+00A0 before units). */
  readonly echo: string
}

/** Far past anything in a room, well inside what prints without an exponent. */
const largest = 1e9

const explainUnknownUnit = (typed: string, unknown: string, unit: CanonicalUnit, system: UnitSystem): Refusal => {
  const expected = quantityNames[units[unit].quantity]
  const meant = findQuantityOf(unknown)
  const example = describeExample(unit, system)
  return meant === undefined
    ? refuse(`"${unknown}" is not a known unit here; ${expected} is expected, such as ${example}.`)
    : refuse(`"${typed}" is ${quantityNames[meant]}; ${expected} is expected, such as ${example}.`)
}

const describeReading = (
  parts: Parts['parts'],
  sign: string,
  value: number,
  unit: CanonicalUnit,
  system: UnitSystem,
) => {
  const typed = sign + parts.map((part) => joinUnit(part.written, part.unit.symbol)).join(' ')
  const ownFirst = unitSystems.toSorted((a, b) => Number(b === system) - Number(a === system))
  const others = ownFirst
    .filter((each) => parts.length > 1 || parts[0]?.unit.symbol !== units[unit][each])
    .map((each) => createPrinter(each).measure(value, unit, { finer: 1 }))
  return [...new Set([typed, ...others])].join(' = ')
}

/**
 * Reads a measure as people type it: `4 1/2"`, `1' 6"`, `30cm`, `20 gallons`, `78F`, `25,5 C`, `2.8 bar`, `50%`.
 * Never throws. Refused with a reason: another quantity's unit, thousands separators, ranges, negatives other than
 * temperatures, broken counts, and a bare share up to 1 (is 0.5 a half, or half a percent?).
 */
export const readMeasure = (text: string, unit: CanonicalUnit, system: UnitSystem): Reading | Refusal => {
  const { quantity } = units[unit]
  const such = `${quantityNames[quantity]} is expected, such as ${describeExample(unit, system)}.`
  const normal = text.length > longestTyped ? text : normaliseTyped(text)
  if (normal.length > longestTyped) return refuse(`This is too long; ${such}`)
  if (normal === '') return refuse(`Nothing was typed; ${such}`)
  if (!/\d/.test(normal)) return refuse(`"${text.trim()}" has no number; ${such}`)

  const read = readParts(normal.replace(/^[-+] ?/, ''), quantity, findShownUnit(unit, system))
  if (!read.ok) {
    if (read.unknownUnit !== undefined) {
      return explainUnknownUnit(text.trim(), read.unknownUnit.replaceAll('^', ''), unit, system)
    }
    return refuse(read.reason)
  }
  const isNegative = normal.startsWith('-') && read.parts.some((part) => part.value !== 0)
  if (isNegative && !quantity.startsWith('temperature')) return refuse(`This cannot be negative; ${such}`)

  const sign = isNegative ? -1 : 1
  const amounts = read.parts.map((part) => toCanonical(sign * part.value, part.unit.symbol, unit))
  const value = Number(amounts.reduce((sum, amount) => sum + amount, 0).toPrecision(14)) + 0
  if (Math.abs(value) > largest) return refuse(`This number is too large; ${such}`)
  if (quantity === 'count' && !Number.isInteger(value)) return refuse('A count is a whole number, such as 4.')
  if (quantity === 'fraction' && read.assumedUnit && value > 0 && value <= 0.01) {
    return refuse('This can be read two ways: write 50% for a half, 0.5% for half of one percent.')
  }
  return {
    ok: true,
    value,
    unitRead: read.parts.map((part) => part.unit.symbol).join(' '),
    assumedUnit: read.assumedUnit,
    echo: describeReading(read.parts, isNegative ? '\u2212' : '', value, unit, system),
  }
}
