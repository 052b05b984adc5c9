import type { FieldAttribute, GroupAttribute, MeasureAttribute } from '#shared/kinds/types'
import { describeExample } from '#shared/units/examples'
import { createPrinter, type Printer } from '#shared/units/print'
import { readMeasure } from '#shared/units/read'

const plainSpaces = (text: string): string => text.replaceAll('\u00a0', ' ').replaceAll('\u2212', '-')

/** As few digits as it takes that the number reads back, in the other system, as it is on record there. */
function typeMeasure(value: number, { unit }: MeasureAttribute, printer: Printer): string {
  const other = createPrinter(printer.system === 'us' ? 'metric' : 'us')
  const spell = (finer: number) => plainSpaces(printer.measure(value, unit, { finer }))
  const isTrue = (text: string) => {
    const read = readMeasure(text, unit, printer.system)
    return read.ok && other.measure(read.value, unit, { finer: 1 }) === other.measure(value, unit, { finer: 1 })
  }
  return [0, 1, 2, 3].map(spell).find(isTrue) ?? spell(4)
}

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
      return options.exact
        ? plainSpaces(printer.measure(value, attribute.unit, { exact: true }))
        : typeMeasure(value, attribute, printer)
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

/** An example that cannot be taken for a value on record. */
export const writePlaceholder = (attribute: FieldAttribute, { system }: Printer): string =>
  attribute.type === 'measure' ? `such as ${describeExample(attribute.unit, system)}` : ''
