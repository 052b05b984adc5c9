import type { Check, Outcome, Zone } from '#shared/engine/types'

/** The two sides of a limit: which one fails follows from the side that the value stands on and the sign of its margin. */
export function zonesFromLimit(
  value: number | null,
  limit: Check['limit'],
  margin: number | null,
  outcome: Outcome,
): readonly Zone[] {
  const beyond: Outcome = outcome === 'change' ? 'change' : 'fail'
  if (limit === null) return []
  if (typeof limit !== 'number') {
    return [
      { from: -Infinity, to: limit[0], outcome: beyond },
      { from: limit[1], to: Infinity, outcome: beyond },
    ]
  }
  if (value === null) return []
  const keeps = margin === null ? outcome === 'pass' : margin >= 0
  const isUpper = value <= limit === keeps
  return [isUpper ? { from: limit, to: Infinity, outcome: beyond } : { from: -Infinity, to: limit, outcome: beyond }]
}

/** The end of the limit that the margin is measured to. */
export function nearestLimit(value: number, limit: NonNullable<Check['limit']>): number {
  if (typeof limit === 'number') return limit
  return Math.abs(value - limit[0]) <= Math.abs(value - limit[1]) ? limit[0] : limit[1]
}
