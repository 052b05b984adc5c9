import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import type { Setup } from '#shared/engine/types'
import { item, judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const ids = (setup: Setup, what: ReturnType<typeof piece>) => fitCheck(setup, what).checks.map(({ id }) => id)

describe('a salinity meter', () => {
  const meter = (values: Values = {}) =>
    piece('salinity-meter', { scales: ['seawater-ppt'], minPpt: 0, maxPpt: 100, resolutionPpt: 1, ...values })
  const check = (id: string, values: Values) => judge(wholeSetup(), meter(values), `salinity-meter.${id}`)

  it('has a seawater scale; table salt’s is read with an offset, sugar’s and others fail', () => {
    expect(check('scale', { scales: ['seawater-sg', 'brix'] }).outcome).toBe('pass')
    expect(check('scale', { scales: ['nacl', 'brix'] }).outcome).toBe('change')
    expect(check('scale', { scales: ['brix'] })).toMatchObject({
      outcome: 'fail',
      message: 'Has a sugar (Brix) scale: the whole range that matters is one division of it.',
    })
    expect(check('scale', { scales: ['other'] }).outcome).toBe('fail')
    expect(check('scale', { scales: undefined })).toMatchObject({ outcome: 'nodata', missing: ['scales'] })
  })

  it('spans 30 to 40 ppt', () => {
    expect(check('range', { minPpt: 30, maxPpt: 40 }).outcome).toBe('pass')
    expect(check('range', { minPpt: 30.1 }).outcome).toBe('fail')
    expect(check('range', { maxPpt: 39.9 }).outcome).toBe('fail')
    expect(check('range', { minPpt: undefined })).toMatchObject({ outcome: 'nodata', missing: ['minPpt'] })
    expect(check('range', { minPpt: undefined, maxPpt: 39 }).outcome).toBe('fail')
  })

  it('reads in steps of 1 ppt or finer', () => {
    expect(check('resolution', { resolutionPpt: 1 }).outcome).toBe('pass')
    expect(check('resolution', { resolutionPpt: 1.1 }).outcome).toBe('fail')
    expect(check('resolution', { resolutionPpt: undefined }).outcome).toBe('nodata')
  })
})

describe('a test kit', () => {
  const kit = (parameters: readonly string[] | undefined) => piece('test-kit', { parameters })
  const coverage = (parameters: readonly string[] | undefined, ...others: readonly (readonly string[] | undefined)[]) =>
    judge(
      wholeSetup({}, { items: others.map((one, index) => item(`kit-${index}`, kit(one))) }),
      kit(parameters),
      'test-kit.coverage',
    )

  it('measures ammonia, nitrite and nitrate, with the other kits', () => {
    expect(coverage(['ammonia', 'nitrite', 'nitrate', 'ph']).message).toBe('Measures ammonia, nitrite, nitrate and pH.')
    expect(coverage(['ammonia'], ['nitrite'], ['nitrate'])).toMatchObject({
      outcome: 'pass',
      message: 'Measures ammonia; with the other kits nothing is missing for the cycle.',
    })
  })

  it('asks for the rest where some are missing', () => {
    expect(coverage(['ph', 'ammonia'], ['nitrite'])).toMatchObject({
      outcome: 'change',
      message: 'Measures pH and ammonia; a test for nitrate is still missing.',
    })
    expect(coverage([]).outcome).toBe('change')
    expect(coverage(undefined)).toMatchObject({ outcome: 'nodata', missing: ['parameters'] })
  })

  it('says where another kit states nothing', () => {
    const setup = wholeSetup({}, { items: [item('other', kit(undefined))] })
    expect(fitCheck(setup, kit(['ammonia'])).cautions).toContain(
      '1 piece in the setup states no parameters and could not be counted.',
    )
  })
})

describe('a scraper', () => {
  const scraper = (values: Values = {}) =>
    piece('scraper', { form: 'magnet', wallMinMm: 6, wallMaxMm: 12, blades: ['pad'], acrylicSafe: true, ...values })
  const check = (id: string, values: Values, tank: Values = {}) =>
    judge(wholeSetup(tank), scraper(values), `scraper.${id}`)
  const acrylic = (values: Values) => check('acrylic', values, { material: 'acrylic' })

  it('with a magnet is made for the wall of 10 mm, or stronger than needed down to 0.6 of its thinnest', () => {
    expect(check('wall', { wallMinMm: 10, wallMaxMm: 10 }).outcome).toBe('pass')
    expect(check('wall', { wallMaxMm: 9.9 }).outcome).toBe('fail')
    expect(check('wall', { wallMinMm: 10.1, wallMaxMm: 20 }).outcome).toBe('change')
    // 10/0.6 = 16.67.
    expect(check('wall', { wallMinMm: 16.6, wallMaxMm: 30 }).outcome).toBe('change')
    expect(check('wall', { wallMinMm: 16.9, wallMaxMm: 30 }).outcome).toBe('fail')
  })

  it('with a magnet is no data where an end of its range is missing and the other does not rule it out', () => {
    expect(check('wall', { wallMinMm: undefined }).missing).toEqual(['wallMinMm'])
    expect(check('wall', { wallMinMm: undefined, wallMaxMm: 8 }).outcome).toBe('fail')
    expect(check('wall', { wallMaxMm: undefined }).missing).toEqual(['wallMaxMm'])
    expect(check('wall', { form: undefined }).missing).toEqual(['form'])
    expect(ids(wholeSetup(), scraper({ form: 'handheld' }))).not.toContain('scraper.wall')
  })

  it('with a magnet is stated to be safe where the tank is of acrylic', () => {
    expect(acrylic({}).outcome).toBe('pass')
    expect(acrylic({ acrylicSafe: false }).outcome).toBe('fail')
    expect(acrylic({ acrylicSafe: false, blades: ['steel', 'plastic'] }).outcome).toBe('fail')
    expect(acrylic({ acrylicSafe: undefined })).toMatchObject({ outcome: 'nodata', missing: ['acrylicSafe'] })
  })

  it('with a handle holds plastic or a pad there; steel beside those is a change, alone it fails', () => {
    const blades = (list: readonly string[] | undefined, acrylicSafe?: boolean) =>
      acrylic({ form: 'handheld', blades: list, acrylicSafe }).outcome
    expect(blades(['plastic'])).toBe('pass')
    expect(blades(['pad'])).toBe('pass')
    expect(blades(['plastic', 'steel'])).toBe('change')
    expect(blades(['plastic', 'steel'], false)).toBe('change')
    expect(blades(['steel'])).toBe('fail')
    expect(blades(['plastic'], false)).toBe('fail')
    expect(blades(undefined)).toBe('nodata')
    expect(blades([])).toBe('nodata')
    expect(acrylic({ form: undefined, acrylicSafe: undefined }).outcome).toBe('nodata')
  })

  it('is safe on glass whatever it holds', () => {
    expect(check('acrylic', { form: 'handheld', blades: ['steel'] }).outcome).toBe('pass')
    expect(check('acrylic', { acrylicSafe: false }).outcome).toBe('pass')
  })

  it('with a handle is as long as the tank is high and 50 mm', () => {
    const reach = (lengthMm: number | undefined) => check('reach', { form: 'handheld', lengthMm })
    expect(reach(450).outcome).toBe('pass')
    expect(reach(449.9).outcome).toBe('change')
    expect(toPlain(reach(400).message)).toBe('It is 50 mm too short to reach the bottom with a dry hand.')
    expect(reach(undefined)).toMatchObject({ outcome: 'nodata', missing: ['lengthMm'] })
    expect(ids(wholeSetup(), scraper())).not.toContain('scraper.reach')
  })
})

describe('a siphon', () => {
  const siphon = (tubeLengthMm: number | undefined, hoseLengthMm: number | undefined) =>
    piece('siphon', { tubeLengthMm, hoseLengthMm })
  const check = (id: string, tube: number | undefined, hose: number | undefined) =>
    judge(wholeSetup(), siphon(tube, hose), `siphon.${id}`)

  it('has a tube as long as the tank is high, less 50 mm', () => {
    expect(check('reach', 350, 2000).outcome).toBe('pass')
    expect(check('reach', 349.9, 2000).outcome).toBe('change')
    expect(check('reach', undefined, 2000)).toMatchObject({ outcome: 'nodata', missing: ['tubeLengthMm'] })
  })

  it('reaches with its hose from the sand over the rim to the floor', () => {
    // 1150 + 400 mm.
    expect(check('hose', 350, 1200).outcome).toBe('pass')
    expect(check('hose', 350, 1199.9).outcome).toBe('change')
    expect(check('hose', 350, undefined)).toMatchObject({ outcome: 'nodata', missing: ['hoseLengthMm'] })
    expect(check('hose', undefined, 1200).message).toContain('length of its tube')
  })
})

describe('a net', () => {
  const size = (openingMm: number | undefined) => judge(wholeSetup(), piece('net', { openingMm }), 'net.size')

  it('opens to at most half the display’s 290 mm', () => {
    expect(size(145).outcome).toBe('pass')
    expect(size(145.1).outcome).toBe('change')
    expect(size(undefined)).toMatchObject({ outcome: 'nodata', missing: ['openingMm'] })
  })

  it('is one of two or three', () => {
    expect(fitCheck(wholeSetup(), piece('net', { openingMm: 100 })).cautions.join(' ')).toContain('Two or three nets')
  })
})
