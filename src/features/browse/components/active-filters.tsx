import { Link } from 'react-router-dom'
import type { Browse } from '../hooks/use-browse'
import { withoutFilter } from '../link/browse-state'
import { describeFilter } from '../model/describe-filter'

/** What the list is narrowed by, each with a way to let go of it. */
export function ActiveFilters({ browse }: { readonly browse: Browse }) {
  const { state, printer, hrefOf } = browse
  const { kind, q, filters } = state
  const active = [...(q === '' ? [] : [['q', q] as const]), ...Object.entries(filters)]
  if (active.length === 0) return null
  return (
    <ul aria-label="Narrowed by" className="mt-4 flex flex-wrap gap-x-3 gap-y-2 text-sm print:hidden">
      {active.map(([key, text]) => {
        const words = describeFilter(kind, key, text, printer)
        return (
          <li key={key} className="max-w-full">
            <Link
              to={hrefOf(withoutFilter(state, key))}
              preventScrollReset
              className="inline-flex min-h-8 max-w-full items-center gap-2 rounded-ui border-[1.5px] border-action bg-action-soft px-2.5 hover:border-ink"
            >
              <span className="min-w-0 truncate">{words}</span>
              <svg
                width="10"
                height="10"
                viewBox="0 0 10 10"
                role="img"
                aria-label="remove"
                className="flex-none stroke-current"
              >
                <path d="m1 1 8 8m0-8-8 8" strokeWidth="1.5" />
              </svg>
            </Link>
          </li>
        )
      })}
      {active.length > 1 && (
        <li>
          <Link
            to={hrefOf({ q: '', filters: {}, sort: state.sort === 'relevance' ? null : state.sort, from: null })}
            preventScrollReset
            className="link inline-flex min-h-8 items-center"
          >
            Remove all
          </Link>
        </li>
      )}
    </ul>
  )
}
