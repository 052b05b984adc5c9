import clsx from 'clsx'
import { Link } from 'react-router-dom'

export interface Reason {
  readonly key: string
  readonly count: number
  readonly label: string
  readonly href: string
  readonly isOpen: boolean
}

/** Why pieces are in a group, with how many; each opens its own, and closes it again. */
export function ReasonChips({ reasons, tone }: { readonly reasons: readonly Reason[]; readonly tone: string }) {
  return (
    <ul className="mt-3 flex flex-wrap gap-2">
      {reasons.map(({ key, count, label, href, isOpen }) => (
        <li key={key}>
          <Link
            to={href}
            preventScrollReset
            aria-current={isOpen ? 'true' : undefined}
            className={clsx(
              'inline-flex min-h-9 items-center gap-2 rounded-ui border px-3 text-sm hover:border-action hover:text-action',
              isOpen ? 'border-ink bg-sheet font-semibold' : 'border-ink-soft',
            )}
          >
            <span className={`font-mono font-semibold ${tone}`}>{count}</span> {label}
          </Link>
        </li>
      ))}
    </ul>
  )
}
