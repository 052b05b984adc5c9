import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import { thresholds } from '#shared/engine/thresholds'
import type { Setup } from '#shared/engine/types'
import { checkOf, heater, item, judge, judgeOutcome, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const controller = (values: Values = {}) =>
  piece('temperature-controller', {
    maxLoadW: 500,
    outlets: 2,
    rangeMinC: 10,
    rangeMaxC: 40,
    plugs: 1,
    powerW: 3,
    ...values,
  })

const withItems = (...items: Setup['items']) => wholeSetup({}, { items })

describe('power', () => {
  it('is not needed in a room as warm as the water', () => {
    const hot = wholeSetup(
      { lid: 'solid' },
      { room: { temperatureC: 31, coldestC: 30, warmestC: 32, relativeHumidity: 1 } },
    )
    const check = judge(hot, heater({ powerW: 5 }), 'heater.power')
    expect(check).toMatchObject({ outcome: 'pass', limit: 0, margin: null })
    expect(check.message).toBe('No heater is needed at these temperatures.')
  })

  it('adds up with the heaters that stay beside it', () => {
    const setup = withItems(item('other', heater({ powerW: 60 })))
    expect(judge(setup, heater({ powerW: 40 }), 'heater.power', { beside: true }).measured).toBe(100)
    expect(judge(setup, heater({ powerW: 40 }), 'heater.power').measured).toBe(40)
    expect(judge(setup, heater({ powerW: 40 }), 'heater.power', { instead: ['other'] }).measured).toBe(40)
    expect(judge(setup, heater({ powerW: 40 }), 'heater.power', { quantity: 2, beside: true }).measured).toBe(140)
  })

  it('is helped by the pumps in the water, and half as much by those with DC control', () => {
    const need = (...items: Setup['items']) => judge(withItems(...items), heater(), 'heater.power').limit as number
    const pump = (values: Values) => item('pump', piece('return-pump', { powerW: 20, ...values }))
    expect(need() - need(pump({}))).toBeCloseTo(20, 9)
    expect(need() - need(pump({ dcControl: true }))).toBeCloseTo(10, 9)
    expect(need() - need({ ...pump({}), quantity: 2 })).toBeCloseTo(40, 9)
    expect(need() - need({ ...pump({}), state: 'gone' })).toBeCloseTo(0, 9)
    expect(need() - need(item('light', piece('light', { powerW: 100 })))).toBeCloseTo(0, 9)
    const included = wholeSetup({ includedPump: { powerW: 12 } })
    expect(need() - (judge(included, heater(), 'heater.power').limit as number)).toBeCloseTo(12, 9)
  })

  it('is needed less under a solid lid, and less behind acrylic', () => {
    const need = (tank: Values) => judge(wholeSetup(tank), heater(), 'heater.power').limit as number
    expect(need({ lid: 'solid' })).toBeLessThan(need({}))
    expect(need({ lid: 'mesh' })).toBe(need({}))
    expect(need({ material: 'acrylic' })).toBeLessThan(need({}))
  })

  it('is needed for a sump’s open water too', () => {
    const need = (tank: Values) =>
      judge(wholeSetup({ chambers: undefined, ...tank }), heater(), 'heater.power').limit as number
    expect(need({ filtration: 'sump', sump: { lengthMm: 400, widthMm: 250, waterDepthMm: 240 } })).toBeGreaterThan(
      need({ filtration: 'none' }),
    )
  })

  it('comes from two where two hold and there is room for both', () => {
    const roomy = [{ id: 'rear', lengthMm: 120, widthMm: 100, waterDepthMm: 330, heightMm: 390 }]
    const answer = fitCheck(wholeSetup({ chambers: roomy }), heater({ powerW: 50 }))
    expect(answer).toMatchObject({ verdict: 'changes', pieces: [{ quantity: 2 }] })
    expect(toPlain(answer.summary)).toMatch(/^Two of these: one alone gives 50 W of the 8\d–9\d W that hold 25 °C\.$/)
    expect(checkOf(answer, 'heater.plugs').measured).toBe(2)
  })

  it('does not come from two where there is no room for two', () => {
    const tight = [{ id: 'rear', lengthMm: 60, widthMm: 62, waterDepthMm: 330, heightMm: 390 }]
    const answer = fitCheck(wholeSetup({ chambers: tight }), heater({ powerW: 45 }))
    expect(answer.pieces).toEqual([{ gear: null, quantity: 1 }])
    expect(checkOf(answer, 'heater.power').outcome).toBe('fail')
    expect(answer.summary).toContain('Too weak')
  })

  it('is asked of the quantity that was named', () => {
    const answer = fitCheck(wholeSetup(), heater({ powerW: 50 }), { quantity: 2 })
    expect(answer).toMatchObject({ verdict: 'fits', pieces: [{ quantity: 2 }] })
  })

  it('is not judged for shapes whose areas are not computed', () => {
    const round = wholeSetup({ shape: 'cylinder' })
    expect(judgeOutcome(round, heater(), 'heater.power')).toBe('nodata')
    expect(judgeOutcome(round, heater(), 'heater.not-too-strong')).toBe('nodata')
    expect(fitCheck(round, heater()).verdict).toBe('unknown')
  })

  it('is not judged where nobody recorded it', () => {
    const unknown = heater({ powerW: undefined })
    for (const id of ['heater.power', 'heater.not-too-strong', 'heater.load'])
      expect(judge(wholeSetup(), unknown, id), id).toMatchObject({ outcome: 'nodata', missing: ['powerW'] })
    expect(fitCheck(wholeSetup(), unknown).verdict).toBe('unknown')
  })
})

describe('not too strong', () => {
  // 84 L: common practice lets 126 W (1.5 W/L) or twice the need pass, 210 W (2.5 W/L) with a second cut-off.
  it('asks for a second cut-off in between, and names it as a need', () => {
    const answer = fitCheck(wholeSetup(), heater({ powerW: 200 }))
    expect(checkOf(answer, 'heater.not-too-strong').outcome).toBe('change')
    expect(answer.knockOns).toContainEqual(expect.objectContaining({ kind: 'need', subject: 'second-cut-off' }))
  })

  it('has it in a separate controller, unless that is the heater’s only thermostat', () => {
    const strength = (thermostat: string | undefined, quantity: number) =>
      judgeOutcome(
        withItems(item('keeper', controller({ maxLoadW: 900 }), { quantity })),
        heater({ powerW: 200, thermostat }),
        'heater.not-too-strong',
      )
    expect(strength('built-in', 1)).toBe('pass')
    expect(strength('external-included', 1)).toBe('pass')
    expect(strength('external-needed', 1)).toBe('change')
    expect(strength(undefined, 1)).toBe('change')
    expect(strength('external-needed', 2)).toBe('pass')
  })

  it('fails above, controller or not', () => {
    expect(judgeOutcome(wholeSetup(), heater({ powerW: 211 }), 'heater.not-too-strong')).toBe('fail')
    expect(
      judgeOutcome(withItems(item('keeper', controller())), heater({ powerW: 211 }), 'heater.not-too-strong'),
    ).toBe('fail')
  })

  it('counts all heaters together', () => {
    const setup = withItems(item('other', heater({ powerW: 120 })))
    expect(judgeOutcome(setup, heater({ powerW: 120 }), 'heater.not-too-strong', { beside: true })).toBe('fail')
    expect(fitCheck(setup, heater(), { beside: true }).cautions[0]).toContain('If all heaters stick on')
    expect(fitCheck(setup, heater()).cautions[0]).toContain('If it sticks on')
  })

  it('counts the water that rock and sand leave where both were given', () => {
    // In a room nearly as warm as the water the litres decide: 1.5 W each of 84 L, or of what is left.
    const room = { ...wholeSetup().room, coldestC: 23.5, temperatureC: 24 }
    const limit = (goals: Setup['goals']) =>
      judge(wholeSetup({}, { room, goals: { ...wholeSetup().goals, ...goals } }), heater(), 'heater.not-too-strong')
        .limit
    expect(limit({})).toBeCloseTo(126, 9)
    expect(limit({ rockKg: 27 })).toBeCloseTo(1.5 * (84 - 27 / 2.7 - (0.6 * 0.29 * 40 * 1.54) / 2.8), 9)
  })

  it('speaks of a fan or a chiller where the warmest room alone is too warm', () => {
    const warm = wholeSetup(
      { lid: 'solid' },
      { room: { temperatureC: 26, coldestC: 22, warmestC: 32, relativeHumidity: 0.8 } },
    )
    expect(fitCheck(warm, heater()).cautions.some((text) => text.includes('a fan or a chiller'))).toBe(true)
    expect(fitCheck(wholeSetup(), heater()).cautions.some((text) => text.includes('chiller'))).toBe(false)
  })
})

describe('rated volume', () => {
  // 84 L in the tank.
  const rated = (min: number | undefined, max: number | undefined) =>
    judge(wholeSetup(), heater({ ratedVolumeMinL: min, ratedVolumeMaxL: max }), 'heater.rated-volume')

  it('passes inside both ends, and does not judge a missing one', () => {
    expect(rated(84, 84).outcome).toBe('pass')
    expect(rated(undefined, 84).outcome).toBe('pass')
    expect(rated(84, undefined).outcome).toBe('pass')
    expect(rated(undefined, undefined)).toMatchObject({ outcome: 'nodata', missing: ['ratedVolumeMaxL'] })
  })

  it('is a caution up to 15 % outside, and a change beyond', () => {
    const edge = thresholds.ratedVolumeSlack.value
    expect(edge).toBe(0.15)
    expect(rated(undefined, 84 / 1.149).outcome).toBe('pass')
    expect(rated(undefined, 84 / 1.151).outcome).toBe('change')
    expect(rated(84 / 0.851, undefined).outcome).toBe('pass')
    expect(rated(84 / 0.849, undefined).outcome).toBe('change')
    const cautions = (values: Values) => fitCheck(wholeSetup(), heater(values)).cautions.map(toPlain)
    expect(cautions({ ratedVolumeMaxL: 80 })).toContain('Its maker’s rating stops just short of this tank’s 84 L.')
    expect(cautions({ ratedVolumeMinL: 90 })).toContain('Its maker’s rating starts just above this tank’s 84 L.')
    expect(cautions({}).join()).not.toContain('rating')
  })

  it('says which way it is off', () => {
    expect(toPlain(rated(undefined, 50).message)).toBe('Its maker rates it for a smaller tank: up to 50 L.')
    expect(toPlain(rated(200, 400).message)).toBe('Its maker rates it for a larger tank: 200–400 L.')
    expect(toPlain(rated(200, undefined).message)).toBe('Its maker rates it for a larger tank: from 200 L.')
  })

  it('has a margin that is negative outside of what passes and positive inside', () => {
    // 15 % to either side of the rating (common practice).
    expect(rated(undefined, 50).margin).toBeCloseTo((57.5 - 84) / 57.5, 9)
    expect(rated(200, undefined).margin).toBeCloseTo((84 - 170) / 170, 9)
    expect(rated(60, 100).margin).toBeCloseTo((115 - 84) / (115 - 51), 9)
    expect(rated(100, 200).margin).toBeCloseTo((84 - 85) / (230 - 85), 9)
  })

  it('is as sure as it is far from where a change begins, and says when it passes outside of the rating', () => {
    const outside = rated(94.6, 170.3)
    expect(outside).toMatchObject({ outcome: 'pass' })
    expect(outside.margin).toBeGreaterThan(0)
    expect(outside.probability).toBeGreaterThan(0.5)
    expect(toPlain(outside.message)).toContain(
      'Its maker rates it for 94.6–170 L, and this tank is only a little off that.',
    )
    expect(toPlain(rated(80, 170).message)).toBe('Its maker rates it for 80–170 L.')
  })

  it('goes by the nominal volume where there is one', () => {
    expect(judge(wholeSetup({ nominalVolumeL: 90 }), heater(), 'heater.rated-volume').measured).toBe(90)
  })

  it('decides nothing where it is not known', () => {
    const unknown = heater({ ratedVolumeMinL: undefined, ratedVolumeMaxL: undefined })
    expect(fitCheck(wholeSetup(), unknown).verdict).toBe('fits')
    expect(judgeOutcome(wholeSetup({ shape: 'cylinder' }), heater(), 'heater.rated-volume')).toBe('nodata')
  })
})

describe('thermostat', () => {
  const bare = { thermostat: 'external-needed' }
  const outcome = (setup: Setup, values: Values, quantity?: number) =>
    judgeOutcome(setup, heater({ ...bare, ...values }), 'heater.thermostat', quantity === undefined ? {} : { quantity })

  it('is built in or comes with the heater', () => {
    expect(judgeOutcome(wholeSetup(), heater({ thermostat: 'built-in' }), 'heater.thermostat')).toBe('pass')
    expect(judgeOutcome(wholeSetup(), heater({ thermostat: 'external-included' }), 'heater.thermostat')).toBe('pass')
  })

  it('is otherwise a controller to be bought, with the load named', () => {
    const answer = fitCheck(wholeSetup(), heater(bare))
    expect(answer.verdict).toBe('changes')
    expect(answer.knockOns).toContainEqual(
      expect.objectContaining({ kind: 'need', subject: 'temperature-control', to: 'change' }),
    )
    expect(toPlain(checkOf(answer, 'heater.thermostat').message)).toBe(
      'Has no thermostat: needs a temperature controller for 100 W.',
    )
  })

  it('is a controller in the setup with load and an outlet to spare', () => {
    const keeper = (values: Values) => withItems(item('keeper', controller(values)))
    expect(outcome(keeper({ maxLoadW: 100 }), {})).toBe('pass')
    expect(outcome(keeper({ maxLoadW: 99 }), {})).toBe('change')
    expect(outcome(keeper({ outlets: 1 }), { plugs: 2 })).toBe('change')
    expect(outcome(keeper({ outlets: 1 }), {}, 2)).toBe('change')
    expect(outcome(keeper({ maxLoadW: 199 }), {}, 2)).toBe('change')
    expect(outcome(keeper({ maxLoadW: 200 }), {}, 2)).toBe('pass')
  })

  it('is not two controllers that only together carry one heater', () => {
    const pair = withItems(item('one', controller({ maxLoadW: 60 })), item('two', controller({ maxLoadW: 60 })))
    expect(outcome(pair, {})).toBe('change')
  })

  it('leaves the controller’s outlets and load to the heaters already on it', () => {
    const setup = withItems(
      item('keeper', controller({ maxLoadW: 150, outlets: 2 })),
      item('old', heater({ powerW: 60 })),
    )
    expect(judgeOutcome(setup, heater(bare), 'heater.thermostat', { beside: true })).toBe('change')
    expect(judgeOutcome(setup, heater({ ...bare, powerW: 90 }), 'heater.thermostat', { beside: true })).toBe('pass')
    expect(judgeOutcome(setup, heater(bare), 'heater.thermostat')).toBe('pass')
  })

  it('is not known where a number it turns on is missing', () => {
    const keeper = withItems(item('keeper', controller()))
    expect(judgeOutcome(keeper, heater({ ...bare, plugs: undefined }), 'heater.thermostat')).toBe('nodata')
    expect(
      judgeOutcome(withItems(item('keeper', controller({ maxLoadW: undefined }))), heater(bare), 'heater.thermostat'),
    ).toBe('nodata')
    expect(judge(wholeSetup(), heater({ thermostat: undefined }), 'heater.thermostat')).toMatchObject({
      outcome: 'nodata',
      missing: ['thermostat'],
    })
  })
})

describe('the sentence that sums a heater up', () => {
  const summary = (values: Readonly<Record<string, unknown>>) => fitCheck(wholeSetup(), heater(values)).summary

  it('names the number that the verdict turns on, not another that is missing too', () => {
    expect(fitCheck(wholeSetup(), heater({ diameterMm: undefined, powerW: undefined })).verdict).toBe('unknown')
    expect(summary({ diameterMm: undefined, powerW: undefined })).toMatch(/power/)
  })

  it('tells how it fits, where what is missing changes nothing', () => {
    expect(fitCheck(wholeSetup(), heater({ diameterMm: undefined })).verdict).toBe('fits')
    expect(summary({ diameterMm: undefined })).not.toMatch(/Nobody has recorded/)
  })
})
