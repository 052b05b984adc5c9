import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import { judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

// A rear chamber of 120 × 100 mm with 330 mm of water; 84 L.
const skimmer = (values: Values = {}) =>
  piece('skimmer', {
    lengthMm: 100,
    widthMm: 80,
    heightMm: 450,
    waterDepthMinMm: 200,
    waterDepthMaxMm: 350,
    ratedVolumeL: 100,
    powerW: 6,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const check = (id: string, values: Values, tank: Values = {}, options = {}) =>
  judge(wholeSetup(tank), skimmer(values), `skimmer.${id}`, options)

describe('a protein skimmer', () => {
  it('stands in a chamber with 5 mm to each side', () => {
    expect(check('space', { lengthMm: 110, widthMm: 90 }).outcome).toBe('pass')
    expect(check('space', { lengthMm: 110.1, widthMm: 90 }).outcome).toBe('fail')
    expect(check('space', { lengthMm: undefined })).toMatchObject({ outcome: 'nodata', missing: ['lengthMm'] })
    expect(check('space', {}, {}, { place: { in: 'hang-on' } }).outcome).toBe('nodata')
    expect(check('depth', {}, {}, { place: { in: 'hang-on' } }).outcome).toBe('nodata')
  })

  it('works in the depth of the water there, ends included', () => {
    const depth = (waterDepthMinMm: number | undefined, waterDepthMaxMm: number | undefined) =>
      check('depth', { waterDepthMinMm, waterDepthMaxMm })
    expect(depth(330, 330).outcome).toBe('pass')
    expect(depth(330.04, 400).outcome).toBe('pass')
    expect(depth(330.1, 400).outcome).toBe('fail')
    expect(depth(100, 329.9).outcome).toBe('fail')
    expect(depth(undefined, 350)).toMatchObject({ outcome: 'nodata', missing: ['waterDepthMinMm'] })
    expect(toPlain(depth(100, 250).message)).toBe('Works in 100–250 mm of water, and the rear chamber has 330 mm.')
  })

  it('goes into the chamber whose depth suits it rather than into the roomiest', () => {
    const chambers = [
      { id: 'deep', name: 'deep chamber', lengthMm: 300, widthMm: 150, waterDepthMm: 330, heightMm: 390 },
      { id: 'low', name: 'low chamber', lengthMm: 120, widthMm: 100, waterDepthMm: 200, heightMm: 390 },
    ]
    const shallow = skimmer({ waterDepthMinMm: 150, waterDepthMaxMm: 220 })
    const answer = fitCheck(wholeSetup({ chambers }), shallow)
    expect(answer.place?.chamber).toBe('low')
    expect(answer.checks.find(({ id }) => id === 'skimmer.depth')?.outcome).toBe('pass')
    // Where it fits in none of a depth that suits, it is the depth that it fails.
    const wide = skimmer({ lengthMm: 200, waterDepthMinMm: 150, waterDepthMaxMm: 220 })
    const outcomes = Object.fromEntries(
      fitCheck(wholeSetup({ chambers }), wide).checks.map(({ id, outcome }) => [id, outcome]),
    )
    expect(outcomes).toMatchObject({ 'skimmer.space': 'pass', 'skimmer.depth': 'fail' })
  })

  it('is rated for at least the volume of the tank', () => {
    expect(check('rating', { ratedVolumeL: 84 }).outcome).toBe('pass')
    expect(check('rating', { ratedVolumeL: 83.9 }).outcome).toBe('change')
    expect(check('rating', { ratedVolumeL: 84 }, { nominalVolumeL: 90 }).outcome).toBe('change')
    expect(check('rating', { ratedVolumeL: undefined })).toMatchObject({ outcome: 'nodata', missing: ['ratedVolumeL'] })
    expect(check('rating', {}, { shape: 'corner' }).outcome).toBe('nodata')
    expect(check('rating', {}, { shape: 'corner', nominalVolumeL: 90 }).outcome).toBe('pass')
  })

  it('is not condemned by a sump’s depth that was assumed', () => {
    const tank = { filtration: 'sump', chambers: undefined }
    // 250 mm assumed.
    expect(check('depth', { waterDepthMinMm: 100, waterDepthMaxMm: 200 }, tank)).toMatchObject({
      outcome: 'change',
      assumed: ['tank.sump.waterDepthMm'],
    })
  })
})
