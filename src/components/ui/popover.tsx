import { useEffect, useMemo, useRef, type ReactNode } from 'react'
import { Popover as Radix } from 'radix-ui'

export interface PopoverProps {
  /** What it points at: an element of a drawing, as handed over by `onEdit`. Null keeps it shut. */
  readonly anchor: Element | null
  readonly onClose: () => void
  /** Names the dialog for screen readers. */
  readonly label: string
  readonly children: ReactNode
}

/** Opens beside any element, moves focus inside, and gives it back to that element when it closes. */
export function Popover({ anchor, onClose, label, children }: PopoverProps) {
  const anchorRef = useMemo(() => ({ current: anchor }), [anchor])
  // By the time focus is given back the caller has already cleared the anchor.
  const lastAnchor = useRef<Element | null>(null)
  useEffect(() => {
    if (anchor) lastAnchor.current = anchor
  }, [anchor])
  return (
    <Radix.Root open={anchor !== null} onOpenChange={(isOpen) => !isOpen && onClose()}>
      <Radix.Anchor virtualRef={anchorRef} />
      <Radix.Portal>
        <Radix.Content
          aria-label={label}
          sideOffset={8}
          collisionPadding={12}
          onCloseAutoFocus={(event) => {
            event.preventDefault()
            const last = lastAnchor.current
            if (last instanceof HTMLElement || last instanceof SVGElement) last.focus()
          }}
          className="z-10 w-72 max-w-[calc(100vw-1.5rem)] rounded-ui border-[1.5px] border-ink bg-sheet p-4 text-ink"
        >
          {children}
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  )
}
