import { describe, expect, it } from 'vitest'
import { replacements } from '#shared/engine/swap/replacements'
import type { Item, Setup } from '#shared/engine/types'
import { item, piece, roUnit, wholeSetup } from '../build'
import { catalogueOf } from '../demo-catalogue'
import { findAnswer, slugsOf, tellKnockOns, tellOption } from './tell'

type Values = Readonly<Record<string, unknown>>

const unit = (slug: string, values: Values = {}) => roUnit(values, slug)
const booster = (slug: string, values: Values = {}) =>
  piece(
    'booster-pump',
    { inletMinKPa: 70, outletKPa: 550, maxLpd: 1500, powerW: 28, plugs: 1, volts: [120], plugType: 'A/B', ...values },
    slug,
  )
const strip = piece(
  'power-strip',
  { outlets: 6, ratedA: 15, ratedV: 125, plugs: 1, volts: [120], plugType: 'A/B' },
  'strip-6',
)

const catalogue = catalogueOf(
  unit('boosted', { boosterIncluded: true, minFeedKPa: 100 }),
  unit('plain'),
  // Gives less than the 280 kPa that the membrane asks for.
  booster('weak', { outletKPa: 250 }),
  // Asks for more at its inlet than the tap has.
  booster('thirsty', { inletMinKPa: 230 }),
  // 280 L/d at 350 kPa and 25 °C come to some 350 L/d at 550 kPa and 15 °C, and to over 1000 with three parts of waste.
  booster('slow', { maxLpd: 600 }),
  booster('right'),
  strip,
)

/** The tap has 200 kPa, 15 °C and 250 ppm. */
const setupWith = (outlets: number, ...items: readonly Item[]): Setup => {
  const { mains, water } = wholeSetup()
  return wholeSetup({}, { mains: { ...mains, outlets }, water: { ...water, feedKPa: 200 }, items })
}
const ask = (setup: Setup) => replacements(setup, 'unit', catalogue, { limit: 10, offset: 0 })!
const gone = item('unit', unit('old', { boosterIncluded: true, minFeedKPa: 100 }), { state: 'gone' })

describe('an RO/DI unit with its own booster pump, gone where the tap’s pressure is low', () => {
  const result = ask(setupWith(6, gone))

  it('can be replaced by another that has one, with nothing else', () => {
    expect(slugsOf(result)).toEqual(['boosted', 'plain'])
    expect(findAnswer(result, 'boosted')).toMatchObject({ verdict: 'fits', knockOns: [], addOns: [], differences: [] })
  })

  it('can be replaced by a plain one with a booster pump that suits the unit and the tap', () => {
    const answer = findAnswer(result, 'plain')
    expect(answer.verdict).toBe('changes')
    // It needs 280 kPa, and the tap has 200: a margin of (200 − 280) / 280.
    const pressure = answer.checks.find(({ id }) => id === 'ro-unit.pressure')
    expect(pressure).toMatchObject({ outcome: 'change', measured: 200, limit: 280 })
    expect(pressure?.margin).toBeCloseTo(-80 / 280, 9)
    expect(tellKnockOns(answer)).toEqual([['need', 'feed-pressure', null, 'change']])
    expect(answer.addOns.map(({ need, options }) => [need, options.map(tellOption)])).toEqual([
      ['feed-pressure', [['right × 1']]],
    ])
    expect(answer.differences.map(({ key, from, to, sense }) => [key, from, to, sense])).toEqual([
      ['minFeedKPa', 100, 280, 'worse'],
      ['boosterIncluded', true, false, 'worse'],
    ])
  })

  it('needs a strip for the booster pump as well where no outlet is free', () => {
    // A lamp on the wall’s only outlet; the pump’s plug needs another, and a strip takes the wall’s for six.
    const lamp = item('lamp', piece('light', { powerW: 60, plugs: 1 }))
    const answer = findAnswer(ask(setupWith(1, gone, lamp)), 'plain')
    expect(answer.addOns.map(({ options }) => options.map(tellOption))).toEqual([[['right × 1', 'strip-6 × 1']]])
  })
})

describe('an RO/DI unit behind a booster pump of the setup, gone', () => {
  const mine = item('mine', booster('mine'))

  it('can be replaced by a plain one with nothing else', () => {
    const plainGone = item('unit', unit('old'), { state: 'gone' })
    expect(findAnswer(ask(setupWith(6, plainGone, mine)), 'plain')).toMatchObject({ verdict: 'fits', knockOns: [] })
  })

  it('frees the booster pump where the new one has its own', () => {
    const plainGone = item('unit', unit('old'), { state: 'gone' })
    expect(tellKnockOns(findAnswer(ask(setupWith(6, plainGone, mine)), 'boosted'))).toEqual([
      ['freed', 'mine', null, null],
    ])
  })
})
