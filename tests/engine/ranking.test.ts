import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { fit, fitCheck } from '#shared/engine/fit'
import type { Piece, Setup } from '#shared/engine/types'
import { anyHeater, anySetup } from './arbitraries'
import { heater, piece, tankValues, toSpecs, wholeSetup } from './build'

type Values = Readonly<Record<string, unknown>>

const page = { limit: 50, offset: 0 }
const order = (setup: Setup, pieces: readonly Piece[]) =>
  fit(setup, 'heater', pieces, page).answers.map(({ gear }) => gear?.slug)

describe('the order of answers', () => {
  it('goes by verdict: fits, fits with changes, not enough data, does not fit', () => {
    const pieces = [
      heater({ lengthMm: 500 }, 'a-too-long'),
      heater({ volts: undefined }, 'b-unknown'),
      heater({ thermostat: 'external-needed' }, 'c-changes'),
      heater({}, 'd-fits'),
    ]
    expect(order(wholeSetup(), pieces)).toEqual(['d-fits', 'c-changes', 'b-unknown', 'a-too-long'])
  })

  it('then by fewer knock-ons', () => {
    const bare = { thermostat: 'external-needed' }
    const pieces = [heater({ ...bare, plugType: 'F' }, 'a-two'), heater(bare, 'b-one')]
    expect(order(wholeSetup(), pieces)).toEqual(['b-one', 'a-two'])
  })

  it('then by what is certain to need nothing, before what may need something for all that is known', () => {
    const pieces = [heater({ powerW: 160, plugs: undefined }, 'a-unknown-plugs'), heater({ powerW: 125 }, 'b-known')]
    expect(order(wholeSetup(), pieces)).toEqual(['b-known', 'a-unknown-plugs'])
    const kits = [
      piece('test-kit', {}, 'a-unknown'),
      piece('test-kit', { parameters: ['ammonia', 'nitrite', 'nitrate'] }, 'b-known'),
    ]
    expect(fit(wholeSetup(), 'test-kit', kits, page).answers.map(({ gear }) => gear?.slug)).toEqual([
      'b-known',
      'a-unknown',
    ])
  })

  it('then by the duty nearest to half on the coldest night, not by power', () => {
    // The need is some 84 W by ASHRAE's figure, so that 160 W run a little more than half of the time.
    const pieces = [100, 160, 125, 140].map((powerW) => heater({ powerW }, `w${powerW}`))
    expect(order(wholeSetup(), pieces)).toEqual(['w160', 'w140', 'w125', 'w100'])
    const mild = wholeSetup({}, { room: { ...wholeSetup().room, coldestC: 21 } })
    // At 21 °C it is some 49 W.
    expect(order(mild, pieces)[0]).toBe('w100')
  })

  it('then by how well the numbers are backed, and last by slug', () => {
    const backed = (source: 'measured' | 'maker' | 'estimate', slug: string): Piece => {
      const base = heater({ powerW: 150, lengthMm: 200 }, slug)
      const values = Object.fromEntries(Object.entries(base.specs).map(([key, entry]) => [key, entry?.value]))
      return { ...base, specs: toSpecs(values, source) }
    }
    const pieces = [backed('estimate', 'a'), backed('maker', 'd'), backed('maker', 'c'), backed('measured', 'e')]
    expect(order(wholeSetup(), pieces)).toEqual(['e', 'c', 'd', 'a'])
  })

  it('puts a clear answer before a close call', () => {
    const pieces = [
      heater({ powerW: 150, lengthMm: 329, orientation: 'vertical' }, 'a-close'),
      heater({ powerW: 150, lengthMm: 200, orientation: 'vertical' }, 'b-clear'),
    ]
    expect(order(wholeSetup(), pieces)).toEqual(['b-clear', 'a-close'])
  })

  it('puts the tank of the nearest volume first', () => {
    const tank = (nominalVolumeL: number) =>
      piece('tank', { ...tankValues, includedPump: {}, nominalVolumeL }, `l${nominalVolumeL}`)
    const answers = fit(wholeSetup({ nominalVolumeL: 80 }), 'tank', [tank(90), tank(72), tank(82)], page).answers
    expect(answers.map(({ gear }) => gear?.slug)).toEqual(['l82', 'l72', 'l90'])
  })
})

describe('counting thousands of pieces at a glance', () => {
  const agree = (setup: Setup, pieces: readonly Piece[]) => {
    const named = pieces.map((one, index) => ({
      ...one,
      gear: { slug: `piece-${index}`, brand: 'Inventmark', model: `No. ${index}` },
    }))
    const byHand = { fits: 0, changes: 0, no: 0, unknown: 0 }
    for (const one of named) byHand[fitCheck(setup, one).verdict] += 1
    expect(fit(setup, 'heater', named, { limit: 0, offset: 0 }).counts).toEqual(byHand)
  }

  it('gives the verdicts that a closer look gives', () => {
    fc.assert(
      fc.property(anySetup, fc.array(anyHeater, { minLength: 4, maxLength: 8 }), (setup, pieces) => {
        agree({ ...setup, items: [] }, pieces)
      }),
      { numRuns: 60 },
    )
  }, 240_000)

  it('gives them for a ladder of powers, in whatever order it is climbed', () => {
    const powersW = [5, 10, 25, 50, 75, 100, 125, 150, 200, 250, 300, 400, 500, 600, 800, 1000]
    const ladder = (['built-in', 'none'] as const).flatMap((thermostat) =>
      powersW.map((powerW) => heater({ powerW, thermostat, lengthMm: 200, diameterMm: 20 })),
    )
    fc.assert(
      fc.property(anySetup, fc.shuffledSubarray(ladder, { minLength: 12, maxLength: 20 }), (setup, pieces) => {
        agree({ ...setup, items: [] }, pieces)
      }),
      { numRuns: 60 },
    )
  }, 240_000)

  it('gives them at the very limits of a chamber too', () => {
    const edges = [-0.11, -0.06, -0.05, 0, 0.05, 0.06, 0.11]
    const size = (values: Values): Piece[] =>
      ['vertical', 'horizontal', 'any', undefined].map((orientation) => heater({ ...values, orientation }))
    for (const [lengthMm, widthMm, waterDepthMm] of [
      [120, 100, 330],
      [300, 60, 200],
      [120, 43, 245],
    ] as const) {
      const setup = wholeSetup({ chambers: [{ id: 'rear', lengthMm, widthMm, waterDepthMm, heightMm: 390 }] })
      for (const edge of edges) {
        const across = Math.min(lengthMm, widthMm) - 20
        agree(setup, [
          ...size({ lengthMm: waterDepthMm + edge }),
          ...size({ diameterMm: across + edge, lengthMm: 100 }),
          ...size({ lengthMm: Math.max(lengthMm, widthMm) - 20 + edge, diameterMm: 20 }),
        ])
      }
    }
  }, 240_000)

  it('does not condemn a rod that a sump would take, where nobody spoke of how the tank is filtered', () => {
    const { filtration: _, ...unsaid } = tankValues
    const low = { ...unsaid, chambers: undefined, outerHeightMm: 200, waterLineMm: 150, displayWidthMm: 400 }
    const setup = wholeSetup({ ...low, filtration: undefined })
    const rod = heater({ lengthMm: 240, orientation: 'vertical', powerW: 60 })
    expect(fitCheck(setup, rod).checks[0]).toMatchObject({ id: 'heater.space', outcome: 'change' })
    agree(setup, [rod])
    agree(wholeSetup({ ...low, filtration: 'none' }), [rod])
  })
})
