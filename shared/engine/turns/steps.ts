import type { UnitSystem } from '../../units/systems'
import { fromShown, toShown } from '../../units/convert'
import { units, type CanonicalUnit } from '../../units/units'

/** Steps of what somebody reads on a tape, meter or thermometer and what is printed; 1 of any other unit. */
const stepByUnit: Readonly<Record<string, number>> = { in: 0.1, ft: 0.1, m: 0.01, '°C': 0.1, '/h': 0.1 }

/** Rid of the binary noise that sums of tenths leave. */
const clean = (value: number): number => Number(value.toPrecision(12))

/**
 * Values `count` steps of the person's own unit away from one, canonical. Relative: counted from it; else on the marks of
 * the scale, the first mark beyond it being one step away.
 */
export function createLadder(
  from: number,
  unit: CanonicalUnit,
  system: UnitSystem,
  isMore: boolean,
  isRelative: boolean,
): (count: number) => number {
  const step = stepByUnit[units[unit][system]] ?? 1
  const shown = toShown(from, unit, system)
  const mark = shown / step
  const start = isRelative ? mark : isMore ? Math.floor(mark + 1e-9) : Math.ceil(mark - 1e-9)
  return (count) => (count === 0 ? from : fromShown(clean((start + (isMore ? count : -count)) * step), unit, system))
}
