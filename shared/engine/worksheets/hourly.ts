import type { WarmingPoint } from '../physics/stuck-on'

export interface HourlyPoint {
  readonly hour: number
  readonly waterC: number
}

const hoursShown = 24

/** A warming or cooling read off at every hour of a day; where it ends sooner, the water has settled. */
export function readHourly(series: readonly WarmingPoint[]): readonly HourlyPoint[] {
  return Array.from({ length: hoursShown + 1 }, (_, hour) => ({ hour, waterC: readAt(series, hour) }))
}

function readAt(series: readonly WarmingPoint[], hour: number): number {
  const next = series.findIndex(({ hours }) => hours >= hour)
  const after = series[next]
  const before = series[next - 1]
  if (after === undefined) return series.at(-1)?.waterC ?? Number.NaN
  if (before === undefined) return after.waterC
  const share = (hour - before.hours) / (after.hours - before.hours)
  return before.waterC + share * (after.waterC - before.waterC)
}
