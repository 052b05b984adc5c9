import type { FieldAttribute, GroupAttribute } from '#shared/kinds/types'
import type { Printer } from '#shared/units/print'

const plainSpaces = (text: string): string => text.replaceAll('\u00a0', ' ').replaceAll('\u2212', '-')

/** A value on record as somebody of this unit system would type it; `exact` for numbers that are taken over as they are. */
export function typeValue(
  attribute: FieldAttribute,
  value: unknown,
  printer: Printer,
  options: { readonly exact?: boolean } = {},
): string {
  if (value === undefined || value === null) return ''
  switch (attribute.type) {
    case 'measure': {
      if (typeof value !== 'number') return ''
      return plainSpaces(printer.measure(value, attribute.unit, options.exact ? { exact: true } : { finer: 1 }))
    }
    case 'boolean':
      return value === true ? 'yes' : 'no'
    case 'set':
      return Array.isArray(value) ? value.join(',') || 'none' : ''
    case 'texts':
      return Array.isArray(value) ? value.join(', ') : ''
    case 'choice':
    case 'text':
      return typeof value === 'string' || typeof value === 'number' ? String(value) : ''
  }
}

const isObject = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null

/** The entries of a group as typed, ids included: they are how other things refer to an entry. */
export function typeEntries(
  group: GroupAttribute,
  value: unknown,
  printer: Printer,
): readonly Readonly<Record<string, string>>[] {
  const list: readonly unknown[] = Array.isArray(value) ? value : value === undefined || value === null ? [] : [value]
  return list.filter(isObject).map((entry) =>
    Object.fromEntries(
      group.fields.flatMap((field): [string, string][] => {
        if (field.type === 'group') return []
        const text = typeValue(field, entry[field.key], printer)
        return text === '' ? [] : [[field.key, text]]
      }),
    ),
  )
}
