import { describe, expect, it } from 'vitest'
import type { LightDrawing } from '#shared/engine/drawings/light'
import type { PumpDrawing } from '#shared/engine/drawings/pump'
import type { StandDrawing } from '#shared/engine/drawings/stand'
import { createPrinter } from '#shared/units/print'
import { describeLight, splitPlane } from '../../../src/components/drawings/describe-light'
import { describePump } from '../../../src/components/drawings/describe-pump'
import { describeStand } from '../../../src/components/drawings/describe-stand'

const [metric, us] = [createPrinter('metric'), createPrinter('us')]
const toPlain = (text: string) => text.replaceAll('\u00a0', ' ')

// Invented numbers; inches by 25.4 mm, gallons by 3.785412 L, feet by 0.3048 m (NIST SP 811).
const light: LightDrawing = {
  map: { columns: 60, rows: 40, cells: new Float64Array(2400), marginMm: 50 },
  band: [50, 150],
  percent: 26,
  share: 0.8049,
  aboveShare: 0.1349,
  belowShare: 0.0602,
  brightestUmol: 190.2,
  spill: 0.294,
  fixtures: [{ xMm: 0, yMm: 0, lengthMm: 130, widthMm: 130 }],
  heightMm: 200,
  isHeightGiven: false,
  depthMm: 180,
  isDepthGiven: false,
  display: { lengthMm: 508, widthMm: 254 },
  assumed: { length: false, width: false },
}

const pump: PumpDrawing = {
  curve: [],
  recorded: [
    { headM: 1, flowLph: 0 },
    { headM: 0, flowLph: 1000 },
  ],
  system: [],
  point: { flowLph: 757.0824, headM: 0.6096 },
  wanted: { lph: [300, 900], turnoversPerHour: [4, 12] },
  isPipeGiven: false,
  slowest: null,
  staticHeadM: 0.3048,
  boreMm: 12.7,
}

const standing: StandDrawing = {
  top: { lengthMm: 640, widthMm: 430 },
  tank: { lengthMm: 620, widthMm: 440, heightMm: 400 },
  spareMm: { length: 20, width: -10 },
  isTurned: true,
  standHeightMm: 750,
  assumed: { length: false, width: false, height: true },
}

describe('a light map in words', () => {
  it('gives whole percents that add up to a hundred', () => {
    expect(splitPlane(light)).toEqual({ within: 80, above: 13, below: 7 })
    expect(splitPlane({ ...light, share: 0.504, aboveShare: 0.496 })).toEqual({ within: 50, above: 50, below: 0 })
  })

  it('says plane, setting, shares, brightest point and spill', () => {
    const words = toPlain(describeLight(light, metric))
    expect(words).toContain('508 × 254 mm')
    expect(words).toContain('180 mm under the water, at 26% power')
    expect(words).toContain('80% is in the band of 50–150 µmol/m²/s, 13% is brighter, 7% dimmer')
    expect(words).toContain('190 µmol/m²/s')
    expect(words).toContain('lens 200 mm above the water (assumed)')
    expect(words).toContain('29% of the light misses the water')
  })

  it('says it in inches too, and how many lights there are', () => {
    const fixtures = [...light.fixtures, ...light.fixtures]
    const words = toPlain(describeLight({ ...light, fixtures, percent: 100, isHeightGiven: true }, us))
    expect(words).toContain('20 × 10 in')
    expect(words).toContain('2 lights, lenses 7.9 in above the water.')
    expect(words).toContain('at full power')
  })
})

describe('a pump at work in words', () => {
  it('says where the curves meet and what is wanted', () => {
    const words = toPlain(describePump(pump, us))
    expect(words).toContain('what 12 in of lift and a usual pipe, 0.5 in wide, take')
    expect(words).toContain('at 200 gal/h against 2 ft of head')
    expect(words).toContain('the water 4 to 12 times an hour')
  })

  it('leaves out a lift that there is not', () => {
    expect(toPlain(describePump({ ...pump, staticHeadM: 0 }, metric))).toContain(
      'what a usual pipe, 13 mm wide, takes without lift',
    )
  })

  it('says of a pump that is too weak that it lifts nothing', () => {
    expect(describePump({ ...pump, point: { flowLph: 0, headM: 1 } }, metric)).toContain('it does not lift the water')
  })

  it('says what was recorded of a pump alone', () => {
    const { curve, recorded } = pump
    expect(toPlain(describePump({ curve, recorded }, metric))).toBe(
      'Flow against head as recorded: 0 L/h at 1 m, 1000 L/h at 0 m.',
    )
  })
})

describe('a tank on its stand in words', () => {
  it('says what is to spare, what stands over, that it is turned and what is assumed', () => {
    const words = toPlain(describeStand(standing, metric))
    expect(words).toContain('A top of 640 × 430 mm')
    expect(words).toContain('400 mm high (assumed)')
    expect(words).toContain('has 20 mm to spare along it and stands 10 mm over from front to back')
    expect(words).toContain('turned by a quarter')
    expect(words).toContain('750 mm high')
    expect(words).toContain('What is dashed is assumed.')
  })
})
