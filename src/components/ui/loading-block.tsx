import type { ReactNode } from 'react'

export interface LoadingBlockProps {
  /** Read out: "Loading answers". */
  readonly label: string
  /** Skeletons in the final layout. */
  readonly children: ReactNode
}

export function LoadingBlock({ label, children }: LoadingBlockProps) {
  return (
    <div role="status" aria-busy="true">
      <span className="sr-only">{label}</span>
      {children}
    </div>
  )
}
