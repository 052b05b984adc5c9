import { useMemo } from 'react'
import clsx from 'clsx'
import { useTable, type SortingState } from '@tanstack/react-table'
import type { FieldAttribute } from '#shared/kinds/types'
import type { GearItem } from '#shared/schemas/gear'
import type { Browse } from '../hooks/use-browse'
import { nextSort } from '../link/browse-state'
import type { Span } from '../model/find-matches'
import { unknownText } from '../../../lib/describe-filter'
import { createTableColumns, features } from '../model/table-columns'
import { NameCell } from './name-cell'
import { SortLink } from './sort-link'

export interface GearTableProps {
  readonly browse: Browse
  readonly items: GearItem[]
  readonly attributes: readonly FieldAttribute[]
  readonly caption: string
  readonly isStale: boolean
  readonly matchesOf: (slug: string) => readonly Span[]
}

const ariaSorts = { asc: 'ascending', desc: 'descending', false: undefined } as const

/** The name that orders are known by in the address: the list is in order of name until another is chosen. */
function readSorting(sort: string | null, q: string): SortingState {
  const key = sort ?? (q === '' ? 'name' : 'relevance')
  return [{ id: key.replace(/^-/, ''), desc: key.startsWith('-') }]
}

/**
 * The pieces as a table that scrolls inside itself, its names and headers staying in view; on a phone each row is a
 * card. The roles are spelt out because a table laid out as cards loses those it has by nature.
 */
export function GearTable({ browse, items, attributes, caption, isStale, matchesOf }: GearTableProps) {
  const { state, printer, hrefOf } = browse
  const { kind, sort, q, density } = state
  const columns = useMemo(() => createTableColumns(kind, attributes, printer), [kind, attributes, printer])
  const sorting = useMemo(() => readSorting(sort, q), [sort, q])
  const table = useTable({
    features,
    columns,
    data: items,
    state: { sorting },
    manualSorting: true,
    getRowId: ({ slug }) => slug,
  })
  const measures = new Set(attributes.filter(({ type }) => type === 'measure').map(({ key }) => key))
  const pad = density === 'compact' ? 'md:py-1' : 'md:py-2.5'
  return (
    <div
      role="region"
      aria-label={caption}
      tabIndex={0}
      className={clsx(
        'relative border-y-[1.5px] border-ink md:max-h-[85vh] md:scroll-pt-14 md:scroll-pl-72 md:overflow-auto print:max-h-none print:overflow-visible',
        isStale && 'opacity-60',
      )}
    >
      <table role="table" className="block w-full border-separate border-spacing-0 text-sm md:table">
        <caption className="sr-only">{caption}</caption>
        <thead role="rowgroup" className="hidden md:table-header-group">
          {table.getHeaderGroups().map((group) => (
            <tr key={group.id} role="row">
              {group.headers.map((header, at) => (
                <th
                  key={header.id}
                  role="columnheader"
                  scope="col"
                  aria-sort={ariaSorts[`${header.column.getIsSorted()}`]}
                  className={clsx(
                    'sticky top-0 z-10 border-b-[1.5px] border-ink bg-paper px-3 py-1 align-bottom font-semibold',
                    at === 0 && 'left-0 z-20 border-r border-r-rule pl-1',
                    measures.has(header.id) ? 'text-right' : 'text-left',
                  )}
                >
                  {header.column.getCanSort() ? (
                    <SortLink
                      to={hrefOf({ sort: nextSort(sort ?? (q === '' ? 'name' : null), header.id), from: null })}
                      direction={header.column.getIsSorted()}
                    >
                      <table.FlexRender header={header} />
                    </SortLink>
                  ) : (
                    <span className="inline-flex min-h-8 items-center">
                      <table.FlexRender header={header} />
                    </span>
                  )}
                </th>
              ))}
            </tr>
          ))}
        </thead>
        <tbody role="rowgroup" className="block md:table-row-group">
          {table.getRowModel().rows.map((row) => (
            <tr
              key={row.id}
              role="row"
              className="group grid grid-cols-2 gap-x-4 gap-y-1.5 border-b border-ink-soft py-3 last:border-b-0 md:table-row md:border-0 md:py-0"
            >
              {row.getAllCells().map((cell, at) => {
                if (at === 0)
                  return (
                    <NameCell
                      key={cell.id}
                      item={row.original}
                      browse={browse}
                      matches={matchesOf(row.id)}
                      className={pad}
                    />
                  )
                const value = cell.getValue() as string | null
                const isNumber = measures.has(cell.column.id)
                return (
                  <td
                    key={cell.id}
                    role="cell"
                    className={clsx(
                      'block min-w-0 pl-7 md:table-cell md:border-b md:border-rule md:px-3 md:align-baseline md:group-last:border-b-0',
                      pad,
                      isNumber && 'md:text-right',
                    )}
                  >
                    <span aria-hidden="true" className="block text-xs text-ink-soft md:hidden">
                      {header(cell.column.columnDef.header)}
                    </span>
                    {value === null ? (
                      <span className="text-xs text-ink-soft md:whitespace-nowrap">{unknownText}</span>
                    ) : (
                      <span className={clsx('break-words', isNumber && 'font-mono tabular-nums')}>{value}</span>
                    )}
                  </td>
                )
              })}
            </tr>
          ))}
        </tbody>
      </table>
    </div>
  )
}

const header = (text: unknown): string => (typeof text === 'string' ? text : '')
