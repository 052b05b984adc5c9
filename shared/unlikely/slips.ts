import { toShown } from '../units/convert'
import { units, type CanonicalUnit } from '../units/units'
import type { MeasureAttribute } from '../kinds/types'

export interface Slip {
  /** What was written is this many times what was meant. */
  readonly factor: number
  readonly because: string
}

const decimalSlips: readonly Slip[] = [10, 1000].flatMap((factor) => {
  const because = factor === 10 ? 'the decimal point is one place off' : 'the decimal point is three places off'
  return [
    { factor, because },
    { factor: 1 / factor, because },
  ]
})

/** Temperatures and their differences have a scale of their own; counts and shares have no second unit. */
const isAffine = (unit: CanonicalUnit): boolean => unit === 'C' || unit === 'K'

/** How many of the metric unit one of the US unit is: 25.4 for lengths, 3.785 for volumes; null where both are one unit. */
function findUnitFactor(unit: CanonicalUnit): number | null {
  const { us, metric } = units[unit]
  if (us === metric || isAffine(unit)) return null
  return toShown(1, unit, 'metric') / toShown(1, unit, 'us')
}

function listUnitSlips(unit: CanonicalUnit): readonly Slip[] {
  const factor = findUnitFactor(unit)
  if (factor === null) return []
  const { us, metric } = units[unit]
  return [
    { factor: 1 / factor, because: `${us} were read as ${metric}` },
    { factor, because: `${metric} were read as ${us}` },
  ]
}

/** By what a number of this unit is usually wrong when it is wrong: mixed-up units, then decimal places. */
export function listSlips({ unit }: Pick<MeasureAttribute, 'unit'>): readonly Slip[] {
  return [...listUnitSlips(unit), ...decimalSlips]
}

/** Rid of the noise of a division, and short enough to be typed. */
export const undoSlip = (value: number, { factor }: Slip): number => Number((value / factor).toPrecision(7))
