import { describe, expect, it } from 'vitest'
import { ampsToWatts, energyKWh, findLoadLimits, wattsToAmps } from '#shared/engine/physics/loads'
import { expectWithin } from './within'

describe('what a circuit may carry', () => {
  // NEC 210.19(A)(1) and 210.20(A): a continuous load counts at 125 %, which leaves four fifths of the rating.
  it.each([
    [15, 120, 1800, 1440],
    [20, 120, 2400, 1920],
  ])('at %d A and %d V is %d W, and %d W for hours on end', (amps, volts, rated, continuous) => {
    expect(findLoadLimits(volts, [amps])).toEqual({ ratedW: rated, continuousW: continuous })
  })

  // BS 1363 fused plug (rating from memory) and common European circuits, watts at 230 V.
  it.each([
    [13, 2990],
    [16, 3680],
    [10, 2300],
  ])('at %d A and 230 V is %d W', (amps, watts) => {
    expect(ampsToWatts(amps, 230)).toBe(watts)
    expectWithin(wattsToAmps(watts, 230), amps, 1e-12)
  })

  it('is decided by the lowest rating on the way', () => {
    expect(findLoadLimits(120, [15, 10]).ratedW).toBe(1200)
    expect(findLoadLimits(230, [13, 16]).continuousW).toBeCloseTo(2392, 9)
  })

  it('cannot be told without a rating or a voltage', () => {
    expect(() => findLoadLimits(120, [])).toThrow(RangeError)
    expect(() => wattsToAmps(100, 0)).toThrow(RangeError)
    expect(() => ampsToWatts(Number.NaN, 120)).toThrow(RangeError)
  })
})

describe('energy', () => {
  it('of 165 W over 30 days is 118.8 kWh', () => {
    // 165 W × 720 h.
    expectWithin(energyKWh(165, 720), 118.8, 1e-9)
  })
})
