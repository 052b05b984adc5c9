import type { Rectangle } from './geometry'

/** A piece in plan: its corner nearest the origin and its sides as turned, mm. */
export interface PlacedRectangle {
  readonly piece: number
  readonly xMm: number
  readonly yMm: number
  readonly lengthMm: number
  readonly widthMm: number
}

export interface PackedPiece {
  readonly piece: number
  readonly sides: Rectangle
}

/** Edges this close count as touching. */
export const roundingMm = 1e-6

/**
 * Places every piece in the room without overlap, or returns null; unless exact, only one order and one spot are tried.
 *
 * Any arrangement can be pushed towards one corner until each piece touches a wall or another piece on both of those
 * sides, and convex pieces can always be ordered so that each leans only on earlier ones (Guibas & Yao 1980, On
 * translating a set of rectangles; cited from memory). So trying every order, with corners at edges of the pieces already placed,
 * misses nothing.
 */
export function placeAll(
  pieces: readonly PackedPiece[],
  room: Rectangle,
  isExact: boolean,
): readonly PlacedRectangle[] | null {
  return place(pieces, [], room, isExact, new Set())
}

function place(
  left: readonly PackedPiece[],
  placed: readonly PlacedRectangle[],
  room: Rectangle,
  isExact: boolean,
  tried: Set<string>,
): readonly PlacedRectangle[] | null {
  if (left.length === 0) return placed
  const arrangement = describe(placed)
  if (tried.has(arrangement)) return null
  tried.add(arrangement)
  const choices = (isExact ? left : left.slice(0, 1)).map((next) => ({ next, spots: listSpots(next, placed, room) }))
  // Room only shrinks: a piece without a spot now will not find one later.
  if (choices.some(({ spots }) => spots.length === 0)) return null
  for (const { next, spots } of choices) {
    const rest = left.filter((one) => one !== next)
    for (const spot of isExact ? spots : spots.slice(0, 1)) {
      const done = place(rest, [...placed, spot], room, isExact, tried)
      if (done !== null) return done
    }
  }
  return null
}

function listSpots(
  { piece, sides }: PackedPiece,
  placed: readonly PlacedRectangle[],
  room: Rectangle,
): PlacedRectangle[] {
  const xs = [...new Set([0, ...placed.map((one) => one.xMm + one.lengthMm)])]
  const ys = [...new Set([0, ...placed.map((one) => one.yMm + one.widthMm)])]
  const turns = sides[0] === sides[1] ? [sides] : [sides, [sides[1], sides[0]] as const]
  return turns.flatMap(([lengthMm, widthMm]) =>
    xs.flatMap((xMm) =>
      ys
        .map((yMm) => ({ piece, xMm, yMm, lengthMm, widthMm }))
        .filter((spot) => xMm + lengthMm <= room[0] && spot.yMm + widthMm <= room[1])
        .filter((spot) => placed.every((one) => !overlap(spot, one)))
        .filter((spot) => isPushedHome(spot, placed)),
    ),
  )
}

/** The same whatever the order of placing, so that no arrangement is searched twice. */
function describe(placed: readonly PlacedRectangle[]): string {
  return placed
    .map((one) => [one.piece, one.xMm, one.yMm, one.lengthMm].join(' '))
    .sort()
    .join()
}

/** Touching a wall or an earlier piece on both near sides: nothing else needs trying. */
function isPushedHome(spot: PlacedRectangle, placed: readonly PlacedRectangle[]): boolean {
  const nudged = (xMm: number, yMm: number) =>
    xMm < -roundingMm || yMm < -roundingMm || placed.some((one) => overlap({ ...spot, xMm, yMm }, one))
  return nudged(spot.xMm - 3 * roundingMm, spot.yMm) && nudged(spot.xMm, spot.yMm - 3 * roundingMm)
}

function overlap(one: PlacedRectangle, other: PlacedRectangle): boolean {
  return (
    one.xMm + one.lengthMm > other.xMm + roundingMm &&
    other.xMm + other.lengthMm > one.xMm + roundingMm &&
    one.yMm + one.widthMm > other.yMm + roundingMm &&
    other.yMm + other.widthMm > one.yMm + roundingMm
  )
}
