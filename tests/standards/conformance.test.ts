import fc from 'fast-check'
import { erf } from 'mathjs'
import { describe, expect, it } from 'vitest'
import {
  combineUncertainties,
  isCloseCall,
  normalCdf,
  probabilityAtLeast,
  probabilityAtMost,
  probabilityReaches,
  probabilityWithin,
  standardUncertainty,
} from '#shared/engine/physics/conformance'
import { expectWithin } from './within'

describe('the standard normal distribution', () => {
  // Printed tables of Φ; 1e-5.
  it.each([
    [0, 0.5],
    [0.5, 0.69146],
    [1, 0.84134],
    [1.2816, 0.9],
    [1.6449, 0.95],
    [2, 0.97725],
    [2.3263, 0.99],
    [3, 0.99865],
  ])('at %f is %f', (z, probability) => {
    expectWithin(normalCdf(z), probability, 1e-5)
    expectWithin(normalCdf(-z), 1 - probability, 1e-5)
  })

  it('agrees with the error function of mathjs', () => {
    fc.assert(
      fc.property(fc.double({ min: -9, max: 9, noNaN: true }), (z) => {
        expectWithin(normalCdf(z), (1 + erf(z / Math.SQRT2)) / 2, 1e-12)
      }),
    )
  })

  it('refuses what is not a number', () => {
    expect(() => normalCdf(Number.NaN)).toThrow(RangeError)
  })
})

describe('how sure a fit is', () => {
  it('is 0.9252 for a rod of 297 ± 3 mm in 300 ± 2 mm', () => {
    // JCGM 106:2012 with two uniform readings: u = √(3² + 2²)/√3 = 2.0817 mm, z = 1.4411.
    const u = combineUncertainties(
      standardUncertainty(297, 'maker', 3, 'length'),
      standardUncertainty(300, 'measured', 2, 'length'),
    )
    expectWithin(u, 2.0817, 1e-4)
    expectWithin(probabilityAtLeast(300 - 297, 0, u), 0.9252, 1e-4)
    expectWithin(probabilityAtMost(297, 300, u), 0.9252, 1e-4)
  })

  it('lies between two limits by what is below the one and not below the other', () => {
    // One standard deviation either side: 0.84134 − 0.15866.
    expectWithin(probabilityWithin(10, 8, 12, 2), 0.68268, 2e-5)
  })

  it('of what can be set is that of the end of its range that is less sure', () => {
    // 10 to 14 with u = 1 reaches 13 to 20: 14 is at least 13 with Φ(1) = 0.84134, 10 is at most 20 with Φ(10) = 1.
    expectWithin(probabilityReaches([10, 14], 13, 20, 1), 0.84134, 1e-5)
    // 22 to 30 reaches 10 to 20 with Φ(−2) = 1 − 0.97725.
    expectWithin(probabilityReaches([22, 30], 10, 20, 1), 0.02275, 1e-5)
  })

  it('is certain where nothing is uncertain, and a value on the limit keeps it', () => {
    expect(probabilityAtMost(10, 10, 0)).toBe(1)
    expect(probabilityAtMost(10.001, 10, 0)).toBe(0)
    expect(probabilityAtLeast(10, 10, 0)).toBe(1)
    expect(probabilityWithin(10, 10, 10, 0)).toBe(1)
  })

  it('is a close call between 5 and 95 %', () => {
    // Common practice.
    expect(isCloseCall(probabilityAtMost(0, 1.6, 1))).toBe(true)
    expect(isCloseCall(probabilityAtMost(0, 1.7, 1))).toBe(false)
    expect(isCloseCall(probabilityAtMost(0, -1.7, 1))).toBe(false)
  })
})

describe('the uncertainty of a value', () => {
  // JCGM 100:2008, 4.3.7: known to ± a and no more, u = a/√3. The half-widths are common practice.
  it.each([
    ['measured', 'length', 400, 1],
    ['measured', 'other', 400, 8],
    ['maker', 'length', 400, 3],
    ['maker', 'other', 400, 20],
    ['estimate', 'length', 400, 40],
    ['estimate', 'other', 400, 40],
  ] as const)('from %s, of a %s of %d, is ± %d', (source, quantity, value, halfWidth) => {
    expectWithin(standardUncertainty(value, source, undefined, quantity), halfWidth / Math.sqrt(3), 1e-12)
  })

  it('is the stated one where it is stated', () => {
    expectWithin(standardUncertainty(400, 'estimate', 0.3, 'other'), 0.3 / Math.sqrt(3), 1e-12)
  })
})
