import { normaliseTyped } from './normalise'
import { namedUnits, type NamedUnit } from './unit-names'
import type { Quantity } from './units'

const keyOf = (typed: string): string =>
  normaliseTyped(typed)
    .replace(/ ?\bper\b ?/g, '/')
    .replace(/ an? (?=minute|hour|day|week)/g, '/')
    .replace(/[\s.^·⋅()]/g, '')

const quantities = Object.keys(namedUnits) as Quantity[]

const unitsByKey = new Map(
  quantities.map((quantity) => [
    quantity,
    new Map(
      namedUnits[quantity].flatMap((unit) => [unit.symbol, ...unit.spellings].map((name) => [keyOf(name), unit])),
    ),
  ]),
)

/** The unit of this quantity that is written so, whatever its case, spacing and full stops. */
export const lookUpUnit = (typed: string, quantity: Quantity): NamedUnit | undefined =>
  typed.trimStart().startsWith('^') ? undefined : unitsByKey.get(quantity)?.get(keyOf(typed))

/** The first quantity that knows the unit: what somebody seems to have meant instead. */
export const findQuantityOf = (typed: string): Quantity | undefined =>
  quantities.find((quantity) => lookUpUnit(typed, quantity) !== undefined)
