import type { Attribute } from './types'
import type { Printer } from '../units/print'

function printOption(attribute: Attribute, value: unknown): string {
  const label = 'options' in attribute && attribute.options.find((option) => option.value === String(value))?.label
  return label || String(value)
}

function printGroup(attribute: Attribute & { type: 'group' }, value: object, printer: Printer): string {
  const entry = value as Record<string, unknown>
  if (attribute.phrase !== undefined)
    return attribute.phrase.replace(/\{(\w+)\}/g, (_, key: string) => {
      const field = attribute.fields.find((one) => one.key === key)
      return field && entry[key] !== undefined ? printValue(field, entry[key], printer) : '–'
    })
  return attribute.fields
    .flatMap((field) => {
      const inner = entry[field.key]
      return inner === undefined || field.key === 'id' ? [] : [`${field.label} ${printValue(field, inner, printer)}`]
    })
    .join(', ')
}

/** A bare value of an attribute in words and the reader's units. */
export function printValue(attribute: Attribute, value: unknown, printer: Printer): string {
  switch (attribute.type) {
    case 'measure':
      return typeof value === 'number' ? printer.measure(value, attribute.unit) : String(value)
    case 'boolean':
      return value === true ? 'yes' : 'no'
    case 'choice':
      return printOption(attribute, value)
    case 'set':
      if (!Array.isArray(value)) return String(value)
      return value.length === 0 ? 'none' : value.map((one) => printOption(attribute, one)).join(', ')
    case 'text':
      return String(value)
    case 'texts':
      return Array.isArray(value) ? value.join(', ') : String(value)
    case 'group':
      if (Array.isArray(value)) return value.map((one: object) => printGroup(attribute, one, printer)).join('; ')
      return typeof value === 'object' && value !== null ? printGroup(attribute, value, printer) : String(value)
  }
}
