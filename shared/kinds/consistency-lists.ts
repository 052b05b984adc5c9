import type { BareSpecs, Inconsistency } from './types'

const isObject = (value: unknown): value is BareSpecs =>
  typeof value === 'object' && value !== null && !Array.isArray(value)

/** The objects of a list attribute with their places in it; empty where it is absent or something else. */
export function readEntries(value: unknown): readonly { readonly index: number; readonly entry: BareSpecs }[] {
  if (!Array.isArray(value)) return []
  return value.flatMap((entry: unknown, index) => (isObject(entry) ? [{ index, entry }] : []))
}

/** A pump delivers less the higher it must lift; points may come in any order. */
export function findCurveFaults({ flowCurve }: BareSpecs): Inconsistency[] {
  const points = readEntries(flowCurve)
    .flatMap(({ index, entry }) =>
      typeof entry['headM'] === 'number' && typeof entry['flowLph'] === 'number'
        ? [{ index, headM: entry['headM'], flowLph: entry['flowLph'] }]
        : [],
    )
    .sort((a, b) => a.headM - b.headM)
  if (!Array.isArray(flowCurve)) return []
  if (flowCurve.length < 2) return [{ path: 'flowCurve', detail: 'a flow curve needs at least two points' }]
  return points.slice(1).flatMap((point, i) => {
    const lower = points[i]
    if (!lower) return []
    if (point.headM === lower.headM) {
      return [
        {
          path: `flowCurve.${point.index}.headM`,
          detail: 'two points of a flow curve have the same head',
        },
      ]
    }
    if (point.flowLph < lower.flowLph) return []
    return [
      {
        path: `flowCurve.${point.index}.flowLph`,
        detail: 'flow must fall as head rises',
      },
    ]
  })
}

/** Shares come rounded to whole percents, so their sum may pass 1 by that much. */
const shareRoundingSum = 0.01

export function findLightFaults(specs: BareSpecs): Inconsistency[] {
  const faults: Inconsistency[] = []
  const bands = readEntries(specs['bands']).flatMap(({ index, entry }) => {
    const { fromNm, toNm, share } = entry
    return typeof fromNm === 'number' && typeof toNm === 'number' && typeof share === 'number'
      ? [{ index, fromNm, toNm, share }]
      : []
  })
  for (const band of bands) {
    if (band.fromNm >= band.toNm) {
      faults.push({
        path: `bands.${band.index}.fromNm`,
        detail: 'a band must end at a longer wavelength than it begins',
      })
    }
  }
  const sorted = [...bands].sort((a, b) => a.fromNm - b.fromNm)
  sorted.slice(1).forEach((band, i) => {
    if (band.fromNm < (sorted[i]?.toNm ?? 0)) {
      faults.push({
        path: `bands.${band.index}.fromNm`,
        detail: 'bands must not overlap',
      })
    }
  })
  if (bands.reduce((sum, band) => sum + band.share, 0) > 1 + shareRoundingSum) {
    faults.push({
      path: 'bands',
      detail: 'shares of photons must not add up to more than 1',
    })
  }
  if (specs['control'] === 'on-off' && specs['dimmable'] === true) {
    faults.push({
      path: 'dimmable',
      detail: 'a light that is only on or off cannot be dimmed',
    })
  }
  return faults
}
