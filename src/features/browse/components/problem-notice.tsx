import { Link } from 'react-router-dom'
import type { Browse } from '../hooks/use-browse'
import { findFilterable } from '../../../lib/describe-filter'

const names: Readonly<Record<string, string>> = { kind: 'Kind', sort: 'Order', compare: 'Comparison', brand: 'Brand' }

/** What of the address or the form could not be used, and why; the list stands beside it all the same. */
export function ProblemNotice({ browse, isRestarted }: { readonly browse: Browse; readonly isRestarted: boolean }) {
  const { visit, state, hrefOf } = browse
  const { problems } = visit
  if (problems.length === 0 && !isRestarted) return null
  const nameOf = (key: string) => findFilterable(state.kind, key)?.label ?? names[key] ?? `“${key}”`
  return (
    <div role="alert" className="mt-5 border border-l-[5px] border-no bg-sheet px-4 py-3">
      {problems.length > 0 && (
        <>
          <p className="font-semibold">This could not be used; the list is shown without it:</p>
          <ul className="mt-1 list-disc space-y-0.5 pl-5">
            {problems.map(({ key, end, text, detail }) => (
              <li key={`${key}${end}`} className="break-words">
                <span className="inline-block first-letter:uppercase">{nameOf(key)}</span>
                {end && (end === 'from' ? ', at least' : ', at most')}:{' '}
                {end === undefined && key !== 'compare' && <>“{text}” </>}
                {detail}
              </li>
            ))}
          </ul>
        </>
      )}
      {isRestarted && (
        <p>
          The place in the list that this link led to is not there any more, because the list or what it is narrowed by
          has changed. This is its beginning.
        </p>
      )}
      <p className="mt-2">
        <Link to={hrefOf(isRestarted ? { from: null } : {})} preventScrollReset className="link">
          {isRestarted ? 'Link to the beginning' : 'Go on without it'}
        </Link>
      </p>
    </div>
  )
}
