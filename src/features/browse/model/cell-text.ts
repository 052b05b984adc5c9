import type { FieldAttribute } from '#shared/kinds/types'
import type { Printer } from '#shared/units/print'
import { printValue } from '#shared/kinds/print-value'

/** A value under a header that already says its unit; null where nobody has recorded it. */
export function printCell(attribute: FieldAttribute, value: unknown, printer: Printer): string | null {
  if (value === undefined) return null
  return attribute.type === 'measure' && typeof value === 'number'
    ? printer.number(value, attribute.unit)
    : printValue(attribute, value, printer)
}
