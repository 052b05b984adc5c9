import type { ReactNode } from 'react'

export interface DisclosureProps {
  readonly summary: ReactNode
  readonly children: ReactNode
  readonly isOpen?: boolean
  readonly onToggle?: (isOpen: boolean) => void
  readonly id?: string
}

/** Native details, so that it opens without scripts. */
export function Disclosure({ summary, children, isOpen = false, onToggle, id }: DisclosureProps) {
  return (
    <details
      id={id}
      open={isOpen}
      onToggle={onToggle && ((event) => onToggle(event.currentTarget.open))}
      className="group border-t border-rule"
    >
      <summary className="flex min-h-11 list-none items-center gap-3 py-2 font-semibold hover:text-action [&::-webkit-details-marker]:hidden">
        <svg width="14" height="14" viewBox="0 0 14 14" aria-hidden="true" className="flex-none stroke-current">
          <path d="M1 7h12" strokeWidth="1.5" />
          <path d="M7 1v12" strokeWidth="1.5" className="group-open:hidden" />
        </svg>
        <span className="min-w-0">{summary}</span>
      </summary>
      <div className="pb-4 pl-[1.625rem]">{children}</div>
    </details>
  )
}
