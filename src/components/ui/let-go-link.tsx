import { Link } from 'react-router-dom'

export interface LetGoLinkProps {
  readonly to: string
  /** What the list is narrowed by. */
  readonly children: string
}

/** Something that narrows a list, and the way to let go of it. */
export function LetGoLink({ to, children }: LetGoLinkProps) {
  return (
    <Link
      to={to}
      preventScrollReset
      className="inline-flex min-h-8 max-w-full items-center gap-2 rounded-ui border-[1.5px] border-action bg-action-soft px-2.5 hover:border-ink"
    >
      <span className="min-w-0 truncate">{children}</span>
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
  )
}
