import type { ReactNode } from 'react'

export interface EmptyStateProps {
  readonly title: string
  /** Why it is empty and what to do. */
  readonly children?: ReactNode
  readonly action?: ReactNode
}

export function EmptyState({ title, children, action }: EmptyStateProps) {
  return (
    <div className="border-[1.5px] border-dashed border-ink-soft px-5 py-6">
      <p className="font-heading text-lg font-bold">{title}</p>
      {children && <div className="mt-1 max-w-prose text-ink-soft">{children}</div>}
      {action && <div className="mt-4">{action}</div>}
    </div>
  )
}
