import type { ReactNode } from 'react'

export interface EditLinkProps {
  /** The field that it leads to without scripts. */
  readonly href: string
  readonly onEdit: (anchor: Element) => void
  readonly className: string
  /** What it is called where its own words say too little. */
  readonly name?: string
  readonly path?: string
  readonly title?: string
  readonly children: ReactNode
}

/** A button that opens a field in place; without scripts a link to it. */
export function EditLink({ href, onEdit, className, name, path, title, children }: EditLinkProps) {
  return (
    <a
      href={href}
      role="button"
      aria-label={name}
      data-path={path}
      title={title}
      className={className}
      onClick={(event) => {
        event.preventDefault()
        onEdit(event.currentTarget)
      }}
      onKeyDown={(event) => {
        if (event.key !== ' ') return
        event.preventDefault()
        onEdit(event.currentTarget)
      }}
    >
      {children}
    </a>
  )
}
