import { requireFinite } from './finite'

/** Of a circuit's or strip's rating, for loads of three hours or more: NEC 210.20(A) for 120 V; elsewhere common practice. */
export const continuousShare = 0.8

/** What a current at the mains voltage can carry, W (power factor 1). RangeError for NaN. */
export function ampsToWatts(amps: number, volts: number): number {
  requireFinite({ amps, volts })
  return amps * volts
}

/** The current that a load draws, A (power factor 1). RangeError for NaN; zero or negative voltage is one. */
export function wattsToAmps(watts: number, volts: number): number {
  requireFinite({ watts, volts })
  if (volts <= 0) throw new RangeError(`volts must be above 0, got ${volts}`)
  return watts / volts
}

export interface LoadLimits {
  /** Four fifths of the lower rating: what may run for hours on end. */
  readonly continuousW: number
  readonly ratedW: number
}

/**
 * The load that ratings in series allow, W: the lowest of them counts (circuit, strip, fuse of the plug).
 * RangeError for NaN, or when no rating is given.
 */
export function findLoadLimits(volts: number, ratingsA: readonly number[]): LoadLimits {
  if (ratingsA.length === 0) throw new RangeError('at least one rating is needed')
  const ratedW = ampsToWatts(Math.min(...ratingsA), volts)
  return { continuousW: continuousShare * ratedW, ratedW }
}

/** Energy used by a load running without pause, kWh. RangeError for NaN. */
export function energyKWh(watts: number, hours: number): number {
  requireFinite({ watts, hours })
  return (watts * hours) / 1000
}
