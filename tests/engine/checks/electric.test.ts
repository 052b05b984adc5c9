import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { checkOf, heater, item, judge, piece, toPlain, wholeSetup } from '../build'

const pump = (values: Readonly<Record<string, unknown>> = {}) =>
  piece('return-pump', { powerW: 10, plugs: 1, volts: [120], plugType: 'A/B', ...values })
const light = (values: Readonly<Record<string, unknown>> = {}) =>
  piece('light', { powerW: 100, plugs: 1, volts: [120], plugType: 'A/B', ...values })
const strip = (values: Readonly<Record<string, unknown>> = {}) =>
  piece('power-strip', { outlets: 6, ratedA: 15, ratedV: 125, volts: [120], ...values })
const keeper = (values: Readonly<Record<string, unknown>> = {}) =>
  piece('temperature-controller', {
    maxLoadW: 1000,
    outlets: 2,
    plugs: 1,
    powerW: 3,
    rangeMinC: 10,
    rangeMaxC: 40,
    volts: [120],
    ...values,
  })

const setupWith = (mains: Setup['mains'], items: Setup['items'] = [], rest: Partial<Setup> = {}) =>
  wholeSetup({}, { mains: { ...wholeSetup().mains, ...mains }, items, ...rest })

describe('mains', () => {
  it('must be among the voltages that it is made for', () => {
    const outcome = (volts: readonly number[], mains: 100 | 120 | 230) =>
      judge(setupWith({ volts: mains }), light({ volts }), 'light.mains').outcome
    expect(outcome([120], 120)).toBe('pass')
    expect(outcome([100, 120, 230], 230)).toBe('pass')
    expect(outcome([230], 120)).toBe('fail')
    expect(outcome([120], 230)).toBe('fail')
    expect(outcome([100], 120)).toBe('fail')
  })

  it('has an adaptor for another plug only after its maker was asked', () => {
    const check = judge(setupWith({ volts: 230, plugType: 'G' }), light({ volts: [230], plugType: 'F' }), 'light.mains')
    expect(check.outcome).toBe('change')
    expect(check.message).toContain('ask its maker')
    expect(judge(setupWith({ plugType: 'A/B' }), light({ plugType: undefined }), 'light.mains').outcome).toBe('pass')
  })

  it('is unknown, and so is the answer, where nobody recorded the voltage', () => {
    const answer = fitCheck(wholeSetup(), heater({ volts: undefined }))
    expect(checkOf(answer, 'heater.mains')).toMatchObject({ outcome: 'nodata', missing: ['volts'] })
    expect(answer.verdict).toBe('unknown')
  })

  it('is told by a known country, and only assumed without one', () => {
    const heater230 = heater({ volts: [230], plugType: 'G' })
    const inCountry = (country: string | undefined) => {
      const { mains: _, country: __, ...rest } = wholeSetup()
      return judge({ ...rest, ...(country !== undefined && { country }) }, heater230, 'heater.mains').outcome
    }
    expect(inCountry('GB')).toBe('pass')
    expect(inCountry('DE')).toBe('change')
    expect(inCountry('US')).toBe('fail')
    expect(inCountry(undefined)).toBe('change')
  })

  it('condemns no piece on an assumed voltage, whatever its plug', () => {
    const { mains: _, country: __, ...unsaid } = wholeSetup()
    for (const plugType of ['G', 'F', 'I', 'other', undefined]) {
      const check = judge(unsaid, heater({ volts: [230], plugType }), 'heater.mains')
      expect(check.outcome, plugType).toBe('change')
      expect(toPlain(check.message)).toMatch(/It works if the (mains voltage|plug type) is .*; we assumed /)
    }
  })
})

describe('outlets', () => {
  it('must be free for each of its plugs after all others', () => {
    const outcome = (outlets: number, plugs: number) =>
      judge(setupWith({ outlets }, [item('pump', pump())]), light({ plugs }), 'light.plugs').outcome
    expect(outcome(2, 1)).toBe('pass')
    expect(outcome(1, 1)).toBe('change')
    expect(outcome(3, 2)).toBe('pass')
    expect(outcome(2, 2)).toBe('change')
    expect(outcome(0, 0)).toBe('pass')
    expect(outcome(0, 1)).toBe('change')
  })

  it('count those of strips, less the wall outlet that each takes', () => {
    const left = (outlets: number, ...strips: readonly number[]) =>
      judge(
        setupWith(
          { outlets },
          strips.map((count, index) => item(`strip-${index}`, strip({ outlets: count }))),
        ),
        light(),
        'light.plugs',
      ).limit
    expect(left(2)).toBe(2)
    expect(left(2, 6)).toBe(7)
    expect(left(2, 6, 4)).toBe(10)
    expect(left(0, 6)).toBe(6)
  })

  it('count no strip that would hang on another', () => {
    const chained = setupWith({ outlets: 1 }, [item('a', strip({ outlets: 4 })), item('b', strip({ outlets: 6 }))])
    expect(judge(chained, light(), 'light.plugs').limit).toBe(6)
  })

  it('are taken by the pump that the tank includes, unless another stands in for it', () => {
    const setup = wholeSetup({ includedPump: { powerW: 8, plugs: 1 } })
    expect(judge(setup, light(), 'light.plugs').limit).toBe(5)
    expect(judge({ ...setup, items: [item('pump', pump())] }, light(), 'light.plugs').limit).toBe(5)
    expect(judge(setup, pump(), 'return-pump.plugs').limit).toBe(5)
  })

  it('are not taken by a heater that a controller feeds', () => {
    const setup = setupWith({ outlets: 1 }, [item('keeper', keeper())])
    const fed = judge(setup, heater(), 'heater.plugs')
    expect(fed).toMatchObject({ outcome: 'pass', measured: 0, message: 'Plugs into the temperature controller.' })
    expect(judge(setup, heater(), 'heater.plugs', { quantity: 3 }).outcome).toBe('change')
  })

  it('are freed for a controller by the heaters that move to it', () => {
    const setup = setupWith({ outlets: 1 }, [item('heater', heater())])
    expect(judge(setup, keeper(), 'temperature-controller.plugs').outcome).toBe('pass')
    expect(judge(setupWith({ outlets: 0 }), keeper(), 'temperature-controller.plugs').outcome).toBe('change')
  })

  it('name what is short in good English', () => {
    const message = (outlets: number, plugs: number) =>
      judge(setupWith({ outlets }), light({ plugs }), 'light.plugs').message
    expect(message(0, 1)).toBe('Needs 1 outlet, and none is free. A strip goes on its own wall outlet.')
    expect(message(1, 2)).toBe('Needs 2 outlets, and only 1 is free. A strip goes on its own wall outlet.')
    expect(message(2, 3)).toBe('Needs 3 outlets, and only 2 are free. A strip goes on its own wall outlet.')
    expect(message(1, 1)).toBe('Takes 1 outlet of the 1 that is free.')
    expect(message(4, 2)).toBe('Takes 2 outlets of the 4 that are free.')
  })

  it('say so where a piece of the setup states no plugs', () => {
    const setup = setupWith({}, [item('pump', pump({ plugs: undefined }))])
    expect(fitCheck(setup, light()).cautions).toContain(
      '1 piece in the setup states no number of plugs and could not be counted.',
    )
  })

  it('decide nothing where the piece states no plugs', () => {
    expect(judge(wholeSetup(), heater({ plugs: undefined }), 'heater.plugs').outcome).toBe('nodata')
    expect(fitCheck(wholeSetup(), heater({ plugs: undefined })).verdict).toBe('fits')
    // Nor where every usual number of plugs would be too many: what is not known of a lesser check is listed, no more.
    expect(fitCheck(setupWith({ outlets: 0 }), heater({ plugs: undefined })).verdict).toBe('fits')
  })
})

describe('load on the circuit', () => {
  // NEC 210.19(A)(1), 210.20(A): continuous loads up to 80 % of the rating. 15 A at 120 V: 1440 W.
  it('stays within four fifths of the circuit', () => {
    const outcome = (powerW: number) => judge(wholeSetup(), light({ powerW }), 'light.load').outcome
    expect(outcome(1440)).toBe('pass')
    expect(outcome(1441)).toBe('change')
    expect(outcome(1801)).toBe('change')
  })

  it('goes by the weakest of circuit and strips', () => {
    const setup = setupWith({}, [item('strip', strip({ ratedA: 10 }))])
    expect(judge(setup, light(), 'light.load').limit).toBe(0.8 * 10 * 120)
    expect(judge(setupWith({ volts: 230, circuitA: 13 }), light(), 'light.load').limit).toBeCloseTo(0.8 * 2990, 9)
  })

  it('adds everything that runs, heaters at full power, the included pump, so many of each', () => {
    const items = [
      item('heater', heater(), { quantity: 2 }),
      item('pump', pump()),
      item('old', light(), { state: 'gone' }),
    ]
    expect(judge(setupWith({}, items), light(), 'light.load').measured).toBe(200 + 10 + 100)
    expect(judge(wholeSetup({ includedPump: { powerW: 8 } }), light(), 'light.load', { quantity: 2 }).measured).toBe(
      208,
    )
  })

  it('warns of outlets without residual-current protection, and of pieces that state no power', () => {
    const protect = (residualCurrentProtected: boolean) =>
      fitCheck(setupWith({ residualCurrentProtected }), light()).cautions.some((text) =>
        text.includes('residual-current'),
      )
    expect(protect(false)).toBe(true)
    expect(protect(true)).toBe(false)
    const silent = setupWith({}, [item('a', pump({ powerW: undefined })), item('b', light({ powerW: undefined }))])
    expect(fitCheck(silent, heater()).cautions).toContain(
      '2 pieces in the setup state no power and could not be counted.',
    )
  })

  it('is left to strips and controllers themselves, which pass on what others draw', () => {
    const ids = (what: ReturnType<typeof strip>) => fitCheck(wholeSetup(), what).checks.map(({ id }) => id)
    expect(ids(strip()).filter((id) => id === 'power-strip.load')).toHaveLength(1)
    expect(ids(strip())).not.toContain('power-strip.plugs')
    expect(ids(keeper()).filter((id) => id === 'temperature-controller.load')).toHaveLength(1)
  })
})

describe('made for', () => {
  const outcome = (madeFor: unknown) =>
    fitCheck(wholeSetup(), heater({ madeFor })).checks.find(({ id }) => id === 'heater.made-for')?.outcome

  it('fails only where its maker states other uses alone', () => {
    expect(outcome(['reef'])).toBe('pass')
    expect(outcome(['marine-fish', 'freshwater'])).toBe('pass')
    expect(outcome(['freshwater', 'plants'])).toBe('fail')
    expect(outcome([])).toBeUndefined()
    expect(outcome(undefined)).toBeUndefined()
  })

  it('names those uses', () => {
    const check = judge(wholeSetup(), heater({ madeFor: ['freshwater', 'plants'] }), 'heater.made-for')
    expect(check.message).toBe('Made for freshwater and planted tanks, not for salt water.')
  })
})
