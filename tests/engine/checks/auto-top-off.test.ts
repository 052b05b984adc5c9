import { describe, expect, it } from 'vitest'
import { fitCheck } from '#shared/engine/fit'
import { judge, piece, toPlain, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const topOff = (values: Values = {}) =>
  piece('auto-top-off', {
    lengthMm: 60,
    widthMm: 30,
    pumpHeadM: 1.5,
    reservoirL: 20,
    powerW: 4,
    plugs: 1,
    volts: [120],
    plugType: 'A/B',
    ...values,
  })
const check = (id: string, values: Values, tank: Values = {}, options = {}) =>
  judge(wholeSetup(tank), topOff(values), `auto-top-off.${id}`, options)
const sump = { filtration: 'sump', chambers: undefined, sump: { lengthMm: 500, widthMm: 300, waterDepthMm: 250 } }

describe('an auto top-off', () => {
  it('has a sensor that fits in a chamber', () => {
    expect(check('space', { lengthMm: 120, widthMm: 100 }).outcome).toBe('pass')
    expect(check('space', { lengthMm: 120.1, widthMm: 100 }).outcome).toBe('fail')
    expect(check('space', { lengthMm: 100, widthMm: 120 }).outcome).toBe('pass')
    expect(check('space', { widthMm: undefined })).toMatchObject({ outcome: 'nodata', missing: ['widthMm'] })
    expect(toPlain(check('space', {}).message)).toMatch(
      /^Its sensor fits in the rear chamber with \d+ mm of (length|width) to spare\.$/,
    )
  })

  it('lifts water from the floor over the rim, 1.15 m up', () => {
    expect(check('lift', { pumpHeadM: 1.15 }).outcome).toBe('pass')
    expect(check('lift', { pumpHeadM: 1.14 }).outcome).toBe('fail')
    expect(check('lift', { pumpHeadM: undefined })).toMatchObject({ outcome: 'nodata', missing: ['pumpHeadM'] })
  })

  it('lifts it over a sump’s rim where there is a sump', () => {
    // 250 mm of water and 100 mm of rim (common practice).
    expect(check('lift', { pumpHeadM: 0.35 }, sump).outcome).toBe('pass')
    expect(check('lift', { pumpHeadM: 0.34 }, sump).outcome).toBe('fail')
  })

  it('has a reservoir for three days of evaporation, else a caution', () => {
    // 0.24 m² of open water at 25 °C in a room of 21 °C and 50 %: the drawn litres a day stand in the caution.
    const cautions = (reservoirL: number | undefined, tank: Values = {}) =>
      fitCheck(wholeSetup(tank), topOff({ reservoirL })).cautions.filter((text) => text.includes('reservoir'))
    const perDay = Number(/about ([\d.]+)/.exec(toPlain(cautions(0.1)[0]))?.[1])
    // ASHRAE, Fa 0.5: 0.24 × 0.5 × (3.169 − 0.5 × 2.488) × 0.089/2442 kg/s × 86400 s = 0.73 kg a day.
    expect(perDay).toBeCloseTo(0.73, 1)
    expect(cautions(3 * perDay + 0.1)).toEqual([])
    expect(cautions(3 * perDay - 0.1)).toHaveLength(1)
    expect(cautions(0.1, { shape: 'cylinder' })).toEqual([])
  })
})
