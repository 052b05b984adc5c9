import type { SetupField } from '#shared/kinds/setup-fields'
import type { Printer } from '#shared/units/print'

/** What a link says of a field, for reading: as it was typed, but a bare number with its unit and a choice by its name. */
export function showTyped({ attribute }: SetupField, text: string, printer: Printer): string {
  if (attribute.type === 'measure' && /^-?\d+(\.\d+)?$/.test(text)) return printer.measure(Number(text), attribute.unit)
  if (attribute.type !== 'choice' && attribute.type !== 'set') return text
  const name = (value: string) => attribute.options.find((option) => option.value === value)?.label ?? value
  return text.split(',').map(name).join(', ')
}
