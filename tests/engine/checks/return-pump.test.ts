import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { heater, item, judge, judgeOutcome, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

// 84 L; a rear chamber of 120 × 100 mm with 330 mm of water.
const pump = (values: Values = {}) =>
  piece('return-pump', {
    lengthMm: 60,
    widthMm: 50,
    heightMm: 60,
    boreMm: 50,
    dcControl: false,
    flowCurve: straight(600),
    powerW: 10,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })

/** A pump so strong that a wide pipe takes nothing of its flow: what it delivers is where its curve ends. */
function straight(flowLph: number) {
  return [
    { headM: 30, flowLph: 0 },
    { headM: 29, flowLph: flowLph / 2 },
    { headM: 28, flowLph },
  ]
}
const turning = (perHour: number, litres = 84) => ({ flowCurve: straight(perHour * litres) })
const flow = (values: Values, setup = wholeSetup()) => judge(setup, pump(values), 'return-pump.flow')
const noGoal = (() => {
  const { turnoverPerHour: _, ...goals } = wholeSetup().goals ?? {}
  return goals
})()

describe('the turnover of a return pump', () => {
  it('is 4 to 12 an hour in rear chambers, 3 to 16 with a change', () => {
    const outcome = (perHour: number) => flow(turning(perHour), wholeSetup({}, { goals: noGoal })).outcome
    expect([2.99, 3.01, 3.99, 4.01, 11.99, 12.01, 15.99, 16.01].map(outcome)).toEqual([
      'fail',
      'change',
      'change',
      'pass',
      'pass',
      'change',
      'change',
      'fail',
    ])
  })

  it('is 3 to 10 an hour with a sump, 2 to 15 with a change', () => {
    // 84 L and the sump's 37.5.
    const sump = { filtration: 'sump', chambers: undefined, sump: { lengthMm: 500, widthMm: 300, waterDepthMm: 250 } }
    const outcome = (perHour: number) => flow(turning(perHour, 121.5), wholeSetup(sump, { goals: noGoal })).outcome
    expect([1.99, 2.01, 2.99, 3.01, 9.99, 10.01, 14.99, 15.01].map(outcome)).toEqual([
      'fail',
      'change',
      'change',
      'pass',
      'pass',
      'change',
      'change',
      'fail',
    ])
  })

  it('is the goal where one was given, and a change from 0.75 times its lower end to 1.33 times its upper', () => {
    const goals = { ...noGoal, turnoverPerHour: [8, 10] as const }
    const outcome = (perHour: number) => flow(turning(perHour), wholeSetup({}, { goals })).outcome
    expect([5.99, 6.01, 7.99, 8.01, 9.99, 10.01, 13.29, 13.31].map(outcome)).toEqual([
      'fail',
      'change',
      'change',
      'pass',
      'pass',
      'change',
      'change',
      'fail',
    ])
  })

  it('is brought down by speed control to two fifths of the speed', () => {
    const outcome = (perHour: number, dcControl: boolean | undefined) =>
      flow({ ...turning(perHour), dcControl }).outcome
    // At 40 % the flow is at most 40 %: 12/0.4 = 30 passes, 16/0.4 = 40 is a change.
    expect([29.9, 30.1, 39.9, 40.1].map((perHour) => outcome(perHour, true))).toEqual([
      'pass',
      'change',
      'change',
      'fail',
    ])
    expect(outcome(3.5, true)).toBe('change')
    expect(outcome(20, false)).toBe('fail')
    expect(flow({ ...turning(20), dcControl: true }).message).toContain(
      'its speed control brings that down to the 4 to 12',
    )
    expect(toPlain(flow({ ...turning(35), dcControl: true }).message)).toMatch(
      /^Throttle it: .*, and still 14 at its slowest; 4 to 12 are wanted\.$/,
    )
  })

  it('is set anywhere between full and slowest speed', () => {
    const goals = { ...noGoal, turnoverPerHour: [8, 10] as const }
    // 11 an hour at full speed, some 4 at its slowest.
    expect(flow({ ...turning(11), dcControl: true }, wholeSetup({}, { goals }))).toMatchObject({
      outcome: 'pass',
      measured: 10,
    })
  })

  it('is no data where it turns on speed control that nobody recorded, and on nothing else', () => {
    expect(flow({ ...turning(20), dcControl: undefined })).toMatchObject({ outcome: 'nodata', missing: ['dcControl'] })
    expect(flow({ ...turning(8), dcControl: undefined }).outcome).toBe('pass')
    expect(flow({ ...turning(60), dcControl: undefined }).outcome).toBe('fail')
  })

  it('is no data without a curve, and nothing where the pump does not lift the water', () => {
    expect(flow({ flowCurve: undefined })).toMatchObject({ outcome: 'nodata', missing: ['flowCurve'] })
    const rising = [
      { headM: 0.5, flowLph: 0 },
      { headM: 2, flowLph: 900 },
    ]
    expect(flow({ flowCurve: rising })).toMatchObject({
      outcome: 'nodata',
      missing: ['flowCurve'],
      message: 'Its flow curve cannot be right: flow must fall as head rises.',
    })
    const short = [
      { headM: 0.01, flowLph: 0 },
      { headM: 0, flowLph: 2000 },
    ]
    // The chamber's level is 20 mm under the water line.
    expect(flow({ flowCurve: short })).toMatchObject({ outcome: 'fail', measured: 0 })
  })

  it('counts two of them twice', () => {
    const one = judge(wholeSetup(), pump(turning(5)), 'return-pump.flow').measured as number
    expect(judge(wholeSetup(), pump(turning(5)), 'return-pump.flow', { quantity: 2 }).measured).toBeCloseTo(2 * one, 9)
  })

  it('runs through the smaller bore, and through 13 mm up to 100 L or 20 mm above where none is known', () => {
    const weak = [
      { headM: 1, flowLph: 0 },
      { headM: 0, flowLph: 900 },
    ]
    const at = (boreMm: number | undefined, tank: Values = {}) =>
      flow({ flowCurve: weak, boreMm }, wholeSetup(tank)).measured as number
    expect(at(undefined)).toBe(at(13))
    expect(at(16)).toBeGreaterThan(at(13))
    expect(at(16, { returnBoreMm: 13 })).toBe(at(13))
    expect(at(undefined, { returnBoreMm: 16 })).toBe(at(16))
    const large = { outerLengthMm: 1220, displayLengthMm: 1200 }
    expect(at(undefined, large)).toBe(at(20, large))
  })

  it('rests on the level of a chamber that was assumed', () => {
    expect(
      flow({}, wholeSetup({ chambers: [{ id: 'rear', lengthMm: 120, widthMm: 100, heightMm: 390 }] })).assumed,
    ).toEqual(['tank.chambers.0.waterDepthMm'])
  })

  it('cannot be told for a tank whose areas cannot be computed', () => {
    expect(flow({}, wholeSetup({ shape: 'cylinder' })).outcome).toBe('nodata')
  })
})

describe('the room for a return pump', () => {
  const space = (values: Values, tank: Values = {}, rest: Partial<Setup> = {}, options = {}) =>
    judge(wholeSetup(tank, rest), pump(values), 'return-pump.space', options)

  it('leaves 5 mm of water to each side, turned by a quarter if need be', () => {
    expect(space({ lengthMm: 110, widthMm: 90 })).toMatchObject({
      outcome: 'pass',
      limit: expect.any(Number) as number,
    })
    expect(space({ lengthMm: 110.04, widthMm: 90 }).outcome).toBe('pass')
    expect(space({ lengthMm: 110.1, widthMm: 90 }).outcome).toBe('fail')
    expect(space({ lengthMm: 110, widthMm: 90.1 }).outcome).toBe('fail')
    expect(space({ lengthMm: 90, widthMm: 110 }).outcome).toBe('pass')
    expect(space({ lengthMm: 90.1, widthMm: 110 }).outcome).toBe('fail')
  })

  it('is deep enough for 30 mm of water above it, or for what its maker asks', () => {
    expect(space({ heightMm: 300 }).outcome).toBe('pass')
    expect(space({ heightMm: 300.1 }).outcome).toBe('fail')
    expect(space({ heightMm: 320, minDepthMm: 330 }).outcome).toBe('pass')
    expect(space({ heightMm: 60, minDepthMm: 331 }).outcome).toBe('fail')
    expect(toPlain(space({ heightMm: 60, minDepthMm: 340 }).message)).toBe(
      'The water in the rear chamber is 10 mm too shallow: it needs 340 mm.',
    )
  })

  it('lets no slight excess hide behind one that counts as none', () => {
    // 0.045 mm over in length counts as none, 0.1 mm of depth is too much, though the smaller part of its limit.
    expect(space({ lengthMm: 110.045, widthMm: 60, heightMm: 60, minDepthMm: 330.1 }).outcome).toBe('fail')
  })

  it('is in the chamber that has most of it', () => {
    const chambers = [
      { id: 'left', name: 'left chamber', lengthMm: 80, widthMm: 80, waterDepthMm: 330, heightMm: 390 },
      { id: 'right', name: 'right chamber', lengthMm: 160, widthMm: 100, waterDepthMm: 330, heightMm: 390 },
    ]
    const answer = fitCheck(wholeSetup({ chambers }), pump())
    expect(answer.place).toMatchObject({ chamber: 'right', position: 'upright' })
    expect(space({}, { chambers }, {}, { place: { chamber: 'left' } }).outcome).toBe('pass')
    expect(space({ lengthMm: 90 }, { chambers }, {}, { place: { chamber: 'left' } }).outcome).toBe('fail')
    expect(space({}, { chambers }, {}, { place: { chamber: 'middle' } })).toMatchObject({
      outcome: 'fail',
      message: 'The tank has no chamber “middle”.',
    })
  })

  it('has an opening that lets it in, some side first', () => {
    const through = (openingLengthMm: number | undefined, openingWidthMm: number | undefined) =>
      space(
        {},
        {
          chambers: [
            {
              id: 'rear',
              lengthMm: 120,
              widthMm: 100,
              waterDepthMm: 330,
              heightMm: 390,
              openingLengthMm,
              openingWidthMm,
            },
          ],
        },
      )
    expect(through(60, 50).outcome).toBe('pass')
    expect(through(59, 49)).toMatchObject({
      outcome: 'fail',
      message: expect.stringContaining('does not pass the opening') as string,
    })
    expect(through(undefined, 49).outcome).toBe('fail')
    expect(through(undefined, 50).outcome).toBe('pass')
    expect(through(59, 49)).toMatchObject({ measured: null, limit: null })
  })

  it('is shared with what else was said to stand there', () => {
    const rod = (values: Values = {}) =>
      item('rod', heater({ diameterMm: 40, ...values }), { place: { chamber: 'rear' } })
    // 60 × 50 beside 40 × 40 mm, 5 mm around each: 115 mm of 120.
    expect(space({}, {}, { items: [rod()] }).outcome).toBe('pass')
    expect(space({ lengthMm: 110, widthMm: 90 }, {}, { items: [rod()] })).toMatchObject({
      outcome: 'fail',
      message: 'There is no room for it in the rear chamber beside what else is there.',
    })
    expect(
      space({ lengthMm: 110, widthMm: 90 }, {}, { items: [item('rod', heater({ diameterMm: 40 }))] }).outcome,
    ).toBe('pass')
    expect(space({ lengthMm: 70, widthMm: 90 }, {}, {}, { quantity: 2 }).outcome).toBe('fail')
    expect(space({ lengthMm: 50, widthMm: 90 }, {}, {}, { quantity: 2 }).outcome).toBe('pass')
  })

  it('says where something there states no size', () => {
    const setup = wholeSetup(
      {},
      { items: [item('rod', heater({ diameterMm: undefined }), { place: { chamber: 'rear' } })] },
    )
    expect(fitCheck(setup, pump()).cautions).toContain('1 piece in the setup states no size and could not be counted.')
  })

  it('is the sump’s, else the display’s, with a word about that', () => {
    const sump = { filtration: 'sump', chambers: undefined, sump: { lengthMm: 500, widthMm: 300, waterDepthMm: 250 } }
    expect(fitCheck(wholeSetup(sump), pump()).place?.chamber).toBe('sump')
    const bare = fitCheck(wholeSetup({ chambers: undefined, filtration: 'none' }), pump())
    expect(bare.place?.chamber).toBe('display')
    expect(bare.cautions).toContain('No chamber or sump for it: it stands in the display.')
  })

  it('is no data for one that stands outside the water, or of unknown size', () => {
    const outside = { place: { in: 'outside' as const } }
    expect(space({}, {}, {}, outside).outcome).toBe('nodata')
    expect(judgeOutcome(wholeSetup(), pump(), 'return-pump.flow', outside)).toBe('nodata')
    expect(space({}, {}, {}, { place: { in: 'cabinet' } }).outcome).toBe('fail')
    expect(space({ heightMm: undefined })).toMatchObject({ outcome: 'nodata', missing: ['heightMm'] })
  })

  it('is not denied on a chamber’s size that was assumed, be it for itself or for company', () => {
    const chambers = [{ id: 'rear', name: 'rear chamber' }]
    const itself = space({ lengthMm: 110, widthMm: 60 }, { chambers })
    expect(itself.outcome).toBe('change')
    expect(toPlain(itself.message)).toContain('we assumed 100 mm')
    const rod = item('rod', heater({ diameterMm: 30 }), { place: { chamber: 'rear' } })
    expect(space({ lengthMm: 60, widthMm: 60 }, { chambers }, { items: [rod] }).outcome).toBe('change')
  })
})

describe('the bore of a return pump', () => {
  const bore = (boreMm: number | undefined, returnBoreMm: number | undefined) =>
    fitCheck(wholeSetup({ returnBoreMm }), pump({ boreMm })).checks.find(({ id }) => id === 'return-pump.bore')

  it('is within 1.5 mm of the tank’s, else takes an adaptor', () => {
    expect(bore(17.5, 16)?.outcome).toBe('pass')
    expect(bore(17.6, 16)?.outcome).toBe('change')
    expect(bore(14.4, 16)?.outcome).toBe('change')
    expect(bore(undefined, 16)).toMatchObject({ outcome: 'nodata', missing: ['boreMm'] })
    expect(toPlain(bore(20, 16)?.message)).toBe('Its bore is 20 mm, the tank’s 16 mm: needs an adaptor.')
  })

  it('is not judged where the tank’s is not known', () => {
    expect(bore(20, undefined)).toBeUndefined()
  })
})
