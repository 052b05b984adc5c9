import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'

export interface SortLinkProps {
  readonly to: string
  readonly direction: 'asc' | 'desc' | false
  readonly children: ReactNode
}

/** A header that orders the list: up, down, as it was. */
export function SortLink({ to, direction, children }: SortLinkProps) {
  return (
    <Link
      to={to}
      preventScrollReset
      className="inline-flex min-h-8 items-center gap-1.5 underline-offset-4 hover:text-action hover:underline"
    >
      {children}
      <svg width="9" height="14" viewBox="0 0 9 14" aria-hidden="true" className="flex-none fill-none stroke-current">
        <path d="M4.5 1v12" strokeWidth="1.5" opacity={direction === false ? 0.35 : 1} />
        {direction !== 'desc' && (
          <path d="M1 4.5 4.5 1 8 4.5" strokeWidth="1.5" opacity={direction === false ? 0.35 : 1} />
        )}
        {direction !== 'asc' && (
          <path d="M1 9.5 4.5 13 8 9.5" strokeWidth="1.5" opacity={direction === false ? 0.35 : 1} />
        )}
      </svg>
    </Link>
  )
}
