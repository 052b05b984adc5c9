import fc from 'fast-check'
import { expect, it } from 'vitest'
import { assignRows } from '../../../src/components/drawings/assign-rows'
import { layoutTank, sidePx } from '../../../src/components/drawings/tank-layout'
import { manyChambers, standingTank } from '../specimen/invented'

it('keeps the tank and room for its labels inside any width from a small phone up', () => {
  fc.assert(
    fc.property(
      fc.integer({ min: 280, max: 1200 }),
      fc.integer({ min: 200, max: 2400 }),
      fc.integer({ min: 150, max: 900 }),
      (widthPx, outerLengthMm, outerHeightMm) => {
        const layout = layoutTank({ ...standingTank, outerLengthMm, outerHeightMm }, widthPx, 'metric')
        expect(layout.leftPx).toBeGreaterThanOrEqual(sidePx - 0.001)
        expect(layout.leftPx + outerLengthMm * layout.pxPerMm).toBeLessThanOrEqual(widthPx - sidePx + 0.001)
        expect(layout.floorPx - outerHeightMm * layout.pxPerMm).toBeGreaterThanOrEqual(layout.topPx - 0.001)
      },
    ),
  )
})

it('reserves exactly the height that it draws, so that nothing moves when the width is measured', () => {
  fc.assert(
    fc.property(fc.integer({ min: 280, max: 1200 }), (widthPx) => {
      const { heightPx, size } = layoutTank(manyChambers, widthPx, 'us')
      // What the sheet's spacer comes to: its picture keeps its proportions and never outgrows the room.
      const across = Math.min(size.acrossPx, widthPx - 2 * sidePx)
      const reserved = size.abovePx + (across * size.contentPx) / size.acrossPx + size.belowPx
      expect(heightPx).toBeCloseTo(reserved, 6)
    }),
  )
})

it('draws its grid in round lengths of the reader’s unit', () => {
  const inches = layoutTank(standingTank, 400, 'us').gridMm / 25.4
  expect([1, 2, 5, 10]).toContain(Number(inches.toFixed(6)))
  expect([10, 20, 50, 100]).toContain(layoutTank(standingTank, 400, 'metric').gridMm)
})

it('puts labels that would touch on different rows, and reuses the first row', () => {
  expect(
    assignRows([
      [0, 30],
      [20, 50],
      [35, 60],
    ]),
  ).toEqual([0, 1, 0])
})
