import { describe, expect, it } from 'vitest'
import { replacements } from '#shared/engine/swap/replacements'
import type { Replacement } from '#shared/engine/swap/types'
import type { Piece, Setup } from '#shared/engine/types'
import { heater, item, piece, roUnit, wholeSetup } from './build'
import { catalogueOf } from './demo-catalogue'
import { findAnswer, slugsOf, tellKnockOns, tellOption } from './stories/tell'

const page = { limit: 10, offset: 0 }
const swap = (setup: Setup, ...candidates: readonly Piece[]) =>
  replacements(setup, 'gone', catalogueOf(...candidates), page)!
const tellAddOns = ({ addOns }: Replacement) => addOns.map(({ need, options }) => [need, options.map(tellOption)])
const demandsOf = (answer: Replacement) =>
  tellKnockOns(answer).filter(([kind]) => kind === 'need' || kind === 'check' || kind === 'missing')

describe('an RO/DI unit that lacked a stage, gone', () => {
  const unit = (slug: string, ...stages: readonly string[]) => roUnit({ stages: ['membrane', ...stages] }, slug)
  const setup = wholeSetup({}, { items: [item('gone', unit('old', 'carbon', 'deionisation'), { state: 'gone' })] })
  const result = swap(
    setup,
    unit('bare'),
    unit('like', 'carbon', 'deionisation'),
    unit('other', 'sediment', 'carbon'),
    unit('whole', 'sediment', 'carbon', 'deionisation'),
  )

  it('excuses a replacement that lacks the same stage', () => {
    expect(findAnswer(result, 'like')).toMatchObject({ knockOns: [], addOns: [] })
  })

  it('excuses none that lacks others, or more', () => {
    for (const slug of ['other', 'bare']) {
      const answer = findAnswer(result, slug)
      expect(demandsOf(answer), slug).toEqual([['need', 'filter-stage', null, 'change']])
      expect(tellAddOns(answer), slug).toEqual([['filter-stage', []]])
    }
  })

  it('puts those that ask for nothing more first', () => {
    expect(slugsOf(result).slice(0, 2)).toEqual(['whole', 'like'])
  })
})

describe('an ammonia kit gone where nothing else is tested', () => {
  const kit = (slug: string, ...parameters: readonly string[]) => piece('test-kit', { parameters }, slug)
  const setup = wholeSetup({}, { items: [item('gone', kit('old', 'ammonia'), { state: 'gone' })] })
  const result = swap(setup, kit('nitrite', 'nitrite'), kit('same', 'ammonia'), kit('two', 'ammonia', 'nitrate'))

  it('leaves a nitrite kit without a test for ammonia', () => {
    const answer = findAnswer(result, 'nitrite')
    expect(demandsOf(answer)).toContainEqual(['need', 'cycle-tests', null, 'change'])
    expect(demandsOf(answer)).toContainEqual(['missing', 'cycle-tests', null, null])
    expect(tellAddOns(answer)).toEqual([['cycle-tests', [['two × 1']]]])
  })

  it('asks nothing new of a kit that measures as much or more', () => {
    for (const slug of ['same', 'two'])
      expect(findAnswer(result, slug), slug).toMatchObject({ knockOns: [], addOns: [] })
  })
})

describe('a heater that was far too strong, gone', () => {
  // 84 L: 1.5 W per litre are some 125 W, 2.5 W per litre some 210 W.
  const strong = (powerW: number, slug: string) => heater({ powerW, lengthMm: 250 }, slug)
  const setup = wholeSetup({}, { items: [item('gone', strong(400, 'old'), { state: 'gone' })] })

  it('does not excuse one that takes a second cut-off', () => {
    const answer = findAnswer(swap(setup, strong(200, 'w200')), 'w200')
    expect(answer.verdict).toBe('changes')
    expect(demandsOf(answer)).toEqual([['need', 'second-cut-off', null, 'change']])
    expect(tellAddOns(answer)).toEqual([['second-cut-off', []]])
  })
})

describe('a pump gone from a setup that is an outlet short', () => {
  const pump = (slug: string, plugs: number) =>
    piece(
      'wavemaker',
      {
        powerW: 10,
        plugs,
        volts: [120],
        plugType: 'A/B',
        flowMinLph: 500,
        flowMaxLph: 1500,
        wallMinMm: 5,
        wallMaxMm: 15,
      },
      slug,
    )
  const setup = wholeSetup(
    {},
    {
      mains: { ...wholeSetup().mains, outlets: 1 },
      items: [item('heater', heater()), item('gone', pump('old', 1), { state: 'gone' })],
    },
  )
  const strip = piece(
    'power-strip',
    { outlets: 6, ratedA: 15, ratedV: 125, plugs: 1, volts: [120], plugType: 'A/B' },
    'strip-6',
  )
  const result = swap(setup, pump('one', 1), pump('three', 3), strip)

  it('is not charged with that outlet', () => {
    expect(demandsOf(findAnswer(result, 'one'))).toEqual([])
    expect(findAnswer(result, 'one').addOns).toEqual([])
  })

  it('is charged with each more that its replacement takes', () => {
    const answer = findAnswer(result, 'three')
    expect(demandsOf(answer)).toContainEqual(['need', 'outlets', null, 'change'])
    expect(tellAddOns(answer)).toEqual([['outlets', [['strip-6 × 1']]]])
    expect(slugsOf(result)).toEqual(['one', 'three'])
  })
})

describe('a plug that needed an adaptor, gone', () => {
  const plugged = (plugType: string, slug: string) => heater({ plugType }, slug)
  const setup = wholeSetup({}, { items: [item('gone', plugged('F', 'old'), { state: 'gone' })] })

  it('excuses the same plug and no other', () => {
    const result = swap(setup, plugged('F', 'same'), plugged('G', 'other'))
    expect(demandsOf(findAnswer(result, 'same'))).toEqual([])
    expect(demandsOf(findAnswer(result, 'other'))).toEqual([['need', 'plug-adaptor', null, 'change']])
  })
})
