import { describe, expect, it } from 'vitest'
import { writeArea, writeLines } from '../../../src/components/drawings/contour-path'
import { traceLevel, type GridPoint, type ValueGrid } from '../../../src/components/drawings/contours'

const sample = (columns: number, rows: number, at: (x: number, y: number) => number): ValueGrid => ({
  columns,
  rows,
  cells: Float64Array.from({ length: columns * rows }, (_, index) =>
    at((index % columns) + 0.5, Math.floor(index / columns) + 0.5),
  ),
})

/** Signed area by the shoelace formula. */
const areaOf = (ring: readonly GridPoint[]) =>
  ring.reduce((sum, { x, y }, at) => {
    const next = ring[(at + 1) % ring.length]!
    return sum + (x * next.y - next.x * y) / 2
  }, 0)

const areaWithin = (grid: ValueGrid, level: number) =>
  Math.abs(traceLevel(grid, level).reduce((sum, ring) => sum + areaOf(ring), 0))

describe('contours', () => {
  it('encloses the circle of a cone: πr² (plane geometry)', () => {
    const cone = sample(60, 40, (x, y) => 20 - Math.hypot(x - 30, y - 20))
    const [ring, ...more] = traceLevel(cone, 8)
    expect(more).toEqual([])
    expect(Math.abs(areaOf(ring!)) / (Math.PI * 12 ** 2)).toBeCloseTo(1, 2)
    for (const { x, y } of ring!) expect(Math.hypot(x - 30, y - 20)).toBeCloseTo(12, 1)
  })

  it('puts the line of a level slope just where the slope reaches the level', () => {
    const slope = sample(10, 4, (x) => x)
    const [ring] = traceLevel(slope, 3.25)
    expect(areaOf(ring!)).toBeCloseTo(-(10 - 3.25) * 4, 9)
    expect(Math.min(...ring!.map(({ x }) => x))).toBeCloseTo(3.25, 9)
  })

  it('encloses the whole plane, corners included, where all of it is above the level', () => {
    expect(
      areaWithin(
        sample(7, 5, () => 9),
        3,
      ),
    ).toBeCloseTo(35, 9)
  })

  it('finds nothing where no cell reaches the level', () => {
    expect(
      traceLevel(
        sample(7, 5, () => 2),
        3,
      ),
    ).toEqual([])
  })

  it('goes round a hole the other way, so that what is enclosed is the ring: π(R² − r²)', () => {
    const rim = sample(60, 60, (x, y) => -Math.abs(Math.hypot(x - 30, y - 30) - 15))
    const rings = traceLevel(rim, -5)
    expect(rings).toHaveLength(2)
    expect(areaWithin(rim, -5) / (Math.PI * (20 ** 2 - 10 ** 2))).toBeCloseTo(1, 2)
  })

  it('keeps two hills apart below their saddle, and joins them under it', () => {
    const hills = sample(40, 20, (x, y) => Math.max(10 - Math.hypot(x - 11, y - 10), 10 - Math.hypot(x - 29, y - 10)))
    // Half way between tops 18 apart both cones have fallen by 9.
    expect(traceLevel(hills, 2)).toHaveLength(2)
    expect(traceLevel(hills, 0.5)).toHaveLength(1)
  })

  it('closes every line over a checkerboard, where every cell is a saddle', () => {
    const board = sample(8, 8, (x, y) => (Math.floor(x) + Math.floor(y)) % 2)
    const rings = traceLevel(board, 0.5)
    const cells = rings.reduce((sum, ring) => sum + areaOf(ring), 0)
    // Each of the 49 squares between four middles loses two corners of 1/8; of the rim of 15 around them half is left.
    expect(Math.abs(cells)).toBeCloseTo(49 * (3 / 4) + 15 / 2, 9)
  })
})

describe('paths of contours', () => {
  const slope = sample(10, 4, (x) => x)
  const box = { x: 100, y: 50, width: 200, height: 80 }
  const rings = traceLevel(slope, 5)

  it('scales the grid to the box', () => {
    const path = writeArea(rings, slope, box)
    const numbers = path.match(/[\d.]+/g)!.map(Number)
    expect(Math.max(...numbers)).toBe(300)
    expect(path).toContain('200 50')
    expect(path).toMatch(/^M[^M]+Z$/)
  })

  it('draws no line along the edge of the plane', () => {
    const xs = [...writeLines(rings, slope, box).matchAll(/([\d.]+) [\d.]+/g)].map(([, x]) => Number(x))
    expect(new Set(xs)).toEqual(new Set([200]))
  })
})
