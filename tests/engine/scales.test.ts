import { describe, expect, it } from 'vitest'
import { fit } from '#shared/engine/fit'
import type { KindKey } from '#shared/kinds/index'
import type { Piece, Zone } from '#shared/engine/types'
import { piece, wholeSetup } from './build'

const options = { limit: 10, offset: 0, scales: true }

function draw(kind: KindKey, pieces: readonly Piece[], check: string) {
  const { scales, marks } = fit(wholeSetup(), kind, pieces, options)
  const scale = scales?.find((one) => one.check === check)
  return { zones: scale?.zones ?? [], marks: marks ?? [], key: scale?.key ?? '' }
}

const outcomeAt = (zones: readonly Zone[], value: number) =>
  zones.find(({ from, to }) => value >= from && value <= to)?.outcome

describe('the shared scale of a check', () => {
  const pump = (flowLph: number) =>
    piece(
      'return-pump',
      {
        lengthMm: 60,
        widthMm: 50,
        heightMm: 60,
        boreMm: 13,
        dcControl: false,
        flowCurve: [
          { headM: 0, flowLph },
          { headM: 2, flowLph: 0 },
        ],
      },
      `pump-${flowLph}`,
    )

  it('of a return pump’s turnover has the goal, what passes with a change around it, and what fails beyond', () => {
    // A goal of 4 to 12 an hour: with a change from 0.75 × 4 to 1.33 × 12.
    const { zones } = draw('return-pump', [pump(300), pump(600), pump(2400)], 'return-pump.flow')
    expect(zones.map(({ to, outcome }) => [Number(to.toFixed(4)), outcome])).toEqual([
      [3, 'fail'],
      [4, 'change'],
      [12, 'pass'],
      [15.96, 'change'],
      [1e9, 'fail'],
    ])
  })

  it('of a light’s coverage has a change between dim ends and too little', () => {
    const light = (lengthMm: number) =>
      piece(
        'light',
        { layout: 'strip', lengthMm, widthMm: 60, ppfdUmol: 120, ppfdAtMm: 300, beamAngleDeg: 90, dimmable: true },
        `light-${lengthMm}`,
      )
    // Common practice: from 70 % of the plane it passes, from 50 % with dim ends.
    const { zones } = draw('light', [light(100), light(300), light(550)], 'light.coverage')
    expect(zones.map(({ to, outcome }) => [to, outcome])).toEqual([
      [0.5, 'fail'],
      [0.7, 'change'],
      [1e9, 'pass'],
    ])
  })

  it('paints no piece another colour than its check has', () => {
    const pumps = [150, 250, 290, 300, 350, 500, 900, 1100, 1300, 1500, 2400].map(pump)
    const { zones, marks, key } = draw('return-pump', pumps, 'return-pump.flow')
    const { answers } = fit(wholeSetup(), 'return-pump', pumps, { limit: 50, offset: 0 })
    for (const { slug, values } of marks) {
      const check = answers.find(({ gear }) => gear?.slug === slug)?.checks.find(({ id }) => id === 'return-pump.flow')
      expect(outcomeAt(zones, values[key] ?? NaN), slug).toBe(check?.outcome)
    }
    expect(new Set(zones.map(({ outcome }) => outcome)).size).toBe(3)
  })
})
