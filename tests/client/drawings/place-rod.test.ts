import { expect, it } from 'vitest'
import { placeRod } from '../../../src/components/drawings/place-rod'

const rod = { chamber: 'a', lengthMm: 500, diameterMm: 0, angleDeg: (Math.atan2(4, 3) * 180) / Math.PI }

// The 3-4-5 triangle: 500 along the slope is 300 along the floor and 400 up.
it('draws a leaning rod with the run and rise of its angle', () => {
  const placed = placeRod({ ...rod, position: 'leaning' }, { lengthMm: 310, widthMm: 50 })
  expect(placed.planLengthMm).toBeCloseTo(300, 9)
  expect(placed.heightMm).toBeCloseTo(400, 9)
  expect(placed.planAngleDeg).toBe(0)
  expect(placed.seenLengthMm).toBeCloseTo(500, 9)
})

it('turns a rod towards the longer side, and is then seen end-on from the front', () => {
  const placed = placeRod({ ...rod, position: 'leaning' }, { lengthMm: 50, widthMm: 310 })
  expect(placed.planAngleDeg).toBeCloseTo(90, 9)
  expect(placed.seenAngleDeg).toBeCloseTo(90, 9)
  expect(placed.seenLengthMm).toBeCloseTo(400, 9)
})

it('turns a flat rod into the corner where only the diagonal is long enough', () => {
  // 480 by 240 has the diagonal 536.7; the inscribed 500 by 5 is confirmed by its bounding box below.
  const flat = { ...rod, diameterMm: 5, position: 'flat' as const }
  const { planAngleDeg } = placeRod(flat, { lengthMm: 480, widthMm: 240 })
  const turn = (planAngleDeg * Math.PI) / 180
  expect(planAngleDeg).toBeGreaterThan(0)
  expect(500 * Math.cos(turn) + 5 * Math.sin(turn)).toBeLessThanOrEqual(480.05)
  expect(500 * Math.sin(turn) + 5 * Math.cos(turn)).toBeLessThanOrEqual(240.05)
})

it('stands an upright rod as high as it is long, a circle in plan', () => {
  const placed = placeRod({ ...rod, diameterMm: 26, position: 'upright', angleDeg: 90 }, { lengthMm: 100, widthMm: 90 })
  expect(placed.heightMm).toBeCloseTo(500, 9)
  expect(placed.planLengthMm).toBeCloseTo(26, 9)
})
