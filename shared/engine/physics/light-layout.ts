import { ppfdInAirUmol } from './beam'
import { requireFinite } from './finite'

export type LightLayout = 'point' | 'strip' | 'panel'

export interface Point {
  readonly xMm: number
  readonly yMm: number
}

export interface Face {
  readonly layout: LightLayout
  readonly lengthMm: number
  readonly widthMm: number
}

/** Full beam angle taken where a light states none (an estimate). */
export const defaultBeamAngleDeg: Readonly<Record<LightLayout, number>> = { point: 90, strip: 120, panel: 120 }

const sourceGrid: Readonly<Record<LightLayout, readonly [number, number]>> = {
  point: [1, 1],
  strip: [12, 1],
  panel: [12, 4],
}

/** Evenly spread over a length and centred on 0: the middles of `count` equal parts. */
export function spreadEvenly(count: number, lengthMm: number): number[] {
  return Array.from({ length: count }, (_, index) => ((index + 0.5) / count - 0.5) * lengthMm)
}

/**
 * Where the sources of a light sit, from its middle: one, a row of 12 along its longer side, or 12 × 4. A light hangs with
 * its length along the tank's. RangeError for NaN.
 */
export function listSources({ layout, lengthMm, widthMm }: Face): Point[] {
  requireFinite({ lengthMm, widthMm })
  const [long, short] = sourceGrid[layout]
  const isTurned = widthMm > lengthMm
  const xs = spreadEvenly(isTurned ? short : long, lengthMm)
  const ys = spreadEvenly(isTurned ? long : short, widthMm)
  return xs.flatMap((xMm) => ys.map((yMm) => ({ xMm, yMm })))
}

/** What may stick out of a tank's ends when lights hang in a row, mm (common practice). */
export const overhangMm = 100

/**
 * Middles of `count` equal lights over a tank, from the middle of its display: in a row along the length if together they
 * are no longer than the display and 100 mm, else side by side across the width. RangeError for NaN.
 */
export function layOutLights(
  count: number,
  lightLengthMm: number,
  display: { readonly lengthMm: number; readonly widthMm: number },
): Point[] {
  requireFinite({ count, lightLengthMm, displayLengthMm: display.lengthMm, displayWidthMm: display.widthMm })
  const isRow = count * lightLengthMm <= display.lengthMm + overhangMm
  return spreadEvenly(count, isRow ? display.lengthMm : display.widthMm).map((at) =>
    isRow ? { xMm: at, yMm: 0 } : { xMm: 0, yMm: at },
  )
}

/**
 * Axial intensity of each source, µmol/(s sr), such that in air the light reads `ppfdUmol` straight below its middle at
 * `ppfdAtMm`. RangeError for NaN or a distance not above 0.
 */
export function scaleToReading(sources: readonly Point[], order: number, ppfdUmol: number, ppfdAtMm: number): number {
  requireFinite({ ppfdUmol })
  const perUnit = sources.reduce(
    (sum, { xMm, yMm }) => sum + ppfdInAirUmol(1, order, ppfdAtMm, Math.hypot(xMm, yMm)),
    0,
  )
  return ppfdUmol / perUnit
}
