import type { KeyboardEvent, MouseEvent, ReactNode } from 'react'
import type { Box } from './dimension-layout'
import type { DrawingEdits } from './tank-drawing'

export interface EditTargetProps extends DrawingEdits {
  readonly path: string
  /** What it is and whether it is assumed: "Outside length 23.2 in, assumed". */
  readonly name: string
  readonly box: Box
  readonly children: ReactNode
}

/** Part of a drawing that is a button, or without scripts a link to its field. Not editable: its children alone. */
export function EditTarget({ path, name, box, onEdit, editHref, children }: EditTargetProps) {
  if (!onEdit && !editHref) return <g aria-hidden="true">{children}</g>
  const inside = (
    <>
      <rect
        {...box}
        rx="3"
        strokeWidth="2"
        className="fill-transparent stroke-transparent group-hover:fill-action-soft group-focus-visible:fill-action-soft group-focus-visible:stroke-action"
      />
      <g aria-hidden="true">{children}</g>
    </>
  )
  const button = {
    role: 'button',
    'aria-label': name,
    'data-path': path,
    className: 'group cursor-pointer outline-none',
    ...(onEdit && {
      onClick: (event: MouseEvent) => {
        event.preventDefault()
        onEdit(path, event.currentTarget)
      },
      onKeyDown: (event: KeyboardEvent) => {
        if (event.key !== 'Enter' && event.key !== ' ') return
        event.preventDefault()
        onEdit(path, event.currentTarget)
      },
    }),
  }
  return editHref ? (
    <a href={editHref(path)} {...button}>
      {inside}
    </a>
  ) : (
    <g tabIndex={0} {...button}>
      {inside}
    </g>
  )
}
