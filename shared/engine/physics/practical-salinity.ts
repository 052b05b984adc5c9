import { findLast } from './bisect'
import { requireFinite } from './finite'

/** Conductivity of standard sea water, S = 35 at 15 °C (IPTS-68) and one atmosphere, mS/cm. */
export const standardConductivityMSCm = 42.914

const a = [0.008, -0.1692, 25.3851, 14.0941, -7.0261, 2.7081]
const b = [0.0005, -0.0056, -0.0066, -0.0375, 0.0636, -0.0144]

/**
 * Practical salinity from the conductivity ratio C(S, t, p)/C(35, 15, 0). Temperature on IPTS-68; pressure above that of the
 * air in dbar, 0 at the surface. Source: PSS-78, UNESCO Technical Papers in Marine Science 44, eqs 1–4. Range: salinity
 * 2–42, −2…35 °C. Negative ratios count as 0. RangeError for NaN.
 */
export function practicalSalinity(ratio: number, t68C: number, pressureDbar = 0): number {
  requireFinite({ ratio, t68C, pressureDbar })
  const t = t68C
  const p = pressureDbar
  const r = Math.max(0, ratio)
  const rt = 0.6766097 + t * (2.00564e-2 + t * (1.104259e-4 + t * (-6.9698e-7 + t * 1.0031e-9)))
  const compressed = p * (2.07e-5 + p * (-6.37e-10 + p * 3.989e-15))
  const rp = 1 + compressed / (1 + t * (3.426e-2 + t * 4.464e-4) + (0.4215 - 3.107e-3 * t) * r)
  const root = Math.sqrt(r / (rp * rt))
  const polynomial = (factors: readonly number[]) => factors.reduceRight((sum, factor) => sum * root + factor, 0)
  return polynomial(a) + ((t - 15) / (1 + 0.0162 * (t - 15))) * polynomial(b)
}

/** Practical salinity from a conductivity in mS/cm and the water's temperature in °C (ITS-90). Same source and range. */
export function salinityFromConductivity(conductivityMSCm: number, temperatureC: number, pressureDbar = 0): number {
  return practicalSalinity(conductivityMSCm / standardConductivityMSCm, temperatureC * 1.00024, pressureDbar)
}

/** Conductivity in mS/cm of water of a practical salinity at one atmosphere: the inverse, by bisection. RangeError for NaN. */
export function conductivityMSCm(salinityPpt: number, temperatureC: number): number {
  requireFinite({ salinityPpt, temperatureC })
  return findLast((mSCm) => salinityFromConductivity(mSCm, temperatureC) <= salinityPpt, 0, 120) ?? 0
}
