import { findLast } from './bisect'
import { requireFinite } from './finite'
import { specificGravity } from './seawater'

const sodiumLineNm = 589.26

/**
 * Refractive index of sea water relative to air. Source: Quan & Fry 1995, Applied Optics 34, 3477. Range: salinity 0–40,
 * 0–30 °C, 400–700 nm. RangeError for NaN.
 */
export function seawaterIndex(salinityPpt: number, temperatureC: number, wavelengthNm = sodiumLineNm): number {
  requireFinite({ salinityPpt, temperatureC, wavelengthNm })
  const s = salinityPpt
  const t = temperatureC
  const nm = wavelengthNm
  return (
    1.31405 +
    (1.779e-4 - 1.05e-6 * t + 1.6e-8 * t * t) * s -
    2.02e-6 * t * t +
    (15.868 + 0.01155 * s - 0.00423 * t) / nm -
    4382 / nm ** 2 +
    1.1455e6 / nm ** 3
  )
}

/** Refractive index of sucrose at 20 °C and 589 nm by °Brix: ICUMSA 1974. */
const sucroseIndex = [1.33299, 1.33442, 1.33586, 1.33732, 1.33879, 1.34026, 1.34175, 1.34325, 1.34477, 1.34629, 1.34782]

/**
 * What a sugar-scale refractometer shows for a refractive index at 20 °C, °Brix: straight between the whole degrees of the
 * ICUMSA 1974 table. Range 0–10; beyond it the ends are extended. RangeError for NaN.
 */
export function brixFromIndex(index: number): number {
  requireFinite({ index })
  const above = sucroseIndex.findIndex((value) => value > index)
  const right = above === -1 ? sucroseIndex.length - 1 : Math.max(1, above)
  const low = sucroseIndex[right - 1] ?? Number.NaN
  const high = sucroseIndex[right] ?? Number.NaN
  return right - 1 + (index - low) / (high - low)
}

/** What a sugar-scale refractometer shows in sea water at 20 °C, °Brix. RangeError for NaN. */
export function brixOfSeawater(salinityPpt: number): number {
  return brixFromIndex(seawaterIndex(salinityPpt, 20))
}

/**
 * NaCl by mass, g/kg, that bends light like sea water of salinity 35: 3.65 % (CRC Handbook, 57th ed., p. D-252, by
 * interpolation; seen quoted).
 */
const naclAt35 = 36.5

/** What a refractometer with a true NaCl scale shows in sea water, ppt; both scales taken as proportional. RangeError for NaN. */
export function naclReading(salinityPpt: number): number {
  requireFinite({ salinityPpt })
  return (salinityPpt * naclAt35) / 35
}

/** Salinity of sea water in which a NaCl scale shows a reading, ppt. RangeError for NaN. */
export function salinityFromNacl(readingPpt: number): number {
  requireFinite({ readingPpt })
  return (readingPpt * 35) / naclAt35
}

/**
 * Salinity of water that has a specific gravity at a sample temperature over water at another, ppt; null outside 0–60.
 * The inverse of `specificGravity`, by bisection. RangeError for NaN.
 */
export function salinityFromGravity(gravity: number, sampleC: number, waterC: number): number | null {
  requireFinite({ gravity })
  const isAtMost = (salinityPpt: number) => specificGravity(salinityPpt, sampleC, waterC) <= gravity
  return isAtMost(60) ? null : findLast(isAtMost, 0, 60)
}
