import { getKind, type KindKey } from '#shared/kinds/index'
import type { FieldAttribute } from '#shared/kinds/types'
import type { Printer } from '#shared/units/print'
import { firstColumns } from './first-columns'
import { capitalise } from '../../../lib/capitalise'

/** Attributes that a table can show; groups, such as chambers or a pump's curve, are read on the piece's own page. */
export function listColumns(kind: KindKey): readonly FieldAttribute[] {
  return getKind(kind).attributes.filter((attribute): attribute is FieldAttribute => attribute.type !== 'group')
}

/** In the order of the kind's attributes. */
export function defaultColumns(kind: KindKey): readonly string[] {
  return listColumns(kind).flatMap(({ key }) => (firstColumns[kind].includes(key) ? [key] : []))
}

/** The columns of a table: those chosen as the kind has them, or those it is first shown with, what is asked first ahead. */
export function chooseColumns(kind: KindKey, chosen: readonly string[] | null): readonly FieldAttribute[] {
  const columns = listColumns(kind)
  const keys = chosen ?? firstColumns[kind]
  return keys.flatMap((key) => columns.find((column) => column.key === key) ?? [])
}

/** "Length (in)" */
export function printHeader(attribute: FieldAttribute, printer: Printer): string {
  const label = capitalise(attribute.label)
  const unit = attribute.type === 'measure' ? printer.unitLabel(attribute.unit) : ''
  return unit === '' ? label : `${label} (${unit})`
}
