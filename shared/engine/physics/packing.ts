import { requireFinite } from './finite'
import type { Rectangle } from './geometry'
import { placeAll, roundingMm, type PlacedRectangle } from './packing-search'

export type Packing =
  { readonly outcome: 'fits'; readonly placed: readonly PlacedRectangle[] } | { readonly outcome: 'no' | 'unknown' }

/** Up to this many pieces every arrangement is tried; above it only one, so a failure proves nothing. */
export const exactPackingLimit = 5

/**
 * Whether pieces can stand side by side in a rectangle, square to its walls and each turned by 90° if need be, with
 * `clearanceMm` between them and to every wall. Exact up to five pieces; with more, 'unknown' where neither the total
 * area rules it out nor placing the largest first succeeds. RangeError for NaN.
 */
export function packRectangles(pieces: readonly Rectangle[], space: Rectangle, clearanceMm = 0): Packing {
  requireFinite({ clearanceMm, spaceLengthMm: space[0], spaceWidthMm: space[1] })
  const room: Rectangle = [space[0] - clearanceMm + roundingMm, space[1] - clearanceMm + roundingMm]
  const grown = pieces.map(([length, width], piece) => {
    requireFinite({ lengthMm: length, widthMm: width })
    return { piece, sides: [length + clearanceMm, width + clearanceMm] as Rectangle }
  })
  const needed = grown.reduce((sum, { sides }) => sum + sides[0] * sides[1], 0)
  if (needed > room[0] * room[1] && pieces.length > 0) return { outcome: 'no' }
  const bySize = grown.sort((one, other) => other.sides[0] * other.sides[1] - one.sides[0] * one.sides[1])
  const isExact = pieces.length <= exactPackingLimit
  const placed = placeAll(bySize, room, isExact)
  if (placed === null)
    return { outcome: isExact || !bySize.every(({ sides }) => fitsAlone(sides, room)) ? 'no' : 'unknown' }
  return { outcome: 'fits', placed: placed.map((one) => shrink(one, clearanceMm)) }
}

function fitsAlone([length, width]: Rectangle, [a, b]: Rectangle): boolean {
  return (length <= a && width <= b) || (length <= b && width <= a)
}

function shrink(one: PlacedRectangle, clearanceMm: number): PlacedRectangle {
  return {
    piece: one.piece,
    xMm: one.xMm + clearanceMm,
    yMm: one.yMm + clearanceMm,
    lengthMm: one.lengthMm - clearanceMm,
    widthMm: one.widthMm - clearanceMm,
  }
}
