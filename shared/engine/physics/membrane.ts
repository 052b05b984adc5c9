import { requireFinite } from './finite'

/** Dissolved solids taken for a membrane's rating where it states none, ppm. */
export const defaultTestTdsPpm = 250

export interface MembraneRating {
  readonly ratedLpd: number
  readonly testPressureKPa: number
  readonly testTempC: number
  /** Not given: 250 ppm. */
  readonly testTdsPpm?: number
}

export interface MembraneFeed {
  readonly feedKPa: number
  readonly feedTempC: number
  readonly feedTdsPpm: number
  /** Litres of waste per litre of product. */
  readonly wasteRatio: number
}

/**
 * Factor by which a membrane's output at 25 °C is multiplied at another temperature: exp[U(1/298 − 1/(273 + T))],
 * U = 2640 from 25 °C up and 3020 below. Source: membrane maker's technical manual, form 45-D01504-en. Tables that print
 * the divisor give its reciprocal. Range about 5–35 °C. RangeError for NaN.
 */
export function temperatureFactor(temperatureC: number): number {
  requireFinite({ temperatureC })
  return Math.exp((temperatureC >= 25 ? 2640 : 3020) * (1 / 298 - 1 / (273 + temperatureC)))
}

/** Osmotic pressure of a feed under 20 000 ppm, kPa: C (T + 320)/491000 bar (same manual). RangeError for NaN. */
export function osmoticPressureKPa(tdsPpm: number, temperatureC: number): number {
  requireFinite({ tdsPpm, temperatureC })
  return ((tdsPpm * (temperatureC + 320)) / 491000) * 100
}

/** Share of the feed that becomes product: Y = 1/(1 + waste per product). RangeError for NaN. */
export function recoveryShare(wasteRatio: number): number {
  requireFinite({ wasteRatio })
  return 1 / (1 + Math.max(0, wasteRatio))
}

/**
 * How much stronger than the feed the water along a membrane is on average: ln(1/(1 − Y))/Y (same manual). At Y = 1, where
 * all salt would stay, it has no end: recovery is held to 99 %. RangeError for NaN.
 */
export function concentrationFactor(recovery: number): number {
  requireFinite({ recovery })
  if (recovery <= 0) return 1
  const held = Math.min(0.99, recovery)
  return -Math.log1p(-held) / held
}

/**
 * Pressure that drove the membrane when it was rated, kPa: the test's less the osmotic pressure along it. Not above 0: the
 * test cannot have given any product, so that one of its numbers is wrong. RangeError for NaN.
 */
export function findRatedDriveKPa(
  { testPressureKPa, testTempC, testTdsPpm = defaultTestTdsPpm }: Omit<MembraneRating, 'ratedLpd'>,
  wasteRatio: number,
): number {
  requireFinite({ testPressureKPa })
  const stronger = concentrationFactor(recoveryShare(wasteRatio))
  return testPressureKPa - osmoticPressureKPa(testTdsPpm * stronger, testTempC)
}

/**
 * Product of a membrane on a feed, L/day: rated × NDP / rated NDP × temperature factor, where NDP is the feed's pressure
 * less the osmotic pressure along the membrane. Pressure drop along it and the product's own pressure are left out. A
 * rating at another temperature than 25 °C is brought to it first. 0 where the feed's pressure does not overcome osmosis.
 * RangeError for NaN, and for a rating whose own pressure does not (see `findRatedDriveKPa`).
 */
export function membraneFlowLpd(rating: MembraneRating, feed: MembraneFeed): number {
  const { ratedLpd, testTempC } = rating
  requireFinite({ ratedLpd, feedKPa: feed.feedKPa })
  const stronger = concentrationFactor(recoveryShare(feed.wasteRatio))
  const ratedDrive = findRatedDriveKPa(rating, feed.wasteRatio)
  if (ratedDrive <= 0) throw new RangeError('the test pressure must overcome osmosis')
  const drive = feed.feedKPa - osmoticPressureKPa(feed.feedTdsPpm * stronger, feed.feedTempC)
  if (drive <= 0) return 0
  return ((ratedLpd * drive) / ratedDrive) * (temperatureFactor(feed.feedTempC) / temperatureFactor(testTempC))
}
