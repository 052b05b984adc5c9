import { describe, expect, it } from 'vitest'
import { replacements } from '#shared/engine/swap/replacements'
import type { Item, Setup } from '#shared/engine/types'
import { heater, item, piece, wholeSetup } from '../build'
import { catalogueOf } from '../demo-catalogue'
import { findAnswer, slugsOf, tellKnockOns, tellOption } from './tell'

type Values = Readonly<Record<string, unknown>>

const mains = { volts: [120], plugType: 'A/B', plugs: 1 }
const titanium = (slug: string, values: Values = {}) =>
  heater(
    { form: 'titanium-rod', lengthMm: 220, diameterMm: 19, powerW: 150, thermostat: 'external-needed', ...values },
    slug,
  )
const controller = (slug: string, maxLoadW: number, outlets = 1) =>
  piece('temperature-controller', { maxLoadW, outlets, rangeMinC: 18, rangeMaxC: 34, powerW: 3, ...mains }, slug)

const glass = heater({ lengthMm: 300, powerW: 150 }, 'glass-150')
// Upright only: 340 mm is more than the 330 mm of water in the chamber.
const tall = heater({ lengthMm: 340, powerW: 150, orientation: 'vertical' }, 'tall-150')
const bare = titanium('bare-150')
const strong = titanium('bare-165', { powerW: 165 })
const catalogue = catalogueOf(
  glass,
  tall,
  bare,
  strong,
  controller('keeper-100', 100),
  controller('keeper-150', 150),
  controller('keeper-300', 300, 2),
)
const page = { limit: 10, offset: 0 }

/** Six free outlets of the wall. */
const setupWith = (...items: readonly Item[]): Setup => wholeSetup({}, { items })
const ask = (setup: Setup) => replacements(setup, 'heater', catalogue, page)!

describe('a titanium heater that came with its controller and is gone', () => {
  const gone = titanium('complete-150', { thermostat: 'external-included' })
  const result = ask(setupWith(item('heater', gone, { state: 'gone' })))

  it('is told apart from what is left', () => {
    expect(result.gone).toMatchObject({ id: 'heater', kind: 'heater', quantity: 1, gear: { slug: 'complete-150' } })
    // One fits, two need a controller, one is too tall for the chamber.
    expect(result.counts).toEqual({ fits: 1, changes: 2, no: 1, unknown: 0 })
    // 165 W would run 84/165 of the time on the coldest night, nearer to half of it than 150 W.
    expect(slugsOf(result)).toEqual(['glass-150', 'bare-165', 'bare-150', 'tall-150'])
  })

  it('can be replaced by a glass rod with nothing else, which is longer', () => {
    const answer = findAnswer(result, 'glass-150')
    expect(answer).toMatchObject({ verdict: 'fits', knockOns: [], addOns: [] })
    expect(answer.differences.map(({ key, from, to }) => [key, from, to])).toEqual([
      ['form', 'titanium-rod', 'glass-rod'],
      ['lengthMm', 220, 300],
      ['diameterMm', 19, 23],
      ['thermostat', 'external-included', 'built-in'],
    ])
  })

  it('can be replaced by another titanium rod with a controller that switches 150 W', () => {
    const answer = findAnswer(result, 'bare-150')
    expect(tellKnockOns(answer)).toEqual([['need', 'temperature-control', null, 'change']])
    // The 100 W one is too weak; the others do, one of each.
    expect(answer.addOns.map(({ need, options }) => [need, options.map(tellOption)])).toEqual([
      ['temperature-control', [['keeper-150 × 1'], ['keeper-300 × 1']]],
    ])
  })

  it('takes a stronger controller for a stronger rod, and the watts of both move', () => {
    const answer = findAnswer(result, 'bare-165')
    expect(answer.addOns[0]?.options.map(tellOption)).toEqual([['keeper-300 × 1']])
    // 150 W before, 165 W after; the controller is not there yet.
    expect(tellKnockOns(answer)).toContainEqual(['budget', 'powerW', 150, 165])
  })

  it('cannot be replaced by a rod that is too tall, and nothing else is told of it', () => {
    expect(findAnswer(result, 'tall-150')).toMatchObject({ verdict: 'no', knockOns: [], addOns: [] })
    expect(result.failedBy.map(({ check, count }) => [check, count])).toEqual([['heater.space', 1]])
  })
})

describe('a titanium heater on a controller of its own, gone', () => {
  const gone = titanium('old-150')
  const result = ask(setupWith(item('heater', gone), item('keeper', controller('mine', 160))))

  it('can be replaced by one like it with nothing else', () => {
    expect(findAnswer(result, 'bare-150')).toMatchObject({ verdict: 'fits', knockOns: [], addOns: [], differences: [] })
  })

  it('frees the controller where the replacement has a thermostat', () => {
    const answer = findAnswer(result, 'glass-150')
    expect(answer.verdict).toBe('fits')
    expect(tellKnockOns(answer)).toEqual([['freed', 'keeper', null, null]])
    expect(answer.knockOns[0]?.message).toBe('Inventmark mine is no longer needed.')
  })

  it('asks more of the controller than it can switch where the replacement is stronger', () => {
    // The rod asks for control, and the controller that stays would have to switch 165 W with its 160 W.
    const answer = findAnswer(result, 'bare-165')
    expect(tellKnockOns(answer).slice(0, 2)).toEqual([
      ['need', 'temperature-control', null, 'change'],
      ['check', 'keeper', 'pass', 'fail'],
    ])
    expect(answer.addOns.map(({ need }) => need)).toEqual(['temperature-control'])
  })
})
