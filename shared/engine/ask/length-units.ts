import { findShownUnit } from '../../units/convert'
import { namedUnits, type NamedUnit } from '../../units/unit-names'
import type { UnitSystem } from '../../units/systems'
import { withUnit, type Amount } from './amounts'
import type { Measure } from './measures'
import type { Reading } from './reading'

const centimetre = namedUnits.length.find((unit) => unit.symbol === 'cm')
const millimetre = namedUnits.length.find((unit) => unit.symbol === 'mm')
/** A tank of 150 in and more is rare, of 150 mm is none; likewise a chamber of 50 in and of 50 mm. */
const largestBare = { tank: 150, chamber: 50 } as const

/** Of numbers without any unit: the system's, or what leaves a believable size. */
const guessUnit = (largest: number, system: UnitSystem, of: 'tank' | 'chamber'): NamedUnit => {
  const shown = findShownUnit('mm', system)
  if (largest > largestBare[of]) return millimetre ?? shown
  return system === 'metric' ? (centimetre ?? shown) : shown
}

export interface Lengths {
  readonly amounts: readonly Amount[]
  /** No unit was typed anywhere near. */
  readonly isGuessed: boolean
}

/** The unit of the last length with one before a measure, else of the next after it. */
const borrowUnit = ({ measures, placeOf }: Reading, measure: Measure): NamedUnit | undefined => {
  const place = placeOf.get(measure) ?? 0
  const unitOf = (other: Measure) => other.amounts.find(({ quantity }) => quantity === 'length')?.parts.at(-1)?.unit
  const isLength = (other: Measure) => unitOf(other) !== undefined
  const borrowed =
    measures.slice(Math.max(0, place - 3), place).findLast(isLength) ??
    measures.slice(place + 1, place + 3).find(isLength)
  return borrowed === undefined ? undefined : unitOf(borrowed)
}

/**
 * Gives every number of a measure a unit of length. In a row, one without takes that of the next that has one, else of
 * the last before it (as `readSize` does); a lone bare number takes its neighbours'.
 */
export const giveUnits = (reading: Reading, measure: Measure, of: 'tank' | 'chamber'): Lengths => {
  const units = measure.amounts.map((amount) => (amount.quantity === 'length' ? amount.parts.at(-1)?.unit : undefined))
  const largest = Math.max(...measure.amounts.map((amount) => amount.parts[0]?.value ?? 0))
  const borrowed = measure.shape === 'size' ? undefined : borrowUnit(reading, measure)
  const fallback = borrowed ?? guessUnit(largest, reading.system, of)
  const amounts = measure.amounts.map((amount, index) => {
    const later = units.slice(index).find((unit) => unit !== undefined)
    const earlier = units.slice(0, index).findLast((unit) => unit !== undefined)
    return withUnit(amount, 'length', later ?? earlier ?? fallback)
  })
  return { amounts, isGuessed: borrowed === undefined && units.every((unit) => unit === undefined) }
}

/** "4 × 5 × 12 in", each with its unit where they differ. */
export const isOneUnit = (amounts: readonly Amount[]): boolean =>
  new Set(amounts.flatMap(({ parts }) => parts.map(({ unit }) => unit?.symbol))).size === 1
