import { useMemo } from 'react'
import { Link } from 'react-router-dom'
import type { FieldAttribute } from '#shared/kinds/types'
import type { GearList } from '#shared/schemas/gear'
import { limits } from '#shared/limits'
import { buttonClass } from '../../../components/ui/button-class'
import type { Browse } from '../hooks/use-browse'
import { writeApiQuery } from '../link/browse-state'
import { writeCsv } from '../model/write-csv'

export interface ListFooterProps {
  readonly browse: Browse
  readonly list: GearList
  readonly attributes: readonly FieldAttribute[]
  readonly pageNumber: number
}

/** Where the list goes on, and the rows to take away. A link that holds its file works without scripts as well. */
export function ListFooter({ browse, list, attributes, pageNumber }: ListFooterProps) {
  const { state, printer, hrefOf } = browse
  const { items, next, total } = list
  const csv = useMemo(
    () => `data:text/csv;charset=utf-8,${encodeURIComponent(writeCsv(items, attributes, printer))}`,
    [items, attributes, printer],
  )
  const pages = Math.ceil(total / limits.page)
  return (
    <div className="mt-4 flex flex-wrap items-center justify-between gap-x-6 gap-y-3 print:hidden">
      <nav aria-label="Pages of the list" className="flex flex-wrap items-center gap-3">
        {pageNumber > 1 && (
          <Link to={hrefOf({ from: null })} className={buttonClass()}>
            First page
          </Link>
        )}
        {pages > 1 && (
          <span className="font-mono text-sm text-ink-soft">
            page {pageNumber} of {pages}
          </span>
        )}
        {next !== null && (
          <Link to={hrefOf({ from: { cursor: next, page: pageNumber + 1 } })} rel="next" className={buttonClass()}>
            Next page
          </Link>
        )}
      </nav>
      <p className="flex flex-wrap gap-x-5 text-sm">
        <a
          href={csv}
          download={`stillfits-${state.kind ?? 'gear'}.csv`}
          className="link inline-flex min-h-8 items-center"
        >
          Download {items.length === 1 ? 'this row' : `these ${items.length} rows`} (CSV)
        </a>
        <a href={`/api/v1/gear?${writeApiQuery(state)}`} className="link inline-flex min-h-8 items-center">
          The same from the API (JSON)
        </a>
      </p>
    </div>
  )
}
