import type { ReactNode } from 'react'

export interface CautionBoxProps {
  readonly title: string
  readonly children: ReactNode
}

export function CautionBox({ title, children }: CautionBoxProps) {
  return (
    <div role="note" className="border border-l-[5px] border-ink bg-sheet px-4 py-3 text-sm">
      <strong className="font-bold">{title}</strong> {children}
    </div>
  )
}
