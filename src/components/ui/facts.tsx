import type { ReactNode } from 'react'

export interface FactsProps {
  readonly rows: readonly { readonly term: string; readonly facts: ReactNode }[]
}

/** Terms with what there is to say of each: side by side where there is room. */
export function Facts({ rows }: FactsProps) {
  return (
    <dl className="mt-3 border-b border-rule">
      {rows.map(({ term, facts }) => (
        <div key={term} className="grid gap-x-6 border-t border-rule py-3 md:grid-cols-[14rem_minmax(0,1fr)]">
          <dt className="font-semibold">{term}</dt>
          <dd className="max-w-prose">{facts}</dd>
        </div>
      ))}
    </dl>
  )
}
