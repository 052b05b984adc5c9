import { Link } from 'react-router-dom'
import { LetGoLink } from '../../../components/ui/let-go-link'
import type { Browse } from '../hooks/use-browse'
import { withoutFilter } from '../link/browse-state'
import { describeFilter } from '../../../lib/describe-filter'

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
            <LetGoLink to={hrefOf(withoutFilter(state, key))}>{words}</LetGoLink>
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
