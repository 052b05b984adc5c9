import { printDigits } from '../../units/digits'
import { joinUnit, type Printer } from '../../units/print'
import { canonicalUnits, units, type CanonicalUnit, type UcumCode } from '../../units/units'

/** Units of formulas that nobody types: shown alike in both systems. °Brix is no unit of UCUM: annotated unity. */
const plainUnits = {
  number: { ucum: '1', symbol: '' },
  'kg/m3': { ucum: 'kg/m3', symbol: 'kg/m³' },
  'mS/cm': { ucum: 'mS/cm', symbol: 'mS/cm' },
  Brix: { ucum: '{Brix}', symbol: '°Brix' },
  m2: { ucum: 'm2', symbol: 'm²' },
  'MJ/K': { ucum: 'MJ/K', symbol: 'MJ/K' },
  'kg/(m2.h)': { ucum: 'kg/(m2.h)', symbol: 'kg/(m² h)' },
  'm/s': { ucum: 'm/s', symbol: 'm/s' },
} as const

export type StepUnit = CanonicalUnit | keyof typeof plainUnits

const isCanonical = (unit: StepUnit): unit is CanonicalUnit => canonicalUnits.some((known) => known === unit)

export const toUcum = (unit: StepUnit): UcumCode => (isCanonical(unit) ? units[unit].ucum : plainUnits[unit].ucum)

/** Digits that are shown of a number inside a formula. */
const usualDigits = 4

/** A number as it stands in a formula: so many significant digits, all of its whole ones. */
export function put(value: number, digits = usualDigits): string {
  const size = value === 0 ? 0 : Math.floor(Math.log10(Math.abs(value)))
  return printDigits(value, Math.max(0, digits - 1 - size))
}

/** A value of a worksheet in the reader's units; `decimals` where a formula's own unit has a usual precision. */
export function printQuantity(value: number, unit: StepUnit, words: Printer, decimals?: number): string {
  if (isCanonical(unit)) return words.measure(value, unit)
  const digits = decimals === undefined ? put(value) : printDigits(value, decimals)
  return joinUnit(digits, plainUnits[unit].symbol)
}

/** The same in the formula's own unit, whatever the reader's are. */
export function printFormulaValue(value: number, unit: StepUnit, decimals?: number): string {
  const symbol = isCanonical(unit) ? units[unit].metric : plainUnits[unit].symbol
  const shown = unit === 'fraction' ? value * 100 : value
  return joinUnit(decimals === undefined ? put(shown) : printDigits(shown, decimals), symbol)
}
