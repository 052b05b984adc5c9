import { getKind, isKindKey } from '#shared/kinds/index'
import type { FieldAttribute } from '#shared/kinds/types'
import type { GearItem } from '#shared/schemas/gear'
import { toShown } from '#shared/units/convert'
import type { Printer } from '#shared/units/print'
import { printHeader } from './columns'
import { printCell } from './cell-text'

type Cell = string | number | null

const byteOrderMark = '\ufeff'
/** As many as a measure is known to; a number that came from other units is not longer than it was. */
const digits = 7

/**
 * Fields as RFC 4180 has them. A spreadsheet would run a text that begins like a formula: it gets an apostrophe before
 * it (OWASP, CSV Injection; also behind leading spaces, which some programs skip). Numbers stay numbers.
 */
export function writeCell(cell: Cell): string {
  if (cell === null) return ''
  if (typeof cell === 'number') return String(cell)
  const text = /^ *[=+\-@\t\r\n]/.test(cell) ? `'${cell}` : cell
  return /[",\r\n]/.test(text) ? `"${text.replaceAll('"', '""')}"` : text
}

function toCell(attribute: FieldAttribute, value: unknown, printer: Printer): Cell {
  if (attribute.type === 'measure' && typeof value === 'number')
    return Number(toShown(value, attribute.unit, printer.system).toPrecision(digits))
  return printCell(attribute, value, printer)
}

/** The rows that are shown with the columns that are shown, for a spreadsheet: UTF-8 with a mark that says so. */
export function writeCsv(items: readonly GearItem[], columns: readonly FieldAttribute[], printer: Printer): string {
  const headers = ['Brand', 'Model', 'Kind', ...columns.map((column) => printHeader(column, printer))]
  const rows = items.map((item): Cell[] => [
    item.brand,
    item.model,
    isKindKey(item.kind) ? getKind(item.kind).label : item.kind,
    ...columns.map((column) => toCell(column, item.specs[column.key], printer)),
    item.status,
    item.slug,
    item.revision,
    item.updatedAt,
  ])
  const lines = [[...headers, 'Status', 'Name in addresses', 'Revision', 'Updated'], ...rows]
  return byteOrderMark + lines.map((line) => `${line.map(writeCell).join(',')}\r\n`).join('')
}
