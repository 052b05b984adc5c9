import type { ReactNode } from 'react'
import type { Verdict } from '#shared/engine/types'
import { verdictTextClasses, verdictWords } from '../../lib/verdicts'

export interface VerdictIconProps {
  readonly verdict: Verdict
  /** Pixels. */
  readonly size?: number
  /** Beside the word itself the icon stays silent. */
  readonly isDecorative?: boolean
}

const shapes: Readonly<Record<Verdict, ReactNode>> = {
  fits: (
    <>
      <circle cx="12" cy="12" r="11" fill="currentColor" />
      <path d="m6.8 12.4 3.6 3.7 6.9-7.8" fill="none" strokeWidth="2.4" className="stroke-paper" />
    </>
  ),
  changes: (
    <>
      <circle cx="12" cy="12" r="10" fill="none" stroke="currentColor" strokeWidth="2" />
      <path d="M12 2a10 10 0 0 1 0 20Z" fill="currentColor" />
    </>
  ),
  no: (
    <>
      <circle cx="12" cy="12" r="10" fill="none" stroke="currentColor" strokeWidth="2" />
      <path d="m7.5 7.5 9 9m0-9-9 9" fill="none" stroke="currentColor" strokeWidth="2.2" />
    </>
  ),
  unknown: (
    <circle
      cx="12"
      cy="12"
      r="10"
      fill="none"
      stroke="currentColor"
      strokeWidth="2.4"
      strokeLinecap="round"
      strokeDasharray="0.01 5.226"
    />
  ),
}

/** Solid, half, crossed and dotted: told apart without colour. */
export function VerdictIcon({ verdict, size = 24, isDecorative = false }: VerdictIconProps) {
  const name = isDecorative ? { 'aria-hidden': true } : { role: 'img', 'aria-label': verdictWords[verdict] }
  return (
    <svg
      {...name}
      width={size}
      height={size}
      viewBox="0 0 24 24"
      className={`flex-none ${verdictTextClasses[verdict]}`}
    >
      {shapes[verdict]}
    </svg>
  )
}
