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
  return { fits, slackMm, angleDeg: fits ? findLeanDeg(lengthMm, diameterMm, runMm) : null }
}

/** The flattest angle at which a rod's run L cos θ + d sin θ is no longer than there is; the run shrinks from atan(d/L) on. */
function findLeanDeg(lengthMm: number, diameterMm: number, runMm: number): number {
  if (lengthMm <= runMm) return 0
  const run = (angle: number) => lengthMm * Math.cos(angle) + diameterMm * Math.sin(angle)
  const tooLong = findLast((angle) => run(angle) > runMm, Math.atan2(diameterMm, lengthMm), Math.PI / 2)
  return ((tooLong ?? Math.PI / 2) * 180) / Math.PI
}

/** A rod lying on the floor, at any angle in plan. RangeError for NaN. */
export function layRodFlat({ lengthMm, diameterMm }: Rod, plan: Rectangle): RodFit {
  const slackMm = slackInRectangleMm([lengthMm, diameterMm], plan)
  const fits = slackMm !== null && slackMm >= 0
  return { fits, slackMm, angleDeg: fits ? 0 : null }
}
