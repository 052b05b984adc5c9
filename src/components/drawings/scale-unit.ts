import { canonicalUnits, units, type CanonicalUnit } from '#shared/units/units'

/** The canonical unit that a scale or check speaks of by its name or its UCUM code. Unknown codes count as plain numbers. */
export function findScaleUnit(code: string | null): CanonicalUnit {
  return (
    canonicalUnits.find((unit) => unit === code) ?? canonicalUnits.find((unit) => units[unit].ucum === code) ?? 'count'
  )
}
