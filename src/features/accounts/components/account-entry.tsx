import { Link, useLocation } from 'react-router-dom'
import { paths } from '../../../config/paths'
import { useSignedIn } from '../../../lib/session'

const entryClass =
  'flex min-h-8 min-w-8 max-w-48 items-center justify-center rounded-ui border-[1.5px] border-ink-soft px-2 text-sm font-semibold hover:border-action hover:text-action'

/** Who is signed in, or the way there; while nobody knows yet, the way there as well. */
export function AccountEntry() {
  const person = useSignedIn()
  const { pathname, search } = useLocation()
  if (person) {
    return (
      <Link to={paths.account} className={entryClass} title={`Your account, ${person.name}`}>
        <span className="sr-only">Your account, </span>
        <span aria-hidden="true" className="sm:hidden">
          {[...person.name][0]}
        </span>
        <span className="sr-only truncate sm:not-sr-only">{person.name}</span>
      </Link>
    )
  }
  const isThere = pathname === '/sign-in'
  return (
    <Link to={isThere ? `${pathname}${search}` : paths.signIn(`${pathname}${search}`)} className={entryClass}>
      <span className="truncate">Sign in</span>
    </Link>
  )
}
