import { describe, expect, it } from 'vitest'
import type { Source } from '#shared/engine/types'
import { heater, judge, piece, tankValues, toPlain, toSpecs, wholeSetup } from './build'

/** A standing rod of 297 mm in 300 mm of water, each known to ± so much. */
function judgeRod(rodMm: number, rod: number, water: number, source: Source = 'measured') {
  const chambers = [{ ...tankValues.chambers[0], waterDepthMm: 300 }]
  const setup = wholeSetup()
  const what = heater({ orientation: 'vertical' })
  const tank = {
    ...setup.tank.specs,
    outerLengthMm: { value: 620, source, plusMinus: water },
    chambers: { value: chambers, source, plusMinus: water },
  }
  const specs = { ...what.specs, lengthMm: { value: rodMm, source: 'maker' as const, plusMinus: rod } }
  return judge({ ...setup, tank: { specs: tank } }, { ...what, specs }, 'heater.space')
}

describe('a close call', () => {
  it('says how sure it is and what to check first', () => {
    // JCGM 106:2012: u = √(3² + 2²)/√3 = 2.0817 mm, 3 mm to spare, z = 1.4411, Φ(z) = 0.9252.
    const check = judgeRod(297, 3, 2)
    expect(check.probability).toBeCloseTo(0.9252, 4)
    expect(check.closeCall).toBe('check its length')
    expect(toPlain(check.message)).toBe(
      'Stands in the rear chamber with 3 mm to spare. A close call, 93 % sure: check its length before buying.',
    )
  })

  it('names the chamber where that is the less certain of the two', () => {
    const check = judgeRod(297, 2, 3)
    expect(check.probability).toBeCloseTo(0.9252, 4)
    expect(toPlain(check.message)).toMatch(/93 % sure: measure the rear chamber before buying\.$/)
  })

  it('is told of what fails by a little, too', () => {
    // 3 mm too long: 1 − 0.9252.
    const check = judgeRod(303, 2, 3)
    expect(check.outcome).toBe('fail')
    expect(check.probability).toBeCloseTo(0.0748, 4)
    expect(toPlain(check.message)).toMatch(
      /it may keep to the limit all the same, 7 % sure; measure the rear chamber before ruling it out\.$/,
    )
  })

  it('is told of what just keeps to the end of a range as of what passes', () => {
    // A wall of 8 mm for 8 to 12 mm: as likely under the end as over it, so even odds less what the far end takes.
    const check = judge(
      wholeSetup({ wallMm: 8 }),
      piece('scraper', { form: 'magnet', wallMinMm: 8, wallMaxMm: 12 }),
      'scraper.wall',
    )
    expect(check.outcome).toBe('pass')
    expect(check.probability).toBeLessThanOrEqual(0.5)
    expect(toPlain(check.message)).toMatch(
      /A close call, 50 % sure: check the walls its magnet is made for before buying\.$/,
    )
  })

  it('is none where 5 mm are to spare between readings that good', () => {
    // z = 5/2.0817 = 2.40, Φ = 0.992.
    const check = judgeRod(295, 3, 2)
    expect(check.closeCall).toBeUndefined()
    expect(check.message).not.toMatch(/close call/i)
  })

  it('is one by a stand’s rating, known to 5 %, for a tank that weighs nearly as much', () => {
    const weight = judge(wholeSetup(), piece('stand', { loadRatingKg: 500 }), 'stand.load').measured as number
    // The rating 2 % above the weight: ± 5 % of it is u = 0.05/√3 = 2.887 % of it; z = (0.02/1.02)/0.02887 = 0.679.
    const specs = toSpecs({ loadRatingKg: 1.02 * weight })
    const check = judge(wholeSetup(), { kind: 'stand', specs }, 'stand.load')
    expect(check.probability).toBeCloseTo(0.7515, 3)
    expect(check.closeCall).toBe('ask its maker for the load it is rated for')
  })
})
