import type { ReactNode } from 'react'
import { Button } from './button'
import { buttonClass } from './button-class'

export interface ErrorStateProps {
  /** What happened. */
  readonly title: string
  /** What was kept, and what to do. */
  readonly children?: ReactNode
  readonly onRetry?: () => void
  /** Where "Try again" leads without scripts: usually the page's own address. */
  readonly retryHref?: string
  /** For a report to the people who run the site. */
  readonly requestId?: string
}

export function ErrorState({ title, children, onRetry, retryHref, requestId }: ErrorStateProps) {
  return (
    <div role="alert" className="border border-l-[5px] border-no bg-sheet px-5 py-5">
      <p className="font-heading text-lg font-bold">{title}</p>
      {children && <div className="mt-1 max-w-prose">{children}</div>}
      {requestId && <p className="mt-1 font-mono text-xs text-ink-soft">Request {requestId}</p>}
      {onRetry ? (
        <Button className="mt-4" onClick={onRetry}>
          Try again
        </Button>
      ) : (
        retryHref && (
          <a href={retryHref} className={`mt-4 ${buttonClass()}`}>
            Try again
          </a>
        )
      )}
    </div>
  )
}
