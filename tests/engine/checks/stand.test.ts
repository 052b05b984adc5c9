import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { item, judge, judgeOutcome, piece, toPlain, toSpecs, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

// The tank is 620 × 420 mm outside and weighs about 124 kg with its default rock.
const stand = (values: Values = {}) =>
  piece('stand', { topLengthMm: 700, topWidthMm: 500, loadRatingKg: 200, ...values })
const goals = { ...wholeSetup().goals, rockKg: 10 }
const setup = (tank: Values = {}, rest: Partial<Setup> = {}) => wholeSetup(tank, { goals, ...rest })

describe('the top of a stand', () => {
  const outcome = (topLengthMm: number | undefined, topWidthMm: number | undefined) =>
    judgeOutcome(setup(), stand({ topLengthMm, topWidthMm }), 'stand.footprint')

  it('is at least as long and as wide as the tank, to a twentieth of a millimetre', () => {
    expect(outcome(620, 420)).toBe('pass')
    expect(outcome(619.96, 420)).toBe('pass')
    expect(outcome(619.9, 420)).toBe('fail')
    expect(outcome(620, 419.9)).toBe('fail')
  })

  it('may be turned by a quarter', () => {
    expect(outcome(420, 620)).toBe('pass')
    expect(outcome(500, 619)).toBe('fail')
    expect(outcome(619, 619)).toBe('fail')
  })

  it('is a caution where it is larger by more than 150 mm', () => {
    const cautions = (topLengthMm: number) => fitCheck(setup(), stand({ topLengthMm })).cautions.join(' ')
    expect(cautions(770)).not.toContain('larger than the tank')
    expect(toPlain(cautions(771))).toContain('The top of the stand is 151 mm larger than the tank')
  })

  it('asks of a rimless tank to be level, of a rimmed one nothing', () => {
    const cautions = (rim: string) => fitCheck(setup({ rim }), stand()).cautions.join(' ')
    expect(cautions('rimless')).toContain('level, flat top')
    expect(cautions('rimmed')).not.toContain('level, flat top')
  })

  it('is no data where a side is missing, and says how much is short', () => {
    expect(judge(setup(), stand({ topWidthMm: undefined }), 'stand.footprint')).toMatchObject({
      outcome: 'nodata',
      missing: ['topWidthMm'],
    })
    expect(toPlain(judge(setup(), stand({ topLengthMm: 600 }), 'stand.footprint').message)).toBe(
      'The tank is 20 mm too large for the top of the stand.',
    )
    expect(toPlain(judge({ ...setup(), units: 'us' }, stand({ topLengthMm: 600 }), 'stand.footprint').message)).toBe(
      'The tank is 0.79 in too large for the top of the stand.',
    )
  })

  it('is not condemned by a size that was worked out from a volume', () => {
    // 75.7 L in a tank 400 mm wide: a length of 576 mm is assumed.
    const byVolume: Setup = {
      units: 'metric',
      tank: { specs: toSpecs({ outerWidthMm: 400 }, 'measured'), volumeL: 75.7 },
      items: [],
    }
    const found = judge(byVolume, stand({ topLengthMm: 540 }), 'stand.footprint')
    expect(found.outcome).toBe('change')
    expect(found.assumed).toContain('tank.outerLengthMm')
    expect(toPlain(found.message)).toContain('we assumed')
    // Two sizes that nobody measured are known to a tenth only.
    expect(judge(byVolume, stand({ topLengthMm: 600 }), 'stand.footprint').probability).toBeLessThan(0.8)
  })
})

describe('the load of a stand', () => {
  const weight = judge(setup(), stand(), 'stand.load').measured as number
  const outcome = (values: Values) => judgeOutcome(setup(), stand({ loadRatingKg: undefined, ...values }), 'stand.load')

  it('is at most its rating', () => {
    expect(outcome({ loadRatingKg: weight })).toBe('pass')
    expect(outcome({ loadRatingKg: weight - 0.01 })).toBe('fail')
  })

  it('is not talked down by filling the tank less, where only the water line was assumed', () => {
    // 762 × 304.8 × 317.5 mm of glass weighs some 92 kg as usually filled; a stand for 72 kg would hold it two thirds full.
    const sizes = { outerLengthMm: 762, outerWidthMm: 304.8, outerHeightMm: 317.5 }
    const bare: Setup = { units: 'metric', tank: { specs: toSpecs(sizes, 'measured') }, items: [] }
    const weak = stand({ topLengthMm: 800, topWidthMm: 320, loadRatingKg: 72 })
    const { verdict, checks, turnsBy } = fitCheck(bare, weak)
    expect(verdict).toBe('no')
    expect(checks.find(({ id }) => id === 'stand.load')?.outcome).toBe('fail')
    expect(turnsBy?.path).not.toBe('tank.waterLineMm')
  })

  it('is without a rating what its maker makes it for, as a caution', () => {
    const enough = stand({ loadRatingKg: undefined, madeForVolumeL: weight / 1.4 + 0.01 })
    expect(judgeOutcome(setup(), enough, 'stand.load')).toBe('pass')
    expect(fitCheck(setup(), enough).cautions.join(' ')).toContain('what it is made for was taken instead')
    expect(outcome({ madeForVolumeL: weight / 1.4 - 0.01 })).toBe('nodata')
  })

  it('is held by a stand that is made for this very tank', () => {
    const named: Setup = { ...setup(), tank: { ...setup().tank, gear: { slug: 'shoal-84', brand: 'x', model: 'y' } } }
    const by = (madeForTanks: readonly string[]) =>
      judgeOutcome(named, stand({ loadRatingKg: undefined, madeForTanks }), 'stand.load')
    expect(by(['shoal-60', 'shoal-84'])).toBe('pass')
    expect(by(['shoal-60'])).toBe('nodata')
    // A rating that is stated is not talked away.
    expect(judgeOutcome(named, stand({ loadRatingKg: 50, madeForTanks: ['shoal-84'] }), 'stand.load')).toBe('fail')
  })

  it('is a question to its maker where nothing is known, with the number to ask for', () => {
    const found = judge(setup(), stand({ loadRatingKg: undefined }), 'stand.load')
    expect(found).toMatchObject({ outcome: 'nodata', missing: ['loadRatingKg'] })
    expect(toPlain(found.message)).toContain(`ask its maker whether it holds ${Math.round(weight)} kg`)
    expect(fitCheck(setup(), stand({ loadRatingKg: undefined })).verdict).toBe('unknown')
  })

  it('cannot be told for a tank whose areas cannot be computed', () => {
    expect(judgeOutcome(setup({ shape: 'cylinder' }), stand(), 'stand.load')).toBe('nodata')
  })

  it('always leaves a heavy tank to engineers and local rules', () => {
    expect(fitCheck(setup(), stand()).cautions.join(' ')).toContain('structural engineer and local building rules')
  })
})

describe('a tank on what carries it', () => {
  const tank = (values: Values = {}) => {
    const { specs } = setup(values).tank
    return { kind: 'tank' as const, specs: { ...specs, ...toSpecs({ volts: [120] }) } }
  }
  const on = (values: Values) => setup({}, { items: [item('stand', stand(values))] })

  it('stands wholly on the setup’s stand, which holds it', () => {
    expect(judgeOutcome(on({}), tank(), 'tank.support')).toBe('pass')
    expect(judgeOutcome(on({ topWidthMm: 410 }), tank(), 'tank.support')).toBe('fail')
    expect(judgeOutcome(on({ loadRatingKg: 100 }), tank(), 'tank.support-load')).toBe('fail')
    expect(judgeOutcome(on({ loadRatingKg: undefined }), tank(), 'tank.support-load')).toBe('nodata')
    expect(judgeOutcome(on({ topLengthMm: undefined }), tank(), 'tank.support')).toBe('nodata')
  })

  it('stands wholly on furniture whose size was given, and its weight is information', () => {
    const furniture = setup({}, { support: { kind: 'furniture', lengthMm: 600, widthMm: 420 } })
    expect(judge(furniture, tank(), 'tank.support')).toMatchObject({
      outcome: 'fail',
      message: expect.stringContaining('the top of the furniture') as string,
    })
    expect(judge(furniture, tank(), 'tank.support-load').message).toContain('what carries it must hold that')
  })

  it('is nobody’s question where nothing that carries it is known', () => {
    const ids = fitCheck(setup(), tank()).checks.map(({ id }) => id)
    expect(ids).not.toContain('tank.support')
    expect(ids).not.toContain('tank.support-load')
  })
})
