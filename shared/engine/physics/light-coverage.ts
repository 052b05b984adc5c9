import { requireFinite } from './finite'
import type { LightMap } from './light-map'

export interface Coverage {
  /** Percent of full power. */
  readonly powerPercent: number
  /** Share of the plane inside the band, 0–1. */
  readonly share: number
}

export interface MapSummary {
  readonly lowestUmol: number
  readonly brightestUmol: number
  readonly meanUmol: number
}

/** Lowest, brightest and mean PPFD of a map at full power, µmol/(m² s). */
export function summariseMap({ cells }: LightMap): MapSummary {
  const sum = cells.reduce((total, cell) => total + cell, 0)
  return { lowestUmol: Math.min(...cells), brightestUmol: Math.max(...cells), meanUmol: sum / cells.length }
}

/** Share of a map's plane inside [low, high] µmol/(m² s), with the lights at a percentage of full power. RangeError for NaN. */
export function shareInBand(map: LightMap, band: readonly [number, number], powerPercent = 100): number {
  return shareOfSorted(map.cells.toSorted(), band, powerPercent)
}

/** Share of a map's plane above a limit, at a percentage of full power. RangeError for NaN. */
export function shareAbove(map: LightMap, limitUmol: number, powerPercent = 100): number {
  requireFinite({ limitUmol, powerPercent })
  return map.cells.filter((cell) => (cell * powerPercent) / 100 > limitUmol).length / map.cells.length
}

/**
 * The dimming in steps of 1 % that brings most of the plane into the band; of equals the lowest, which spends least and is
 * gentlest. RangeError for NaN.
 */
export function findBestDimming(map: LightMap, band: readonly [number, number]): Coverage {
  const sorted = map.cells.toSorted()
  let best: Coverage = { powerPercent: 1, share: shareOfSorted(sorted, band, 1) }
  for (let powerPercent = 2; powerPercent <= 100; powerPercent += 1) {
    const share = shareOfSorted(sorted, band, powerPercent)
    if (share > best.share) best = { powerPercent, share }
  }
  return best
}

function shareOfSorted(sorted: Float64Array, [low, high]: readonly [number, number], powerPercent: number): number {
  requireFinite({ low, high, powerPercent })
  const scale = powerPercent / 100
  const from = countBelow(sorted, (cell) => cell * scale < low)
  const to = countBelow(sorted, (cell) => cell * scale <= high)
  return Math.max(0, to - from) / sorted.length
}

function countBelow(sorted: Float64Array, isBelow: (cell: number) => boolean): number {
  let from = 0
  let to = sorted.length
  while (from < to) {
    const middle = (from + to) >> 1
    if (isBelow(sorted[middle] ?? Number.POSITIVE_INFINITY)) from = middle + 1
    else to = middle
  }
  return from
}
