import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { checkOf, heater, item, judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const keeper = (values: Values = {}) =>
  piece('temperature-controller', {
    maxLoadW: 200,
    outlets: 2,
    rangeMinC: 10,
    rangeMaxC: 40,
    plugs: 1,
    powerW: 3,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const setupWith = (...items: Setup['items']) => wholeSetup({}, { items })
const check = (setup: Setup, id: string, values: Values = {}, quantity = 1) =>
  judge(setup, keeper({ ...values }), `temperature-controller.${id}`, { quantity })

describe('the load of a temperature controller', () => {
  it('is at least the power of the heaters it feeds', () => {
    const setup = setupWith(item('a', heater({ powerW: 120 })), item('b', heater({ powerW: 80 })))
    expect(check(setup, 'load')).toMatchObject({ outcome: 'pass', measured: 200, limit: 200, margin: 0 })
    expect(check(setup, 'load', { maxLoadW: 199 })).toMatchObject({ outcome: 'fail' })
    expect(check(setup, 'load', { maxLoadW: 120 }, 2).outcome).toBe('pass')
  })

  it('carries each heater by itself, not on two controllers together', () => {
    expect(check(setupWith(item('a', heater({ powerW: 300 }))), 'load', { maxLoadW: 200 }, 2).outcome).toBe('fail')
  })

  it('counts so many of each, and none that is gone', () => {
    const heaters = (state: 'have' | 'gone') => setupWith(item('a', heater({ powerW: 120 }), { quantity: 2, state }))
    expect(check(heaters('have'), 'load').outcome).toBe('fail')
    expect(check(heaters('gone'), 'load').outcome).toBe('pass')
    expect(toPlain(check(heaters('gone'), 'load').message)).toContain('no heater in the setup')
  })

  it('is not known for heaters that state no power, unless the rest is too much already', () => {
    const silent = item('a', heater({ powerW: undefined }))
    expect(check(setupWith(silent), 'load').outcome).toBe('nodata')
    expect(fitCheck(setupWith(silent), keeper()).verdict).toBe('unknown')
    expect(check(setupWith(silent, item('b', heater({ powerW: 250 }))), 'load').outcome).toBe('fail')
    expect(check(setupWith(), 'load', { maxLoadW: undefined })).toMatchObject({
      outcome: 'nodata',
      missing: ['maxLoadW'],
    })
  })
})

describe('the outlets of a temperature controller', () => {
  it('are one for each heater plug', () => {
    const two = setupWith(item('a', heater(), { quantity: 2 }))
    expect(check(two, 'outlets').outcome).toBe('pass')
    expect(check(two, 'outlets', { outlets: 1 }).outcome).toBe('fail')
    expect(check(two, 'outlets', { outlets: 1 }, 2).outcome).toBe('pass')
    expect(check(two, 'outlets', { outlets: 1 }).message).toBe('Has 1 outlet for 2 heater plugs.')
    expect(check(setupWith(), 'outlets').message).toBe('Has 2 outlets; there is no heater in the setup to plug in.')
    expect(check(two, 'outlets', { outlets: undefined })).toMatchObject({ outcome: 'nodata', missing: ['outlets'] })
  })
})

describe('the range of a temperature controller', () => {
  // The goal is 25 °C.
  const range = (rangeMinC: number | undefined, rangeMaxC: number | undefined) =>
    check(setupWith(), 'range', { rangeMinC, rangeMaxC })

  it('holds the goal, ends included', () => {
    expect(range(25, 40).outcome).toBe('pass')
    expect(range(10, 25).outcome).toBe('pass')
    expect(range(25.1, 40).outcome).toBe('fail')
    expect(range(10, 24.9).outcome).toBe('fail')
    expect(range(10, 24.9).margin).toBeLessThan(0)
  })

  it('fails by one known end, without a margin of the wrong sign', () => {
    expect(range(26, undefined)).toMatchObject({ outcome: 'fail', margin: null })
    expect(range(undefined, 24)).toMatchObject({ outcome: 'fail', margin: null })
    expect(toPlain(range(26, undefined).message)).toBe('Cannot be set to 25 °C: it starts at 26 °C.')
    expect(toPlain(range(undefined, 24).message)).toBe('Cannot be set to 25 °C: it ends at 24 °C.')
  })

  it('is not known by one end that allows it, but every usual controller reaches 25 °C', () => {
    expect(range(10, undefined)).toMatchObject({ outcome: 'nodata', missing: ['rangeMaxC'] })
    const answer = fitCheck(setupWith(), keeper({ rangeMaxC: undefined }))
    expect(checkOf(answer, 'temperature-controller.range').outcome).toBe('nodata')
    expect(answer.verdict).toBe('fits')
  })

  it('does not condemn by an assumed goal', () => {
    const { goals: _, ...unsaid } = wholeSetup()
    const lifted = judge(unsaid, keeper({ rangeMinC: 26, rangeMaxC: 40 }), 'temperature-controller.range')
    expect(lifted.outcome).toBe('change')
    expect(toPlain(lifted.message)).toContain(
      'It works if the water temperature is at least 26 °C; we assumed 25.5 °C.',
    )
    expect(judge(unsaid, keeper({ rangeMinC: 29, rangeMaxC: 40 }), 'temperature-controller.range').outcome).toBe('fail')
  })
})
