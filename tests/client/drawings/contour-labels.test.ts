import { expect, it } from 'vitest'
import { labelContours } from '../../../src/components/drawings/contour-labels'

const box = { x: 0, y: 0, width: 600, height: 400 }
const hill = {
  columns: 60,
  rows: 40,
  cells: Float64Array.from({ length: 2400 }, (_, index) =>
    Math.max(0, 30 - Math.hypot((index % 60) + 0.5 - 30, Math.floor(index / 60) + 0.5 - 20)),
  ),
}
const low = { level: 15, text: '15', to: 'right' } as const
const high = { level: 25, text: '25', to: 'up' } as const

it('puts each number on its line: right of the middle, and above it', () => {
  // Circles of 15 and 5 cells around the middle at 300, 200; a cell is 10 px.
  const [right, up] = labelContours(hill, box, [low, high])
  expect(right!.x).toBeCloseTo(450, -1)
  expect(Math.abs(right!.y - 200)).toBeLessThan(15)
  expect(up!.y).toBeCloseTo(150, -1)
  expect(Math.abs(up!.x - 300)).toBeLessThan(15)
})

it('leaves out a number that would lie on another', () => {
  const small = { ...box, width: 40, height: 30 }
  expect(labelContours(hill, small, [low, high]).map(({ text }) => text)).toEqual(['15'])
})

it('numbers no line that the plane does not have', () => {
  expect(labelContours(hill, box, [{ ...high, level: 40 }])).toEqual([])
})
