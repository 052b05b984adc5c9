import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { item, judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const unit = (values: Values = {}) =>
  piece('ro-unit', {
    stages: ['sediment', 'carbon', 'membrane', 'deionisation'],
    membraneLpd: 284,
    testPressureKPa: 345,
    testTempC: 25,
    testTdsPpm: 250,
    minFeedKPa: 280,
    wasteRatio: 3,
    boosterIncluded: false,
    ...values,
  })
const booster = (values: Values = {}) =>
  piece('booster-pump', {
    inletMinKPa: 100,
    outletKPa: 550,
    maxLpd: 3000,
    powerW: 30,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const tap = (water: NonNullable<Setup['water']> = {}, ...items: Setup['items']) =>
  wholeSetup({}, { water: { ...wholeSetup().water, ...water }, items })
const ofUnit = (id: string, values: Values, setup = tap()) => judge(setup, unit(values), `ro-unit.${id}`)

describe('the stages of an RO/DI unit', () => {
  it('hold a membrane, and what else is missing has to be added', () => {
    expect(ofUnit('stages', {}).outcome).toBe('pass')
    expect(ofUnit('stages', { stages: ['sediment', 'carbon', 'deionisation'] }).outcome).toBe('fail')
    expect(ofUnit('stages', { stages: ['sediment', 'membrane', 'deionisation'] })).toMatchObject({
      outcome: 'change',
      message: 'It lacks carbon: add that stage.',
    })
    expect(ofUnit('stages', { stages: ['membrane'] }).message).toBe(
      'It lacks sediment, carbon and deionisation: add those stages.',
    )
    expect(ofUnit('stages', { stages: undefined })).toMatchObject({ outcome: 'nodata', missing: ['stages'] })
  })
})

describe('the output of an RO/DI unit', () => {
  const made = ofUnit('output', {}).measured as number

  it('is at least a seventh of what a week takes', () => {
    expect(ofUnit('output', {}, tap({ litresPerWeek: 7 * made - 0.01 })).outcome).toBe('pass')
    expect(ofUnit('output', {}, tap({ litresPerWeek: 7 * made + 0.01 })).outcome).toBe('fail')
  })

  it('is more where the tap gives more pressure, warmer or softer water', () => {
    const output = (water: NonNullable<Setup['water']>) => ofUnit('output', {}, tap(water)).measured as number
    expect(output({ feedKPa: 400 })).toBeGreaterThan(made)
    expect(output({ feedTempC: 20 })).toBeGreaterThan(made)
    expect(output({ feedTdsPpm: 100 })).toBeGreaterThan(made)
    expect(output({ feedKPa: 10 })).toBe(0)
  })

  it('is as rated behind a booster pump of its own, and by the pressure of one in the setup', () => {
    const own = ofUnit('output', { boosterIncluded: true }, tap({ feedKPa: 100, feedTempC: 25 })).measured as number
    expect(own).toBeCloseTo(284, 6)
    const there = tap({ feedKPa: 100, feedTempC: 25 }, item('booster', booster({ outletKPa: 345 })))
    expect(ofUnit('output', {}, there).measured).toBeCloseTo(284, 6)
  })

  it('is no data where a number is missing, or a booster pump may or may not come with it', () => {
    expect(ofUnit('output', { membraneLpd: undefined, wasteRatio: undefined })).toMatchObject({
      outcome: 'nodata',
      missing: ['membraneLpd', 'wasteRatio'],
    })
    expect(ofUnit('output', { testTdsPpm: undefined }).measured).toBeCloseTo(made, 9)
    const weak = tap({ feedKPa: 20 })
    expect(ofUnit('output', { boosterIncluded: undefined }, weak).missing).toEqual(['boosterIncluded'])
    expect(ofUnit('output', { boosterIncluded: undefined }).outcome).toBe('pass')
    const unknown = tap({ feedKPa: 20 }, item('booster', booster({ outletKPa: undefined })))
    expect(ofUnit('output', {}, unknown).outcome).toBe('nodata')
  })

  it('is no data where its maker’s test cannot have given anything', () => {
    // 2000 ppm at 25 °C take 140 kPa (membrane maker’s technical manual, form 45-D01504-en), and more along the membrane.
    const wrong = { testPressureKPa: 60, testTdsPpm: 2000 }
    expect(ofUnit('output', wrong)).toMatchObject({ outcome: 'nodata', missing: ['testPressureKPa'] })
    expect(ofUnit('output', wrong).message).toContain('test pressure of 60\u00a0kPa cannot be right')
    expect(fitCheck(tap(), unit(wrong)).verdict).not.toBe('no')
    const there = tap({}, item('unit', unit(wrong)))
    expect(judge(there, booster(), 'booster-pump.flow').outcome).toBe('nodata')
  })

  it('tells the days of the first fill', () => {
    // 84 L at 50 L a day and less.
    const days = (membraneLpd: number) => ofUnit('output', { membraneLpd }).message
    expect(toPlain(days(284))).toContain('the first fill takes less than a day')
    const slow = ofUnit('output', { membraneLpd: 40 })
    expect(slow.message).toContain(`the first fill takes ${(84 / (slow.measured as number)).toFixed(1)} days`)
  })

  it('is not condemned by a tap that was assumed', () => {
    const { feedKPa: _, ...water } = tap().water ?? {}
    const setup: Setup = { ...tap(), water: { ...water, litresPerWeek: 7 * made + 70 } }
    expect(ofUnit('output', {}, setup).outcome).toBe('change')
    expect(ofUnit('output', {}, setup).assumed).toContain('water.feedKPa')
  })
})

describe('the pressure that an RO/DI unit needs', () => {
  it('is the tap’s, or a booster pump has to be added', () => {
    expect(ofUnit('pressure', { minFeedKPa: 350 }).outcome).toBe('pass')
    expect(ofUnit('pressure', { minFeedKPa: 351 }).outcome).toBe('change')
    expect(fitCheck(tap(), unit({ minFeedKPa: 351 })).knockOns).toContainEqual(
      expect.objectContaining({ kind: 'need', subject: 'feed-pressure' }),
    )
    expect(ofUnit('pressure', { minFeedKPa: undefined })).toMatchObject({ outcome: 'nodata', missing: ['minFeedKPa'] })
  })

  it('is raised by a booster pump that comes with it, or by one in the setup that gives enough', () => {
    expect(ofUnit('pressure', { minFeedKPa: 400, boosterIncluded: true }).outcome).toBe('pass')
    const there = (outletKPa: number | undefined) => tap({}, item('booster', booster({ outletKPa })))
    expect(ofUnit('pressure', { minFeedKPa: 400 }, there(400)).outcome).toBe('pass')
    expect(ofUnit('pressure', { minFeedKPa: 400 }, there(399)).outcome).toBe('change')
    expect(ofUnit('pressure', { minFeedKPa: 400 }, there(undefined)).outcome).toBe('nodata')
    expect(ofUnit('pressure', { minFeedKPa: 400, boosterIncluded: undefined }).missing).toEqual(['boosterIncluded'])
  })
})

describe('a booster pump', () => {
  const check = (id: string, values: Values, setup = tap({}, item('unit', unit()))) =>
    judge(setup, booster(values), `booster-pump.${id}`)

  it('gives what the RO/DI unit needs', () => {
    expect(check('pressure', { outletKPa: 280 }).outcome).toBe('pass')
    expect(check('pressure', { outletKPa: 279 }).outcome).toBe('fail')
    expect(check('pressure', { outletKPa: undefined })).toMatchObject({ outcome: 'nodata', missing: ['outletKPa'] })
    expect(check('pressure', {}, tap({}, item('unit', unit({ minFeedKPa: undefined })))).outcome).toBe('nodata')
  })

  it('takes no more than the tap gives', () => {
    expect(check('inlet', { inletMinKPa: 350 }).outcome).toBe('pass')
    expect(check('inlet', { inletMinKPa: 351 }).outcome).toBe('fail')
    expect(check('inlet', { inletMinKPa: undefined })).toMatchObject({ outcome: 'nodata', missing: ['inletMinKPa'] })
  })

  it('delivers product and waste at its own pressure', () => {
    // At its rated pressure, 25 °C and 250 ppm the unit makes 284 L a day and wastes three times as much: 1136 L.
    const setup = tap({ feedKPa: 300, feedTempC: 25 }, item('unit', unit()))
    expect(check('flow', { outletKPa: 345, maxLpd: 1136.01 }, setup).outcome).toBe('pass')
    expect(check('flow', { outletKPa: 345, maxLpd: 1135.99 }, setup).outcome).toBe('fail')
    expect(check('flow', { outletKPa: 400, maxLpd: 1136.01 }, setup).outcome).toBe('fail')
    expect(check('flow', { maxLpd: undefined, outletKPa: undefined }).missing).toEqual(['maxLpd', 'outletKPa'])
    expect(check('flow', {}, tap({}, item('unit', unit({ membraneLpd: undefined })))).outcome).toBe('nodata')
  })

  it('is not told to fit where there is no RO/DI unit', () => {
    expect(check('pressure', {}, tap()).outcome).toBe('nodata')
    expect(fitCheck(tap(), booster()).verdict).toBe('unknown')
  })
})

describe('a salt mix', () => {
  const amount = (values: Values, tank: Values = {}) =>
    judge(wholeSetup(tank), piece('salt-mix', values), 'salt-mix.amount')

  it('comes in whole packs for the first fill', () => {
    expect(amount({ makesL: 84 }).measured).toBe(1)
    expect(amount({ makesL: 83.9 }).measured).toBe(2)
    expect(toPlain(amount({ makesL: 84 }).message)).toBe('1 pack for the first fill of 84 L at 35 ppt.')
  })

  it('is no data where it is not known what a pack makes, or how much water there is', () => {
    expect(amount({})).toMatchObject({ outcome: 'nodata', missing: ['makesL'] })
    expect(amount({ makesL: 84 }, { shape: 'cylinder' }).outcome).toBe('nodata')
  })
})
