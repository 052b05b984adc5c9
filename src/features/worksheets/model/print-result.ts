import { printFormulaValue, printQuantity } from '#shared/engine/worksheets/quantities'
import type { ResultField, Step } from '#shared/engine/worksheets/types'
import type { Printer } from '#shared/units/print'

const words: Readonly<Record<string, string>> = {
  upright: 'stands upright',
  leaning: 'leans',
  flat: 'lies flat',
  none: 'does not fit',
}

/** Temperatures inside a label are the reader's too. */
export const printLabel = ({ key, label }: ResultField, printer: Printer): string =>
  key.startsWith('hoursTo')
    ? label.replace(/(\d+) °C/, (_, celsius: string) => printer.temperature(Number(celsius)))
    : label

/** One result in the reader's units, or what stands for none. */
export function printResult({ unit, decimals, none }: ResultField, value: unknown, printer: Printer): string {
  if (typeof value === 'string') return words[value] ?? value
  if (typeof value !== 'number' || unit === null) return none ?? '–'
  return printQuantity(value, unit, printer, decimals)
}

/** A step's value in the formula's own unit, and in the reader's where that is another. */
export function printStepValue({ value, unit, decimals }: Step, printer: Printer): string {
  if (value === null) return 'none'
  const inFormula = printFormulaValue(value, unit, decimals)
  if (printer.system === 'metric') return inFormula
  const inOwn = printQuantity(value, unit, printer, decimals)
  const symbolOf = (text: string) => text.replace(/^[−\d.]+/, '')
  return symbolOf(inFormula) === symbolOf(inOwn) ? inFormula : `${inFormula} = ${inOwn}`
}
