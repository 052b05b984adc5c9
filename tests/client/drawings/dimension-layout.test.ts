import { expect, it } from 'vitest'
import fc from 'fast-check'
import { besideEdge, layoutDimension } from '../../../src/components/drawings/dimension-layout'

const label = fc.constantFrom('4 in', '23.2 in', '1219 mm', '0.31 in')
const length = fc.double({ min: 1, max: 400, noNaN: true })

it('gives every dimension a target of at least 24 by 24 pixels (WCAG 2.2, success criterion 2.5.8)', () => {
  fc.assert(
    fc.property(fc.constantFrom('horizontal' as const, 'vertical' as const), length, label, (axis, to, text) => {
      const { target } = layoutDimension({ axis, from: 0, to, at: 50 }, text, 'before')
      expect(Math.min(target.width, target.height)).toBeGreaterThanOrEqual(24)
    }),
  )
})

it('keeps the label of a horizontal line off the line', () => {
  const { label: above } = layoutDimension({ axis: 'horizontal', from: 0, to: 30, at: 50 }, '102 mm', 'before')
  const { label: below } = layoutDimension({ axis: 'horizontal', from: 0, to: 30, at: 50 }, '102 mm', 'after')
  expect(above.y + above.height).toBeLessThan(50)
  expect(below.y).toBeGreaterThan(50)
})

it('breaks a vertical line around its label', () => {
  const { stretches, label: box } = layoutDimension({ axis: 'vertical', from: 0, to: 100, at: 50 }, '12 in', 'before')
  expect(stretches).toHaveLength(2)
  expect(stretches[0]![1]).toBeLessThanOrEqual(box.y)
  expect(stretches[1]![0]).toBeGreaterThanOrEqual(box.y + box.height)
})

it('keeps the label of a vertical line off the edge that it measures, however short the line', () => {
  fc.assert(
    fc.property(length, label, fc.constantFrom(-1 as const, 1 as const), (to, text, direction) => {
      const { at, side } = besideEdge(200, direction, text, to)
      const { label: box } = layoutDimension({ axis: 'vertical', from: 0, to, at }, text, side)
      if (direction < 0) expect(box.x + box.width).toBeLessThan(200)
      else expect(box.x).toBeGreaterThan(200)
    }),
  )
})
