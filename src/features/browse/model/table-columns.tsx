import { createColumnHelper, rowSortingFeature, tableFeatures } from '@tanstack/react-table'
import { getKind, isKindKey, type KindKey } from '#shared/kinds/index'
import type { FieldAttribute } from '#shared/kinds/types'
import type { GearItem } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { describeSpecs } from '../../../lib/describe-specs'
import { printCell } from './cell-text'
import { printHeader } from './columns'

export const features = tableFeatures({ rowSortingFeature })

const helper = createColumnHelper<typeof features, GearItem>()

/** Cells are texts, null where nobody has recorded the value: how both are shown is the table's business. */
const createName = () =>
  helper.accessor((item) => `${item.brand} ${item.model}`, { id: 'name', header: 'Name', enableSorting: true })

function createAttributeColumn(attribute: FieldAttribute, printer: Printer) {
  return helper.accessor((item): string | null => printCell(attribute, item.specs[attribute.key], printer), {
    id: attribute.key,
    header: printHeader(attribute, printer),
    // The server orders by names and numbers.
    enableSorting: attribute.type === 'measure',
  })
}

/** Columns of one kind, or of all kinds together. */
export function createTableColumns(kind: KindKey | null, attributes: readonly FieldAttribute[], printer: Printer) {
  if (kind !== null)
    return helper.columns([createName(), ...attributes.map((attribute) => createAttributeColumn(attribute, printer))])
  return helper.columns([
    createName(),
    helper.accessor((item): string | null => (isKindKey(item.kind) ? getKind(item.kind).label : item.kind), {
      id: 'kind',
      header: 'Kind',
      enableSorting: false,
    }),
    helper.accessor(
      (item): string | null => (isKindKey(item.kind) ? describeSpecs(item.kind, item.specs, printer) : null) || null,
      { id: 'specs', header: 'In short', enableSorting: false },
    ),
  ])
}
