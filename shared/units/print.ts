import { toShown } from './convert'
import { countDecimals, printDigits } from './digits'
import type { UnitSystem } from './systems'
import { units, type CanonicalUnit } from './units'

export interface PrintOptions {
  /** Decimals beyond the usual ones: 1 gives 114.3 mm and 77.9 °F. */
  readonly finer?: number
  /** Seven significant digits, for fields that are edited and read back. */
  readonly exact?: boolean
}

/**
 * Writes canonical values in one unit system: "4.5 in", "78 °F", "20 gal" or "114 mm", "25.6 °C", "75.7 L".
 *
 * A non-breaking space (U+00A0) stands between number and unit, none before `%`, `°` and `/h`. Minus is U+2212.
 * No thousands separators. `readMeasure` reads all of it back.
 */
export interface Printer {
  readonly system: UnitSystem
  measure(value: number, unit: CanonicalUnit, options?: PrintOptions): string
  /** The digits alone. */
  number(value: number, unit: CanonicalUnit, options?: PrintOptions): string
  unitLabel(unit: CanonicalUnit): string
  /** A difference between two values: as `measure`, but 2.2 °C of difference is 4 °F, not 36 °F. */
  difference(value: number, unit: CanonicalUnit, options?: PrintOptions): string
  /** A range: "4–12 in"; one value where both ends print alike. */
  pair(values: readonly [number, number], unit: CanonicalUnit, options?: PrintOptions): string
  /** Two values with as many decimals as it takes to tell them apart, if they differ at all. */
  apart(a: number, b: number, unit: CanonicalUnit): readonly [string, string]
  /** Millimetres in a row: "4 × 5 × 12 in". */
  size(valuesMm: readonly number[], options?: PrintOptions): string
  length(mm: number, options?: PrintOptions): string
  volume(litres: number, options?: PrintOptions): string
  temperature(celsius: number, options?: PrintOptions): string
  power(watts: number, options?: PrintOptions): string
  mass(kg: number, options?: PrintOptions): string
  /** Litres per hour. */
  flow(lph: number, options?: PrintOptions): string
}

const space = '\u00a0'
const attached: ReadonlySet<string> = new Set(['%', '°', '/h'])
const exactDigits = 7
/** Enough for 0.05 mm, under which lengths count as equal, to show in inches. */
const mostFiner = 3

/** A number and its unit as printed, the space kept from breaking. */
export const joinUnit = (digits: string, symbol: string): string =>
  symbol === '' ? digits : `${digits}${attached.has(symbol) ? '' : space}${symbol.replaceAll(' ', space)}`

const printNumber = (shown: number, symbol: string, options: PrintOptions): string => {
  if (!options.exact || shown === 0) return printDigits(shown, countDecimals(shown, symbol) + (options.finer ?? 0))
  return printDigits(shown, exactDigits - 1 - Math.floor(Math.log10(Math.abs(shown))))
}

/** A difference of temperatures has no offset, which is what kelvins are for; it is small, so tenths matter. */
const differenceUnit = (unit: CanonicalUnit): CanonicalUnit => (unit === 'C' ? 'K' : unit)

const writePrinter = (system: UnitSystem): Printer => {
  const unitLabel = (unit: CanonicalUnit) => units[unit][system]
  const number = (value: number, unit: CanonicalUnit, options: PrintOptions = {}) =>
    printNumber(toShown(value, unit, system), unitLabel(unit), options)
  const measure = (value: number, unit: CanonicalUnit, options?: PrintOptions) =>
    joinUnit(number(value, unit, options), unitLabel(unit))
  const helper = (unit: CanonicalUnit) => (value: number, options?: PrintOptions) => measure(value, unit, options)

  return {
    system,
    measure,
    number,
    unitLabel,
    difference: (value, unit, options) => measure(value, differenceUnit(unit), options),
    pair: ([low, high], unit, options) => {
      const from = number(low, unit, options)
      const to = number(high, unit, options)
      const between = from.startsWith('\u2212') || to.startsWith('\u2212') ? ' to ' : '–'
      return joinUnit(from === to ? to : `${from}${between}${to}`, unitLabel(unit))
    },
    apart: (a, b, unit) => {
      const at = (finer: number) => [measure(a, unit, { finer }), measure(b, unit, { finer })] as const
      for (let finer = 0; finer < mostFiner; finer++) {
        const printed = at(finer)
        if (printed[0] !== printed[1]) return printed
      }
      return at(a === b ? 0 : mostFiner)
    },
    size: (valuesMm, options) =>
      joinUnit(valuesMm.map((value) => number(value, 'mm', options)).join(`${space}×${space}`), unitLabel('mm')),
    length: helper('mm'),
    volume: helper('L'),
    temperature: helper('C'),
    power: helper('W'),
    mass: helper('kg'),
    flow: helper('L/h'),
  }
}

const printers: Readonly<Record<UnitSystem, Printer>> = { us: writePrinter('us'), metric: writePrinter('metric') }

export const createPrinter = (system: UnitSystem): Printer => printers[system]
