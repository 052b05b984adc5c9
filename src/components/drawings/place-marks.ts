import type { Mark } from '#shared/engine/types'
import { assignLanes } from './assign-lanes'
import { placePercent, type Domain } from './scale-domain'

export interface StandingMark extends Mark {
  readonly value: number
}

export interface PinnedMark extends StandingMark {
  /** Along the axis, 0 to 100. */
  readonly share: number
  readonly xPx: number
  /** Of the head above the axis: neighbours stand on different lanes. */
  readonly pinPx: number
}

const lanes = 5
const lanePx = 9
const lowestPx = 12

/** The marks that have a value of this key, lowest first. */
export function standingMarks(marks: readonly Mark[], key: string): readonly StandingMark[] {
  return marks
    .flatMap((mark) => {
      const value = mark.values[key]
      return typeof value === 'number' ? [{ ...mark, value }] : []
    })
    .sort((a, b) => a.value - b.value)
}

export function pinMarks(marks: readonly StandingMark[], domain: Domain, widthPx: number): readonly PinnedMark[] {
  const shares = marks.map((mark) => placePercent(mark.value, domain))
  const xs = shares.map((share) => (share / 100) * widthPx)
  const laneOf = assignLanes(xs, lanePx, lanes)
  return marks.map((mark, at) => ({
    ...mark,
    share: shares[at] ?? 0,
    xPx: xs[at] ?? 0,
    pinPx: lowestPx + (laneOf[at] ?? 0) * lanePx,
  }))
}
