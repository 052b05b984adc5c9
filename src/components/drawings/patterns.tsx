import type { Outcome } from '#shared/engine/types'

/** Ids of one drawing's patterns, from its `useId`. */
export function patternId(id: string, outcome: 'fail' | 'change'): string {
  return `${id}-${outcome}`
}

/** Hatched: past the limit. Dotted: only with changes. */
export function ZonePatterns({ id }: { readonly id: string }) {
  return (
    <defs>
      <pattern
        id={patternId(id, 'fail')}
        width="6"
        height="6"
        patternUnits="userSpaceOnUse"
        patternTransform="rotate(45)"
      >
        <path d="M0 0v6" strokeWidth="2" className="stroke-no" opacity="0.55" />
      </pattern>
      <pattern id={patternId(id, 'change')} width="6" height="6" patternUnits="userSpaceOnUse">
        <circle cx="2" cy="2" r="1.1" className="fill-changes" opacity="0.75" />
      </pattern>
    </defs>
  )
}

export interface ZoneBandProps {
  readonly id: string
  readonly outcome: Outcome
  readonly x: string
  readonly width: string
  readonly y: number
  readonly height: number
}

export function ZoneBand({ id, outcome, ...box }: ZoneBandProps) {
  if (outcome !== 'fail' && outcome !== 'change') return null
  return <rect {...box} fill={`url(#${patternId(id, outcome)})`} />
}
