import type { Source } from '../types'
import { requireFinite } from './finite'

/**
 * The standard normal distribution function Φ(z), to about 1e-15.
 * Source: the series ½ + φ(z)(z + z³/3 + z⁵/(3·5) + …), Abramowitz & Stegun 26.2.11. RangeError for NaN.
 */
export function normalCdf(z: number): number {
  if (Number.isNaN(z)) throw new RangeError('z must be a number')
  if (z > 8) return 1
  if (z < -8) return 0
  let term = z
  let sum = z
  for (let odd = 3; Math.abs(term) > 1e-17 * Math.abs(sum); odd += 2) {
    term *= (z * z) / odd
    sum += term
  }
  return Math.min(1, Math.max(0, 0.5 + (sum * Math.exp((-z * z) / 2)) / Math.sqrt(2 * Math.PI)))
}

/** Half-widths taken where a value states none: of a length in mm, of anything else as a share of the value. */
export const defaultPlusMinus = {
  measured: { lengthMm: 1, share: 0.02 },
  maker: { lengthMm: 3, share: 0.05 },
  estimate: { lengthMm: null, share: 0.1 },
} as const satisfies Record<Source, { lengthMm: number | null; share: number }>

/**
 * Standard uncertainty of a value known to ± a, u = a/√3 (JCGM 100:2008, 4.3.7: uniform), in the value's unit. Without a
 * stated ±: measured ± 1 mm for a length, else ± 2 %; maker ± 3 mm, else ± 5 %; estimate ± 10 % of either (common
 * practice). RangeError for NaN.
 */
export function standardUncertainty(
  value: number,
  source: Source,
  plusMinus: number | undefined,
  quantity: 'length' | 'other',
): number {
  const byDefault = defaultPlusMinus[source]
  const byLength = quantity === 'length' ? byDefault.lengthMm : null
  const halfWidth = plusMinus ?? byLength ?? byDefault.share * Math.abs(value)
  requireFinite({ value, halfWidth })
  return Math.abs(halfWidth) / Math.sqrt(3)
}

/** Uncertainty of a sum or difference of independent values: the root of the sum of squares (JCGM 100:2008, eq. 10). */
export function combineUncertainties(...standardUncertainties: readonly number[]): number {
  return Math.hypot(...standardUncertainties)
}

function shareBelow(value: number, limit: number, uncertainty: number): number {
  requireFinite({ value, limit, uncertainty })
  if (uncertainty <= 0) return value <= limit ? 1 : 0
  return normalCdf((limit - value) / uncertainty)
}

/** Probability that a measured value with standard uncertainty u is at most the limit: Φ((limit − value)/u), JCGM 106:2012. */
export function probabilityAtMost(value: number, limit: number, uncertainty: number): number {
  return shareBelow(value, limit, uncertainty)
}

/** Probability that it is at least the limit: Φ((value − limit)/u), JCGM 106:2012. RangeError for NaN. */
export function probabilityAtLeast(value: number, limit: number, uncertainty: number): number {
  return shareBelow(-value, -limit, uncertainty)
}

/** Probability that it lies between two limits: Φ((upper − value)/u) − Φ((lower − value)/u), JCGM 106:2012. */
export function probabilityWithin(value: number, lower: number, upper: number, uncertainty: number): number {
  const above = 1 - probabilityAtLeast(value, lower, uncertainty)
  return Math.max(0, probabilityAtMost(value, upper, uncertainty) - above)
}

/**
 * Probability that something which can be set from `least` to `most`, both as uncertain, reaches an interval: that the most
 * is at least its lower end and the least at most its upper one, whichever is less sure.
 */
export function probabilityReaches(
  [least, most]: readonly [number, number],
  lower: number,
  upper: number,
  uncertainty: number,
): number {
  return Math.min(probabilityAtLeast(most, lower, uncertainty), probabilityAtMost(least, upper, uncertainty))
}

/** Neither clearly kept nor clearly broken: a probability between 5 and 95 % (common practice). */
export function isCloseCall(probability: number): boolean {
  return probability > 0.05 && probability < 0.95
}
