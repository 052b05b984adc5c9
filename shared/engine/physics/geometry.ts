import { findLast } from './bisect'
import { requireFinite } from './finite'

/** Two sides in mm, in either order. */
export type Rectangle = readonly [number, number]

/** What lengths that are compared may differ by before it counts, mm: less than a tape can show. */
export const lengthToleranceMm = 0.05

/**
 * Whether a rectangle fits inside another at any angle. Sides exact: allow for tolerance or clearance beforehand.
 * Source: W. B. Carver 1957, American Mathematical Monthly 64; J. E. Wetzel 2000, Mathematics Magazine 73(3), 204–211.
 * RangeError for NaN.
 */
export function fitsRectangle(piece: Rectangle, space: Rectangle): boolean {
  const [p, q] = sortSides('piece', piece)
  const [a, b] = sortSides('space', space)
  return isInside(p, q, a, b)
}

/** The same for sides already checked and sorted, p ≥ q and a ≥ b. */
function isInside(p: number, q: number, a: number, b: number): boolean {
  if (q > b) return false
  if (p <= a) return true
  const diagonal2 = p * p + q * q
  return b * diagonal2 >= 2 * p * q * a + (p * p - q * q) * Math.sqrt(diagonal2 - a * a)
}

function sortSides(name: string, [one, other]: Rectangle): [number, number] {
  requireFinite({ [`${name}[0]`]: one, [`${name}[1]`]: other })
  return one >= other ? [one, other] : [other, one]
}

/**
 * The greatest length that a strip of the given width may have and still fit at some angle, mm; null if the strip is too
 * wide at any length. Found by bisection, since a shorter strip of the same width fits wherever a longer one does.
 * RangeError for NaN.
 */
export function findLongestMm(widthMm: number, space: Rectangle): number | null {
  const [a, b] = sortSides('space', space)
  requireFinite({ widthMm })
  return findLast(
    (lengthMm) => isInside(Math.max(lengthMm, widthMm), Math.min(lengthMm, widthMm), a, b),
    0,
    Math.hypot(a, b),
  )
}

/**
 * How much longer a rectangle's first side could be, at the same second side, before it no longer fits, mm; negative: how
 * much shorter it must be. Null if no length would do. RangeError for NaN.
 */
export function slackInRectangleMm([lengthMm, widthMm]: Rectangle, space: Rectangle): number | null {
  const longestMm = findLongestMm(widthMm, space)
  requireFinite({ lengthMm })
  return longestMm === null ? null : longestMm - lengthMm
}

/** Whether a box can be put straight through a rectangular opening, some face first. RangeError for NaN. */
export function passesOpening(sidesMm: readonly [number, number, number], openingMm: Rectangle): boolean {
  const [x, y, z] = sidesMm
  return fitsRectangle([x, y], openingMm) || fitsRectangle([x, z], openingMm) || fitsRectangle([y, z], openingMm)
}
