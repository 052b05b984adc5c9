import { useEffect, useRef, type ReactNode } from 'react'

/** Takes the place of a form that has done its work, and its focus. */
export function DoneNote({ children }: { readonly children: ReactNode }) {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => box.current?.focus(), [])
  return (
    <div
      ref={box}
      role="status"
      tabIndex={-1}
      className="space-y-3 border border-l-[5px] border-fits bg-sheet px-4 py-4"
    >
      {children}
    </div>
  )
}
