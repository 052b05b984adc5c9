import type { ReactNode } from 'react'

export interface ValueLine {
  readonly path: string
  readonly label: string
  readonly shown: string
  /** Where it leads without scripts. */
  readonly href: string
}

export interface ValueListProps {
  readonly lines: readonly ValueLine[]
  readonly look: 'given' | 'assumed'
  readonly onEdit: (path: string, target: Element) => void
  readonly children?: ReactNode
}

const capitalise = (text: string): string => `${text[0]?.toUpperCase() ?? ''}${text.slice(1)}`

/** Labels with their values, each of which opens to be changed. Solid: given. Dashed: assumed. */
export function ValueList({ lines, look, onEdit, children }: ValueListProps) {
  return (
    <ul>
      {lines.map(({ path, label, shown, href }) => (
        <li key={path} className="flex items-baseline justify-between gap-3 border-b border-rule py-1.5 text-sm">
          <span className="min-w-0">{capitalise(label)}</span>
          <a
            href={href}
            role="button"
            aria-label={`${capitalise(label)}, ${shown}, ${look}: change`}
            data-path={path}
            onClick={(event) => {
              event.preventDefault()
              onEdit(path, event.currentTarget)
            }}
            onKeyDown={(event) => {
              if (event.key !== ' ') return
              event.preventDefault()
              onEdit(path, event.currentTarget)
            }}
            className={`min-h-6 flex-none text-right font-mono text-[0.94em] text-action ${look}`}
          >
            {shown}
          </a>
        </li>
      ))}
      {children}
    </ul>
  )
}
