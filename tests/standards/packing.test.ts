import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import type { Rectangle } from '#shared/engine/physics/geometry'
import { packRectangles, type Packing } from '#shared/engine/physics/packing'

/** Independent of the search under test: whole-number sides tried at every whole-number place of a grid. */
function fitsOnGrid(pieces: readonly Rectangle[], [length, width]: Rectangle): boolean {
  const taken = new Set<number>()
  const placeFrom = (index: number): boolean => {
    const piece = pieces[index]
    if (piece === undefined) return true
    for (const [l, w] of [piece, [piece[1], piece[0]] as const]) {
      for (let x = 0; x + l <= length; x += 1) {
        for (let y = 0; y + w <= width; y += 1) {
          const cells = Array.from({ length: l * w }, (_, cell) => (x + (cell % l)) * 100 + y + Math.floor(cell / l))
          if (cells.some((cell) => taken.has(cell))) continue
          cells.forEach((cell) => taken.add(cell))
          if (placeFrom(index + 1)) return true
          cells.forEach((cell) => taken.delete(cell))
        }
      }
    }
    return false
  }
  return placeFrom(0)
}

function expectApart(packing: Packing, [length, width]: Rectangle, clearance: number): void {
  if (packing.outcome !== 'fits') throw new Error('nothing was placed')
  for (const [index, one] of packing.placed.entries()) {
    expect(one.xMm).toBeGreaterThanOrEqual(clearance - 1e-5)
    expect(one.yMm).toBeGreaterThanOrEqual(clearance - 1e-5)
    expect(one.xMm + one.lengthMm).toBeLessThanOrEqual(length - clearance + 1e-5)
    expect(one.yMm + one.widthMm).toBeLessThanOrEqual(width - clearance + 1e-5)
    for (const other of packing.placed.slice(index + 1)) {
      const gap = Math.max(
        one.xMm - other.xMm - other.lengthMm,
        other.xMm - one.xMm - one.lengthMm,
        one.yMm - other.yMm - other.widthMm,
        other.yMm - one.yMm - one.widthMm,
      )
      expect(gap).toBeGreaterThanOrEqual(clearance - 1e-5)
    }
  }
}

describe('pieces side by side', () => {
  it('agree with trying every place on a grid', () => {
    const side = fc.integer({ min: 1, max: 5 })
    const piece = fc.tuple(side, side)
    const space = fc.tuple(fc.integer({ min: 2, max: 6 }), fc.integer({ min: 2, max: 5 }))
    let fitted = 0
    let refused = 0
    fc.assert(
      fc.property(fc.array(piece, { minLength: 1, maxLength: 5 }), space, (pieces, into) => {
        const area = pieces.reduce((sum, [l, w]) => sum + l * w, 0)
        fc.pre(area <= into[0] * into[1])
        const bySize = pieces.toSorted(([l, w], [m, v]) => m * v - l * w)
        const packing = packRectangles(pieces, into)
        const fits = fitsOnGrid(bySize, into)
        expect(packing.outcome).toBe(fits ? 'fits' : 'no')
        if (fits) {
          fitted += 1
          expectApart(packing, into, 0)
        } else refused += 1
      }),
      { numRuns: 400 },
    )
    expect(Math.min(fitted, refused)).toBeGreaterThan(20)
  })

  it('find the pinwheel, which no straight cuts can make', () => {
    const pieces: Rectangle[] = [
      [2, 1],
      [2, 1],
      [2, 1],
      [2, 1],
      [1, 1],
    ]
    expect(packRectangles(pieces, [3, 3]).outcome).toBe('fits')
    expect(packRectangles([...pieces.slice(0, 4), [1.01, 1]], [3, 3]).outcome).toBe('no')
  })

  it('keep their clearance to each other and to the walls', () => {
    // Two rods of 30 mm with 10 mm all round need 10 + 30 + 10 + 30 + 10 = 90 mm, and 50 mm across.
    const rods: Rectangle[] = [
      [30, 30],
      [30, 30],
    ]
    expectApart(packRectangles(rods, [90, 50], 10), [90, 50], 10)
    expect(packRectangles(rods, [89, 50], 10).outcome).toBe('no')
    expect(packRectangles(rods, [90, 49], 10).outcome).toBe('no')
  })

  it('say that they do not know rather than no when there are too many to try', () => {
    const many = Array.from({ length: 6 }, (): Rectangle => [1, 1])
    expect(packRectangles(many, [3, 2]).outcome).toBe('fits')
    expect(packRectangles(many, [2.9, 2]).outcome).toBe('no')
    expect(packRectangles(many, [2.5, 2.5]).outcome).toBe('unknown')
    expect(packRectangles([...many, [3, 0.1]], [2.8, 2.8]).outcome).toBe('no')
  })

  it('fit anywhere when there are none', () => {
    expect(packRectangles([], [10, 10]).outcome).toBe('fits')
  })
})
