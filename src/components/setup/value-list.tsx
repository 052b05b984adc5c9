import { EditLink } from './edit-link'
import type { ReactNode } from 'react'
import { capitalise } from '../../lib/capitalise'

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

/** Labels with their values, each of which opens to be changed. Solid: given. Dashed: assumed. */
export function ValueList({ lines, look, onEdit, children }: ValueListProps) {
  return (
    <ul>
      {lines.map(({ path, label, shown, href }) => (
        <li key={path} className="flex items-baseline justify-between gap-3 border-b border-rule py-1.5 text-sm">
          <span className="min-w-0">{capitalise(label)}</span>
          <EditLink
            href={href}
            name={`${capitalise(label)}, ${shown}, ${look}: change`}
            path={path}
            onEdit={(anchor) => onEdit(path, anchor)}
            className={`min-h-6 flex-none text-right font-mono text-[0.94em] text-action ${look}`}
          >
            {shown}
          </EditLink>
        </li>
      ))}
      {children}
    </ul>
  )
}
