import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  findLongestMm,
  fitsRectangle,
  passesOpening,
  slackInRectangleMm,
  type Rectangle,
} from '#shared/engine/physics/geometry'
import { expectWithin } from './within'

/** Independent of Carver's theorem: turn the piece in steps of a hundredth of a degree and look at its bounding box. */
function turnsInto([p, q]: Rectangle, [a, b]: Rectangle): boolean {
  for (let step = 0; step <= 18000; step += 1) {
    const angle = (step * Math.PI) / 18000
    const cos = Math.abs(Math.cos(angle))
    const sin = Math.sin(angle)
    if (p * cos + q * sin <= a + 1e-9 && p * sin + q * cos <= b + 1e-9) return true
  }
  return false
}

describe('a rectangle in a rectangle', () => {
  it.each([
    // Wetzel 2000, Mathematics Magazine 73(3): area, diagonal, perimeter and thickness all pass, and it does not fit.
    [[9, 4], [8, 6], false],
    // The same: a square longer than the space never fits, though the bare inequality accepts it.
    [[10, 10], [8, 8], false],
    // p + q ≤ 4√2 = 5.657 for a square of side 4.
    [[5, 0.65], [4, 4], true],
    [[5, 0.66], [4, 4], false],
    // Computed from the theorem and confirmed by turning.
    [[10.5, 0.8], [10, 5], true],
    [[11, 1], [10, 5], false],
    [[100, 8], [90, 60], true],
    [[100, 20], [90, 60], false],
    [[61, 5], [60, 40], true],
  ] as [Rectangle, Rectangle, boolean][])('%j in %j: %s', (piece, space, fits) => {
    expect(fitsRectangle(piece, space)).toBe(fits)
    expect(turnsInto(piece, space)).toBe(fits)
    expect(fitsRectangle([piece[1], piece[0]], [space[1], space[0]])).toBe(fits)
  })

  it('fits exactly where turning it by small steps finds room', () => {
    const side = fc.double({ min: 0.5, max: 20, noNaN: true })
    fc.assert(
      fc.property(side, side, side, side, (p, q, a, b) => {
        if (turnsInto([p, q], [a, b])) expect(fitsRectangle([p * 0.999999, q * 0.999999], [a, b])).toBe(true)
        if (fitsRectangle([p, q], [a, b])) expect(turnsInto([p * 0.999, q * 0.999], [a, b])).toBe(true)
      }),
      { numRuns: 400 },
    )
  })

  it('still fits when it gets smaller or the space larger', () => {
    const side = fc.double({ min: 0.5, max: 20, noNaN: true })
    fc.assert(
      fc.property(side, side, side, side, (p, q, a, b) => {
        fc.pre(fitsRectangle([p, q], [a, b]))
        expect(fitsRectangle([p * 0.9, q], [a, b])).toBe(true)
        expect(fitsRectangle([p, q * 0.9], [a, b])).toBe(true)
        expect(fitsRectangle([p, q], [a * 1.1, b])).toBe(true)
      }),
    )
  })

  it('refuses what is not a number', () => {
    expect(() => fitsRectangle([Number.NaN, 1], [2, 2])).toThrow(RangeError)
  })
})

describe('the longest strip that fits', () => {
  it('is 69.3726 at width 3 in 60 × 40', () => {
    // Computed from Carver's theorem by an independent code.
    expectWithin(findLongestMm(3, [60, 40]), 69.3726, 1e-4)
  })

  it('is the diagonal when it has no width', () => {
    // √(60² + 40²) = 72.111.
    expectWithin(findLongestMm(0, [60, 40]), 72.111, 1e-3)
  })

  it('of 50 × q in 48 × 30 has q up to 7.8559', () => {
    // Computed from Carver's theorem by an independent code; 1e-3.
    expect(fitsRectangle([50, 7.8549], [48, 30])).toBe(true)
    expect(fitsRectangle([50, 7.8569], [48, 30])).toBe(false)
    expectWithin(findLongestMm(7.8559, [48, 30]), 50, 1e-3)
  })

  it('leaves slack that is how much longer or shorter the piece may be', () => {
    expectWithin(slackInRectangleMm([65, 3], [60, 40]), 4.3726, 1e-4)
    expectWithin(slackInRectangleMm([75, 3], [60, 40]), -5.6274, 1e-4)
    expect(slackInRectangleMm([10, 73], [60, 40])).toBeNull()
  })

  it('fits at the slack and no longer beyond it', () => {
    const side = fc.double({ min: 20, max: 600, noNaN: true })
    fc.assert(
      fc.property(fc.double({ min: 1, max: 60, noNaN: true }), side, side, (width, a, b) => {
        const longest = findLongestMm(width, [a, b])
        fc.pre(longest !== null)
        expect(fitsRectangle([longest - 0.001, width], [a, b])).toBe(true)
        expect(fitsRectangle([longest + 0.001, width], [a, b])).toBe(false)
      }),
    )
  })
})

describe('an opening', () => {
  it('lets a box through on its smallest face', () => {
    expect(passesOpening([300, 60, 50], [80, 70])).toBe(true)
    expect(passesOpening([300, 90, 75], [80, 70])).toBe(false)
  })
})
