import type { Assumption } from '#shared/engine/types'
import { printValue } from '#shared/kinds/print-value'
import type { FieldAttribute } from '#shared/kinds/types'
import type { Printer } from '#shared/units/print'

/** A default in words; one of another sort than its field says what it means itself. */
export function printAssumed(value: Assumption['value'], attribute: FieldAttribute, printer: Printer): string {
  if (attribute.type === 'measure' && typeof value !== 'number') return String(value)
  return printValue(attribute, value, printer)
}
