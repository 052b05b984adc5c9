import { namedUnits, type NamedUnit } from './unit-names'
import { units, type CanonicalUnit } from './units'
import type { UnitSystem } from './systems'

/** The unit of the canonical unit's quantity that has this symbol (`in` for `mm`, `°F` for `C`), if it has one. */
export const findNamedUnit = (symbol: string, unit: CanonicalUnit): NamedUnit | undefined =>
  namedUnits[units[unit].quantity].find((named) => named.symbol === symbol)

const requireNamedUnit = (symbol: string, unit: CanonicalUnit): NamedUnit => {
  const named = findNamedUnit(symbol, unit)
  if (named === undefined) throw new RangeError(`"${symbol}" is not a unit of ${units[unit].quantity}`)
  return named
}

/** Fourteen digits: rid of binary noise, so that 1.5 in is 38.1 mm and not 38.099999999999994. */
const clean = (value: number): number => Number(value.toPrecision(14))

/** `toCanonical(4.5, 'in', 'mm')` is 114.3. Throws a RangeError for a symbol of another quantity. */
export const toCanonical = (value: number, symbol: string, unit: CanonicalUnit): number => {
  const named = requireNamedUnit(symbol, unit)
  return clean(((value + (named.offset ?? 0)) * named.factor) / units[unit].perBase)
}

/** `fromCanonical(114.3, 'mm', 'in')` is 4.5. Throws a RangeError for a symbol of another quantity. */
export const fromCanonical = (value: number, unit: CanonicalUnit, symbol: string): number => {
  const named = requireNamedUnit(symbol, unit)
  return clean((value * units[unit].perBase) / named.factor - (named.offset ?? 0))
}

/** The unit that this system shows, and that a bare number takes. */
export const findShownUnit = (unit: CanonicalUnit, system: UnitSystem): NamedUnit =>
  requireNamedUnit(units[unit][system], unit)

/** The number that a person of this system reads: 114.3 mm is 4.5 in `us`. */
export const toShown = (value: number, unit: CanonicalUnit, system: UnitSystem): number =>
  fromCanonical(value, unit, units[unit][system])

/** The canonical value of a number in the unit that this system shows. */
export const fromShown = (value: number, unit: CanonicalUnit, system: UnitSystem): number =>
  toCanonical(value, units[unit][system], unit)
