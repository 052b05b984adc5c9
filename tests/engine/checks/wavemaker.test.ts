import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { item, judge, judgeOutcome, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

// 84 L: 840 L/h are 10 times the water an hour.
const maker = (values: Values = {}) =>
  piece('wavemaker', {
    flowMinLph: 100,
    flowMaxLph: 2000,
    wallMinMm: 4,
    wallMaxMm: 12,
    powerW: 5,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const flow = (values: Values, setup = wholeSetup(), options = {}) =>
  judge(setup, maker(values), 'wavemaker.flow', options)
const beside = (...values: readonly Values[]) =>
  wholeSetup({}, { items: values.map((one, index) => item(`w${index}`, maker(one))) })
const keeping = (coral: NonNullable<NonNullable<Setup['goals']>['coral']>) =>
  wholeSetup({}, { goals: { ...wholeSetup().goals, coral } })

describe('the flow of a wavemaker', () => {
  it('can be set to 10 to 40 turnovers an hour, or 20 to 60 for small-polyp corals', () => {
    const most = (perHour: number, setup = wholeSetup()) => flow({ flowMaxLph: perHour * 84 }, setup).outcome
    const least = (perHour: number, setup = wholeSetup()) =>
      flow({ flowMinLph: perHour * 84, flowMaxLph: 9000 }, setup).outcome
    expect([most(10), least(40)]).toEqual(['pass', 'pass'])
    expect(least(40.1)).toBe('change')
    const sps = keeping(['sps'])
    expect([most(20, sps), least(60, sps), least(60.1, sps)]).toEqual(['pass', 'pass', 'change'])
    expect(flow({ flowMaxLph: 19.9 * 84 }, sps, { quantity: 3 }).outcome).toBe('pass')
  })

  it('is that of two or three where one is too weak', () => {
    expect(flow({ flowMaxLph: 5 * 84 })).toMatchObject({
      outcome: 'change',
      message: expect.stringContaining('Two of these') as string,
    })
    expect(fitCheck(wholeSetup(), maker({ flowMaxLph: 4 * 84 })).pieces[0]?.quantity).toBe(3)
    const weak = flow({ flowMaxLph: 3 * 84 })
    expect(weak).toMatchObject({ outcome: 'change', message: expect.stringContaining('Too weak') as string })
    expect(fitCheck(wholeSetup(), maker({ flowMaxLph: 3 * 84 })).pieces[0]?.quantity).toBe(1)
  })

  it('is too much where even the lowest setting is, the others at theirs', () => {
    expect(toPlain(flow({ flowMinLph: 41 * 84, flowMaxLph: 5000 }).message)).toMatch(
      /^Too strong: even at its lowest it moves the water 41 times an hour; 10 to 40 are usual\. A close call/,
    )
    // The other can be turned down to 20, and this one to 15.
    expect(flow({ flowMinLph: 15 * 84 }, beside({ flowMinLph: 20 * 84, flowMaxLph: 60 * 84 })).outcome).toBe('pass')
    expect(flow({ flowMinLph: 25 * 84 }, beside({ flowMinLph: 20 * 84, flowMaxLph: 60 * 84 })).outcome).toBe('change')
  })

  it('is added to that of the others', () => {
    expect(flow({ flowMaxLph: 5 * 84 }, beside({ flowMaxLph: 5 * 84 }))).toMatchObject({
      outcome: 'pass',
      // On the very limit it could as well be the other way.
      message:
        'With the others it moves the water up to 10 times an hour; 10 to 40 are usual. A close call, 50 % sure: check its flow before buying.',
    })
    const unknown = fitCheck(beside({ flowMaxLph: undefined }), maker())
    expect(unknown.cautions).toContain('1 piece in the setup states no flow and could not be counted.')
  })

  it('is no data where it is missing, or where the lowest setting is and it turns on that', () => {
    expect(flow({ flowMaxLph: undefined })).toMatchObject({ outcome: 'nodata', missing: ['flowMaxLph'] })
    expect(flow({ flowMaxLph: 50 * 84, flowMinLph: undefined })).toMatchObject({
      outcome: 'nodata',
      missing: ['flowMinLph'],
    })
    expect(flow({ flowMaxLph: 30 * 84, flowMinLph: undefined }).outcome).toBe('pass')
    expect(flow({}, wholeSetup({ shape: 'cylinder' })).outcome).toBe('nodata')
  })
})

describe('the magnet of a wavemaker', () => {
  const wall = (values: Values) => judge(wholeSetup(), maker(values), 'wavemaker.wall')

  it('is made for the tank’s wall of 10 mm', () => {
    expect(wall({ wallMinMm: 10, wallMaxMm: 10 }).outcome).toBe('pass')
    expect(wall({ wallMaxMm: 9.9 }).outcome).toBe('fail')
    expect(wall({ wallMinMm: 10.1 }).outcome).toBe('fail')
    expect(wall({ wallMaxMm: 9.9 }).margin).toBeLessThan(0)
  })

  it('is no data where one end is missing, unless the other rules it out or no usual end would matter', () => {
    expect(wall({ wallMinMm: undefined }).missing).toEqual(['wallMinMm'])
    expect(wall({ wallMaxMm: undefined }).missing).toEqual(['wallMaxMm'])
    expect(wall({ wallMinMm: undefined, wallMaxMm: 8 }).outcome).toBe('fail')
    expect(wall({ wallMaxMm: undefined, wallMinMm: 12 }).outcome).toBe('fail')
    // Usual magnets start at 0 to 8 mm: a 10 mm wall is thick enough for all of them.
    expect(fitCheck(wholeSetup(), maker({ wallMinMm: undefined })).verdict).toBe('fits')
    expect(fitCheck(wholeSetup(), maker({ wallMaxMm: undefined })).verdict).toBe('unknown')
  })

  it('is not condemned by a wall that was assumed', () => {
    const setup = wholeSetup({ wallMm: undefined })
    // 400 mm high: 8 mm assumed.
    expect(judge(setup, maker({ wallMaxMm: 6 }), 'wavemaker.wall')).toMatchObject({
      outcome: 'change',
      assumed: ['tank.wallMm'],
    })
  })
})

describe('a wavemaker over fine sand', () => {
  const sand = (grainMinMm: number | undefined) =>
    wholeSetup({}, { items: [item('sand', piece('sand', { grainMinMm, grainMaxMm: 1 }))] })
  const over = (values: Values, setup: Setup) => judge(setup, maker(values), 'wavemaker.sand')

  it('can be set to no more than 20 turnovers an hour where grains are under 0.25 mm', () => {
    expect(over({ flowMinLph: 20 * 84 }, sand(0.24)).outcome).toBe('pass')
    expect(over({ flowMinLph: 20.1 * 84 }, sand(0.24)).outcome).toBe('change')
    const ids = (setup: Setup) => fitCheck(setup, maker({ flowMinLph: 2000 })).checks.map(({ id }) => id)
    expect(ids(sand(0.25))).not.toContain('wavemaker.sand')
    expect(ids(wholeSetup())).not.toContain('wavemaker.sand')
  })

  it('is no data where it turns on grains or a lowest setting that nobody recorded', () => {
    expect(over({ flowMinLph: 2000 }, sand(undefined)).outcome).toBe('nodata')
    expect(over({ flowMinLph: 100 }, sand(undefined)).outcome).toBe('pass')
    expect(over({ flowMinLph: undefined, flowMaxLph: 2000 }, sand(0.1)).missing).toEqual(['flowMinLph'])
    expect(judgeOutcome(sand(0.1), maker({ flowMinLph: undefined, flowMaxLph: undefined }), 'wavemaker.sand')).toBe(
      'nodata',
    )
  })
})
