import { useId, useLayoutEffect, useRef, type ReactNode } from 'react'
import { Button } from './button'

export interface DialogProps {
  readonly title: string
  readonly onClose: () => void
  readonly children: ReactNode
  readonly isWide?: boolean
}

/**
 * Stands over the page while it is rendered. The browser's own: it keeps focus inside and gives it back, without the
 * style elements that a strict content security policy refuses.
 */
export function Dialog({ title, onClose, children, isWide = false }: DialogProps) {
  const box = useRef<HTMLDialogElement>(null)
  const titleId = useId()
  // Closed while it still stands on the page: only then does the browser give focus back.
  useLayoutEffect(() => {
    const dialog = box.current
    dialog?.showModal()
    return () => dialog?.close()
  }, [])
  return (
    <dialog
      ref={box}
      aria-labelledby={titleId}
      onCancel={(event) => {
        event.preventDefault()
        onClose()
      }}
      className={`m-auto max-h-[92dvh] w-[calc(100vw-1.5rem)] overflow-y-auto rounded-ui border-[1.5px] border-ink bg-sheet p-4 text-ink backdrop:bg-[#0c191d]/60 sm:p-6 ${
        isWide ? 'max-w-5xl' : 'max-w-2xl'
      }`}
    >
      <div className="flex items-start justify-between gap-4">
        <h2 id={titleId} className="min-w-0">
          {title}
        </h2>
        <Button size="sm" onClick={onClose}>
          Close
        </Button>
      </div>
      <div className="mt-4">{children}</div>
    </dialog>
  )
}
