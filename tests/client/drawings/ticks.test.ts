import fc from 'fast-check'
import { expect, it } from 'vitest'
import { niceStep, niceTicks } from '../../../src/components/drawings/ticks'

// "Nice" numbers are 1, 2 and 5 times powers of ten: P. Heckbert, "Nice Numbers for Graph Labels", Graphics Gems (1990),
// from memory.
it.each([
  [1, 1],
  [1.2, 2],
  [2.05, 5],
  [5, 5],
  [7, 10],
  [0.3, 0.5],
  [0.01, 0.01],
  [230, 500],
])('rounds a spacing of %d up to %d', (size, step) => {
  expect(niceStep(size)).toBeCloseTo(step, 12)
})

it('labels a scale from 5.5 to 13.7 inches at every second inch where five labels have room', () => {
  expect(niceTicks(5.5, 13.7, 5, true)).toMatchObject({ step: 2, major: [6, 8, 10, 12] })
})

it('divides an inch into quarters, as a tape does, and a centimetre into fifths', () => {
  expect(niceTicks(1, 2, 2, true).minor).toEqual([1.25, 1.5, 1.75])
  expect(niceTicks(10, 20, 2).minor).toEqual([12, 14, 16, 18])
})

it('writes ticks without binary noise', () => {
  // 3 × 0.1 is 0.30000000000000004 in IEEE 754 double precision.
  expect(niceTicks(0, 0.5, 6).major).toEqual([0, 0.1, 0.2, 0.3, 0.4, 0.5])
})

it('never gives more labels than asked for, nor a tick outside the scale, nor a gap wider than five times the least', () => {
  fc.assert(
    fc.property(
      fc.double({ min: -1e4, max: 1e4, noNaN: true }),
      fc.double({ min: 1e-3, max: 1e5, noNaN: true }),
      fc.integer({ min: 2, max: 12 }),
      (from, span, most) => {
        const { major, minor, step } = niceTicks(from, from + span, most)
        expect(major.length).toBeLessThanOrEqual(most)
        for (const tick of [...major, ...minor]) {
          expect(tick).toBeGreaterThanOrEqual(from - step * 1e-6)
          expect(tick).toBeLessThanOrEqual(from + span + step * 1e-6)
        }
        expect(step).toBeLessThanOrEqual((span / most) * 5 * 1.001)
      },
    ),
  )
})
