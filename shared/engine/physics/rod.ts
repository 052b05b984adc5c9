import { findLast } from './bisect'
import { requireFinite } from './finite'
import { findLongestMm, slackInRectangleMm, type Rectangle } from './geometry'

export interface Rod {
  readonly lengthMm: number
  readonly diameterMm: number
}

/** Sides along and across in plan and the height that may be used, mm: any clearance already taken off. */
export interface RodSpace {
  readonly lengthMm: number
  readonly widthMm: number
  readonly heightMm: number
}

export interface RodFit {
  readonly fits: boolean
  /** How much longer the rod could be; negative: how much shorter it must be. Null: too thick at any length. */
  readonly slackMm: number | null
  /** Of the rod above the floor, for drawing it; null where it does not fit. */
  readonly angleDeg: number | null
}

/**
 * A rod leaning across a box, wholly inside it. Sufficient, not necessary: the longest strip as wide as the rod is laid
 * out in plan, ℓ, and the rod must then fit in the upright rectangle ℓ × height; no rod that passes fails to fit.
 * Source: twice Carver's theorem (see `fitsRectangle`). RangeError for NaN.
 */
export function leanRod({ lengthMm, diameterMm }: Rod, space: RodSpace): RodFit {
  requireFinite({ lengthMm, diameterMm, heightMm: space.heightMm })
  const runMm = findLongestMm(diameterMm, [space.lengthMm, space.widthMm])
  if (runMm === null) return { fits: false, slackMm: null, angleDeg: null }
  const slackMm = slackInRectangleMm([lengthMm, diameterMm], [runMm, space.heightMm])
  const fits = slackMm !== null && slackMm >= 0
  return { fits, slackMm, angleDeg: fits ? findLeanDeg({ lengthMm, diameterMm }, runMm, space.heightMm) : null }
}

/**
 * The flattest angle at which both the run L cos θ + d sin θ and the rise L sin θ + d cos θ are within bounds. The run
 * shrinks from atan(d/L) on, the rise from atan(L/d) on: a rod too long to lie may have to stand nearly upright.
 */
function findLeanDeg({ lengthMm, diameterMm }: Rod, runMm: number, riseMm: number): number {
  if (lengthMm <= runMm) return 0
  const span = (angle: number) => lengthMm * Math.cos(angle) + diameterMm * Math.sin(angle)
  const upright = Math.PI / 2
  const byRun = findLast((angle) => span(angle) > runMm, Math.atan2(diameterMm, lengthMm), upright) ?? 0
  if (span(upright - byRun) <= riseMm) return toDegrees(byRun)
  const highest = Math.max(byRun, Math.atan2(lengthMm, diameterMm))
  return toDegrees(findLast((angle) => span(upright - angle) > riseMm, highest, upright) ?? byRun)
}

function toDegrees(angle: number): number {
  return (angle * 180) / Math.PI
}

/** A rod lying on the floor, at any angle in plan. RangeError for NaN. */
export function layRodFlat({ lengthMm, diameterMm }: Rod, plan: Rectangle): RodFit {
  const slackMm = slackInRectangleMm([lengthMm, diameterMm], plan)
  const fits = slackMm !== null && slackMm >= 0
  return { fits, slackMm, angleDeg: fits ? 0 : null }
}
