import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  concentrationFactor,
  findRatedDriveKPa,
  membraneFlowLpd,
  osmoticPressureKPa,
  recoveryShare,
  temperatureFactor,
  type MembraneFeed,
} from '#shared/engine/physics/membrane'
import { expectWithin, expectWithinShare } from './within'

const psi = 6.894757293168
const gallon = 3.785411784

describe('the temperature factor of a membrane', () => {
  // From the maker's formula (form 45-D01504-en); 15–35 °C also printed in a membrane-trade table. 1e-3.
  it.each([
    [5, 0.482],
    [10, 0.584],
    [12, 0.63],
    [15, 0.703],
    [17, 0.756],
    [20, 0.841],
    [22, 0.902],
    [25, 1],
    [26, 1.03],
    [28, 1.092],
    [29, 1.125],
    [30, 1.157],
    [35, 1.333],
  ])('multiplies the output at %d °C by %f', (temperature, factor) => {
    expectWithin(temperatureFactor(temperature), factor, 1e-3)
  })

  // Table of divisors in the trade: 1/factor; the two sources' formulas part below 20 °C, by 0.2 % at 10 °C.
  it.each([
    [10, 1.711],
    [15, 1.422],
    [20, 1.189],
    [25, 1.0],
    [26, 0.971],
    [28, 0.915],
    [29, 0.889],
  ])('is the reciprocal of the divisor printed for %d °C', (temperature, divisor) => {
    expectWithinShare(1 / temperatureFactor(temperature), divisor, 2e-3)
  })

  it('costs about a tenth for four degrees', () => {
    // The same manual, as a rule: −4 K is about −10 %. The formula gives −12.9 % from 25 °C.
    expectWithin(temperatureFactor(21), 0.871, 1e-3)
  })
})

describe('osmotic pressure', () => {
  // C(T + 320)/491000 bar, same manual; computed, 1e-4 bar.
  it.each([
    [250, 25, 0.1757],
    [500, 25, 0.3513],
    [1000, 25, 0.7026],
    [500, 15, 0.3411],
  ])('of %d ppm at %d °C is %f bar', (ppm, temperature, bar) => {
    expectWithin(osmoticPressureKPa(ppm, temperature) / 100, bar, 1e-4)
  })

  it('follows the rule of 1 psi per 100 ppm', () => {
    // The same manual, as a rule of thumb.
    expectWithinShare(osmoticPressureKPa(100, 25) / psi, 1, 0.03)
  })
})

describe('the output of a membrane', () => {
  const rating = { ratedLpd: 75 * gallon, testPressureKPa: 50 * psi, testTempC: 25, testTdsPpm: 250 }
  const feed: MembraneFeed = { feedKPa: 50 * psi, feedTempC: 25, feedTdsPpm: 250, wasteRatio: 1e9 }

  it('rated 75 US gal/day at 50 psi and 25 °C is 41.7 at 40 psi and 15 °C and 90.8 at 60 psi', () => {
    // By hand on a feed of 250 ppm, without concentration along the membrane (waste without end); 0.1 US gal/day.
    expectWithin(membraneFlowLpd({ ...rating }, { ...feed, feedKPa: 40 * psi, feedTempC: 15 }) / gallon, 41.7, 0.1)
    expectWithin(membraneFlowLpd({ ...rating }, { ...feed, feedKPa: 60 * psi }) / gallon, 90.8, 0.1)
  })

  it('is the rating under the conditions of the rating', () => {
    expectWithinShare(membraneFlowLpd(rating, { ...feed, wasteRatio: 3 }), rating.ratedLpd, 1e-12)
    const cold = { ...rating, testTempC: 20 }
    expectWithinShare(membraneFlowLpd(cold, { ...feed, feedTempC: 20, wasteRatio: 3 }), rating.ratedLpd, 1e-12)
  })

  it('at one part in four counts the feed 15 % stronger along the membrane', () => {
    // Recovery 1/(1 + 3) = 25 %; ln(1/0.75)/0.25 = 1.1507.
    expectWithin(recoveryShare(3), 0.25, 1e-12)
    expectWithin(concentrationFactor(0.25), 1.1507, 1e-4)
    expectWithin(concentrationFactor(0), 1, 1e-12)
  })

  it('rises with pressure and warmth, falls with salt, and ends where osmosis wins', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 100, max: 600, noNaN: true }),
        fc.double({ min: 4, max: 34, noNaN: true }),
        fc.double({ min: 10, max: 1000, noNaN: true }),
        (feedKPa, feedTempC, feedTdsPpm) => {
          const at: MembraneFeed = { feedKPa, feedTempC, feedTdsPpm, wasteRatio: 3 }
          const flow = membraneFlowLpd(rating, at)
          expect(membraneFlowLpd(rating, { ...at, feedKPa: feedKPa + 5 })).toBeGreaterThan(flow)
          expect(membraneFlowLpd(rating, { ...at, feedTempC: feedTempC + 1 })).toBeGreaterThan(flow)
          expect(membraneFlowLpd(rating, { ...at, feedTdsPpm: feedTdsPpm + 50 })).toBeLessThan(flow)
        },
      ),
    )
    expect(membraneFlowLpd(rating, { ...feed, feedKPa: 100, feedTdsPpm: 19000, wasteRatio: 3 })).toBe(0)
  })

  it('is no number where the test’s own pressure does not overcome osmosis', () => {
    // 60 kPa against 2000 ppm at 25 °C, which take C (T + 320)/491000 bar: 140.53 kPa.
    const impossible = { ...rating, testPressureKPa: 60, testTdsPpm: 2000 }
    expectWithin(findRatedDriveKPa(impossible, 1e9), 60 - 140.53, 1e-2)
    expect(() => membraneFlowLpd(impossible, feed)).toThrow(RangeError)
  })
})
