import { describe, expect, it } from 'vitest'
import { drawLight } from '#shared/engine/drawings/light'
import type { Setup } from '#shared/engine/types'
import { checkOf, judge, piece, wholeSetup } from '../build'
import { fitCheck } from '#shared/engine/fit'

// Invented: a strip of 500 mm that reads 300 µmol/(m² s) at 300 mm in air.
const strip = (values: Readonly<Record<string, unknown>> = {}) =>
  piece('light', {
    layout: 'strip',
    lengthMm: 500,
    widthMm: 80,
    beamAngleDeg: 120,
    ppfdUmol: 300,
    ppfdAtMm: 300,
    dimmable: true,
    ...values,
  })

const fishOnly: Setup = wholeSetup({}, { goals: { coral: [] } })

describe('the light over a tank, drawn', () => {
  it('adds up to the whole plane, and says what the check of coverage says', () => {
    const drawn = drawLight(wholeSetup(), strip())!
    expect(drawn.share + drawn.aboveShare + drawn.belowShare).toBeCloseTo(1, 9)
    expect(judge(wholeSetup(), strip(), 'light.coverage').measured).toBe(drawn.share)
  })

  it('leaves a light that is not known to dim at full power', () => {
    const drawn = drawLight(wholeSetup(), strip({ dimmable: undefined }))!
    expect(drawn.percent).toBe(100)
    expect(drawn.brightestUmol).toBe(Math.max(...drawn.map.cells))
  })

  it('draws every light over the middle of its part of the tank', () => {
    // 600 mm of display in two parts: their middles lie 150 mm to either side.
    const { fixtures } = drawLight(wholeSetup(), strip({ lengthMm: 280 }), { quantity: 2 })!
    expect(fixtures).toEqual([
      { xMm: -150, yMm: 0, lengthMm: 280, widthMm: 80 },
      { xMm: 150, yMm: 0, lengthMm: 280, widthMm: 80 },
    ])
  })

  it('spills more the higher it hangs: the tank fills a smaller part of its beam', () => {
    const spills = [60, 150, 300].map((heightMm) => drawLight(wholeSetup(), strip(), { heightMm })!.spill)
    expect(spills).toEqual([...spills].sort((a, b) => a - b))
    expect(spills[0]).toBeLessThan(spills[2]!)
  })

  it('stands at the height that is assumed in the check unless one is said', () => {
    const answer = fitCheck(wholeSetup(), strip(), { mountHeightMm: 300 })
    const drawn = drawLight(wholeSetup(), strip(), { heightMm: 300 })!
    expect(checkOf(answer, 'light.coverage').measured).toBe(drawn.share)
    expect(drawn.isHeightGiven).toBe(true)
    expect(drawLight(wholeSetup(), strip())).toMatchObject({ heightMm: 200, isHeightGiven: false })
  })

  it('tells a display that was given from one that only a volume was said of', () => {
    expect(drawLight(wholeSetup(), strip())!.assumed).toEqual({ length: false, width: false })
    const byVolume: Setup = { units: 'us', tank: { specs: {}, volumeL: 75.7 }, items: [] }
    expect(drawLight(byVolume, strip())!.assumed).toEqual({ length: true, width: true })
  })

  it.each([
    ['fish only', fishOnly, strip()],
    ['a bow front, whose area cannot be computed yet', wholeSetup({ shape: 'bow-front' }), strip()],
    ['a light of unknown strength', wholeSetup(), strip({ ppfdUmol: undefined })],
  ])('draws nothing for %s', (_, setup, light) => {
    expect(drawLight(setup, light)).toBeNull()
  })
})
