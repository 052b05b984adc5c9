import type { ReactNode } from 'react'

export interface NarrowPageProps {
  readonly title: string
  readonly intro?: ReactNode
  readonly children: ReactNode
}

/** A page that is one short form. */
export function NarrowPage({ title, intro, children }: NarrowPageProps) {
  return (
    <div className="max-w-md">
      <h1>{title}</h1>
      {intro && <div className="mt-3 space-y-2">{intro}</div>}
      <div className="mt-6">{children}</div>
    </div>
  )
}
