import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { heater, item, judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const strip = (values: Values = {}) =>
  piece('power-strip', {
    outlets: 4,
    switchedOutlets: 0,
    ratedA: 15,
    ratedV: 125,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const light = (powerW: number, plugs = 1) => item(`light-${powerW}-${plugs}`, piece('light', { powerW, plugs }))
const keeper = item('keeper', piece('temperature-controller', { maxLoadW: 1000, outlets: 2, plugs: 1, powerW: 3 }))
const setupWith = (outlets: number, items: Setup['items'] = [], rest: Partial<Setup> = {}) =>
  wholeSetup({}, { mains: { ...wholeSetup().mains, outlets }, items, ...rest })
const check = (setup: Setup, id: string, values: Values = {}, options = {}) =>
  judge(setup, strip({ ...values }), `power-strip.${id}`, options)

describe('the outlets of a strip', () => {
  it('with the wall’s beyond the one it takes are as many as there are plugs', () => {
    // Two wall outlets: one for the strip, one free.
    expect(check(setupWith(2, [light(10, 5)]), 'outlets').outcome).toBe('pass')
    expect(check(setupWith(2, [light(10, 6)]), 'outlets').outcome).toBe('change')
    expect(check(setupWith(2, [light(10, 6)]), 'outlets', { outlets: 5 }).outcome).toBe('pass')
    expect(check(setupWith(2, [light(10, 6)]), 'outlets').message).toBe(
      '1 more outlet needed beside it: a second strip on its own wall outlet.',
    )
    expect(check(setupWith(2, [light(10, 8)]), 'outlets').message).toMatch(/^3 more outlets needed/)
  })

  it('are not needed for heaters on a controller’s own', () => {
    const items = [light(10, 4), keeper, item('heater', heater(), { quantity: 2 })]
    // 4 + 1 for the controller; its two heaters sit on it.
    expect(check(setupWith(2, items), 'outlets').outcome).toBe('pass')
    expect(
      check(
        setupWith(
          2,
          items.filter((one) => one !== keeper),
        ),
        'outlets',
      ).outcome,
    ).toBe('change')
  })

  it('count in place of the old strip, and beside it where asked', () => {
    const setup = setupWith(2, [item('old', strip({ outlets: 8 })), light(10, 9)])
    expect(check(setup, 'outlets').outcome).toBe('change')
    expect(check(setup, 'outlets', {}, { beside: true }).outcome).toBe('pass')
  })

  it('need a wall outlet for each strip', () => {
    expect(check(setupWith(0), 'outlets')).toMatchObject({ outcome: 'change' })
    expect(check(setupWith(0), 'outlets').message).toBe(
      'Needs a wall outlet of its own, and none is free: a strip never goes on another strip.',
    )
    expect(check(setupWith(1, [item('old', strip())]), 'outlets', {}, { beside: true }).outcome).toBe('change')
    expect(check(setupWith(1), 'outlets', {}, { quantity: 2 }).outcome).toBe('change')
    expect(check(setupWith(2), 'outlets', {}, { quantity: 2 }).outcome).toBe('pass')
  })

  it('are worth a word where a piece states no plugs, and no data where the strip states none', () => {
    const setup = setupWith(2, [item('light', piece('light', {}))])
    expect(fitCheck(setup, strip()).cautions).toContain(
      '1 piece in the setup states no number of plugs and could not be counted.',
    )
    expect(check(setup, 'outlets', { outlets: undefined })).toMatchObject({ outcome: 'nodata', missing: ['outlets'] })
  })
})

describe('the load of a strip', () => {
  // NEC 210.19(A)(1), 210.20(A): 80 % of the lower rating of strip and circuit; 10 A at 120 V: 960 of 1200 W.
  it('passes to 80 %, is a change to the full rating, and fails above', () => {
    const outcome = (watts: number) => check(setupWith(2, [light(watts)]), 'load', { ratedA: 10 }).outcome
    expect(outcome(960)).toBe('pass')
    expect(outcome(961)).toBe('change')
    expect(outcome(1200)).toBe('change')
    expect(outcome(1201)).toBe('fail')
  })

  it('goes by the circuit where that is the lower', () => {
    const mains = { ...wholeSetup().mains, circuitA: 8 }
    expect(check(wholeSetup({}, { mains }), 'load').limit).toBeCloseTo(0.8 * 8 * 120, 9)
  })

  it('does not condemn on an assumed circuit', () => {
    const { circuitA: _, ...mains } = wholeSetup().mains ?? {}
    // 15 A assumed: 1800 W. The strip itself is rated for 20 A.
    const setup = wholeSetup({}, { mains, items: [light(1900)] })
    const lifted = check(setup, 'load', { ratedA: 20 })
    expect(lifted.outcome).toBe('change')
    expect(toPlain(lifted.message)).toContain('we assumed 15 A')
    expect(check(setup, 'load', { ratedA: 15 }).outcome).toBe('fail')
  })

  it('warns of outlets without protection, and never chains strips', () => {
    const setup = wholeSetup({}, { mains: { ...wholeSetup().mains, residualCurrentProtected: false } })
    expect(fitCheck(setup, strip()).cautions.join()).toContain('never chain strips')
    expect(fitCheck(wholeSetup(), strip()).cautions).toEqual([])
  })
})

describe('the rating of a strip', () => {
  it('is at least the voltage of the mains', () => {
    expect(check(wholeSetup(), 'rated-voltage', { ratedV: 120 }).outcome).toBe('pass')
    expect(check(wholeSetup(), 'rated-voltage', { ratedV: 119 }).outcome).toBe('fail')
    const mains = { ...wholeSetup().mains, volts: 230 as const }
    expect(check(wholeSetup({}, { mains }), 'rated-voltage').message).toBe('Rated for 125 V, not for 230 V mains.')
    expect(check(wholeSetup(), 'rated-voltage', { ratedV: undefined }).outcome).toBe('nodata')
    expect(check(wholeSetup(), 'load', { ratedA: undefined }).outcome).toBe('nodata')
  })
})

describe('the switched outlets of a strip', () => {
  const goals = (switchedOutlets: number) => ({ ...wholeSetup().goals, switchedOutlets })

  it('are asked for only where the goals ask', () => {
    const ids = (wanted: number) =>
      fitCheck(wholeSetup({}, { goals: goals(wanted) }), strip()).checks.map(({ id }) => id)
    expect(ids(0)).not.toContain('power-strip.switched')
    expect(ids(1)).toContain('power-strip.switched')
  })

  it('are at least as many as the goals ask for', () => {
    const outcome = (switchedOutlets: number | undefined) =>
      check(wholeSetup({}, { goals: goals(3) }), 'switched', { switchedOutlets })
    expect(outcome(3).outcome).toBe('pass')
    expect(outcome(2)).toMatchObject({ outcome: 'change', message: '2 switched outlets, 3 wanted.' })
    expect(outcome(undefined)).toMatchObject({ outcome: 'nodata', missing: ['switchedOutlets'] })
  })
})
