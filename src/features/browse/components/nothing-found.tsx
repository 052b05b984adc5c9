import { Link } from 'react-router-dom'
import { getKind } from '#shared/kinds/index'
import type { GearList } from '#shared/schemas/gear'
import { buttonClass } from '../../../components/ui/button-class'
import { EmptyState } from '../../../components/ui/empty-state'
import type { Browse } from '../hooks/use-browse'
import { withoutFilter } from '../link/browse-state'
import { describeFilter } from '../../../lib/describe-filter'

const mostOffered = 3

/** Why the list is empty, and the one thing to let go of that fills it again. */
export function NothingFound({ browse, list }: { readonly browse: Browse; readonly list: GearList }) {
  const { state, printer, hrefOf } = browse
  const { kind, filters, q } = state
  const noun = kind === null ? 'piece of gear' : getKind(kind).label
  const plural = kind === null ? 'pieces of gear' : getKind(kind).plural
  const helpful = list.loosen.filter(({ total }) => total > 0).slice(0, mostOffered)
  const isNarrowed = Object.keys(filters).length > 0
  if (!isNarrowed)
    return (
      <EmptyState
        title={q === '' ? `There are no ${plural} here yet` : `No ${noun} is called or described like that`}
        action={
          q !== '' && (
            <Link to={hrefOf({ q: '', from: null })} className={buttonClass()} preventScrollReset>
              Show all {plural}
            </Link>
          )
        }
      >
        {list.hint}
      </EmptyState>
    )
  return (
    <EmptyState
      title={`No ${noun} passes all of this`}
      action={
        <ul className="flex flex-wrap gap-3">
          {helpful.map(({ key, total }, at) => (
            <li key={key} className="max-w-full">
              <Link
                to={hrefOf(withoutFilter(state, key))}
                preventScrollReset
                className={`${buttonClass({ variant: at === 0 ? 'primary' : 'plain' })} max-w-full !whitespace-normal py-2`}
              >
                <span className="min-w-0">
                  Without {describeFilter(kind, key, filters[key] ?? '', printer)}: {total}{' '}
                  {total === 1 ? noun : plural}
                </span>
              </Link>
            </li>
          ))}
          <li>
            <Link
              to={hrefOf({ q: '', filters: {}, sort: null, from: null })}
              className={buttonClass()}
              preventScrollReset
            >
              Show all {plural}
            </Link>
          </li>
        </ul>
      }
    >
      {helpful.length > 0
        ? 'It is all of it together that leaves nothing. Letting go of one of these brings something back:'
        : 'Letting go of a single filter would not help: at least two of them rule everything out.'}
    </EmptyState>
  )
}
