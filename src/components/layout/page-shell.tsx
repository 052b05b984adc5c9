import type { ReactNode } from 'react'
import { SkipLink } from './skip-link'

export interface PageShellProps {
  readonly header: ReactNode
  readonly footer: ReactNode
  readonly children: ReactNode
}

export function PageShell({ header, footer, children }: PageShellProps) {
  return (
    <div className="flex min-h-screen flex-col print:block print:min-h-0">
      <SkipLink />
      {header}
      <main id="main" tabIndex={-1} className="page-width grow py-6 outline-none md:py-8">
        {children}
      </main>
      {footer}
    </div>
  )
}
