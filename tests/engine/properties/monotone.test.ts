import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { getRules } from '#shared/engine/checks/index'
import { findStuckOn } from '#shared/engine/heat-budget'
import type { Outcome, Piece, Setup } from '#shared/engine/types'
import { anyHeater } from '../arbitraries'
import { heater, sceneFor, wholeSetup } from '../build'

const rank: Readonly<Record<Outcome, number>> = { pass: 0, change: 1, nodata: 2, fail: 3 }

const judgeRaw = (setup: Setup, id: string, piece: Piece) => {
  const rule = getRules(piece.kind).rules.find((one) => one.id === id)
  return rule?.judge(sceneFor(setup, piece.kind), { piece, quantity: 1, mayMultiply: true })?.outcome ?? 'nodata'
}

const side = (min: number, max: number) => fc.integer({ min, max })
const chamber = fc.record({
  lengthMm: side(30, 250),
  widthMm: side(30, 160),
  waterDepthMm: side(60, 340),
  heightMm: side(100, 390),
})
const more = fc.record({
  key: fc.constantFrom('lengthMm', 'widthMm', 'waterDepthMm', 'heightMm' as const),
  byMm: fc.oneof(fc.double({ min: 0.001, max: 1, noNaN: true }), side(1, 200)),
})
const inChamber = (sizes: Readonly<Record<string, unknown>>) => wholeSetup({ chambers: [{ id: 'rear', ...sizes }] })

describe('more room', () => {
  it('never keeps a rod out that fitted', () => {
    fc.assert(
      fc.property(chamber, more, anyHeater, (sizes, { key, byMm }, piece) => {
        const before = judgeRaw(inChamber(sizes), 'heater.space', piece)
        const after = judgeRaw(inChamber({ ...sizes, [key]: sizes[key] + byMm }), 'heater.space', piece)
        expect(rank[after]).toBeLessThanOrEqual(rank[before])
      }),
      { numRuns: 400 },
    )
  })

  it('is never found by a rod that is longer or thicker', () => {
    fc.assert(
      fc.property(chamber, anyHeater, side(1, 60), side(1, 20), (sizes, piece, longerMm, thickerMm) => {
        const grown = (key: string, byMm: number): Piece => ({
          ...piece,
          specs: { ...piece.specs, [key]: { value: Number(piece.specs[key]?.value) + byMm, source: 'measured' } },
        })
        const before = judgeRaw(inChamber(sizes), 'heater.space', piece)
        for (const one of [grown('lengthMm', longerMm), grown('diameterMm', thickerMm)])
          expect(rank[judgeRaw(inChamber(sizes), 'heater.space', one)]).toBeGreaterThanOrEqual(rank[before])
      }),
      { numRuns: 300 },
    )
  })

  it('is what an opening gives too, and never more than the chamber without one', () => {
    fc.assert(
      fc.property(chamber, anyHeater, side(15, 120), side(1, 50), (sizes, piece, opening, wider) => {
        const through = (openingWidthMm: number) =>
          judgeRaw(inChamber({ ...sizes, openingLengthMm: 200, openingWidthMm }), 'heater.space', piece)
        expect(rank[through(opening + wider)]).toBeLessThanOrEqual(rank[through(opening)])
        expect(rank[judgeRaw(inChamber(sizes), 'heater.space', piece)]).toBeLessThanOrEqual(rank[through(opening)])
      }),
      { numRuns: 200 },
    )
  })
})

describe('a warmer room', () => {
  it('never makes a heater weaker', () => {
    fc.assert(
      fc.property(
        side(5, 400),
        fc.double({ min: 8, max: 24, noNaN: true }),
        fc.double({ min: 0, max: 6, noNaN: true }),
        (powerW, coldestC, by) => {
          const at = (coldest: number) => {
            const room = { temperatureC: 24, coldestC: Math.min(24, coldest), warmestC: 30, relativeHumidity: 0.5 }
            return rank[judgeRaw(wholeSetup({}, { room }), 'heater.power', heater({ powerW }))]
          }
          expect(at(coldestC + by)).toBeLessThanOrEqual(at(coldestC))
        },
      ),
      { numRuns: 150 },
    )
  })
})

describe('more power', () => {
  it('never fails to hold what less held', () => {
    fc.assert(
      fc.property(side(5, 400), side(1, 200), side(12, 24), (powerW, more, coldestC) => {
        const setup = wholeSetup({}, { room: { temperatureC: 24, coldestC, warmestC: 30 } })
        const at = (watts: number) => rank[judgeRaw(setup, 'heater.power', heater({ powerW: watts }))]
        expect(at(powerW + more)).toBeLessThanOrEqual(at(powerW))
      }),
      { numRuns: 150 },
    )
  })

  it('never ends cooler where it sticks on, nor gets there later', () => {
    fc.assert(
      fc.property(side(0, 500), side(1, 300), (powerW, more) => {
        const scene = sceneFor(wholeSetup(), 'heater')
        const less = findStuckOn(scene, powerW)
        const than = findStuckOn(scene, powerW + more)
        expect(than.equilibriumC).toBeGreaterThan(less.equilibriumC)
        if (less.hoursTo30C !== null) expect(than.hoursTo30C).toBeLessThan(less.hoursTo30C)
      }),
      { numRuns: 80 },
    )
  })

  it('is never less too strong', () => {
    fc.assert(
      fc.property(side(5, 400), side(1, 200), (powerW, more) => {
        const at = (watts: number) => rank[judgeRaw(wholeSetup(), 'heater.not-too-strong', heater({ powerW: watts }))]
        expect(at(powerW + more)).toBeGreaterThanOrEqual(at(powerW))
      }),
      { numRuns: 100 },
    )
  })
})
