import type { ReactNode } from 'react'

export interface LegendItem {
  readonly key: string
  /** Drawn in a box of 22 by 14. */
  readonly swatch: ReactNode
  readonly text: string
}

/** What the areas and lines of a drawing stand for. */
export function Legend({ items }: { readonly items: readonly LegendItem[] }) {
  return (
    <ul className="flex flex-wrap gap-x-5 gap-y-1 text-sm text-ink-soft">
      {items.map(({ key, swatch, text }) => (
        <li key={key} className="flex min-w-0 gap-2">
          <svg width="22" height="14" viewBox="0 0 22 14" className="mt-[3px] flex-none">
            {swatch}
          </svg>
          <span className="min-w-0">{text}</span>
        </li>
      ))}
    </ul>
  )
}
