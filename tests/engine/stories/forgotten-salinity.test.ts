import { describe, expect, it } from 'vitest'
import { report } from '#shared/engine/report'
import { replacements } from '#shared/engine/swap/replacements'
import { heater, item, piece, wholeSetup } from '../build'
import { catalogueOf } from '../demo-catalogue'
import { findAnswer } from './tell'

const meter = piece(
  'salinity-meter',
  { method: 'refractometer', scales: ['seawater-ppt'], rangeMinPpt: 0, rangeMaxPpt: 100, resolutionPpt: 1 },
  'meter-a',
)
/** All that a marine setup cannot do without, but for a way to read its salinity. */
const items = [
  item('heater', heater({ powerW: 150, lengthMm: 250 })),
  item('kit', piece('test-kit', { parameters: ['ammonia', 'nitrite', 'nitrate'], madeFor: ['reef'] })),
  item('salt', piece('salt-mix', { makesL: 120 })),
  item('unit', piece('ro-unit', {})),
  item('mover', piece('wavemaker', { plugs: 1, powerW: 5 })),
  item('scraper', piece('scraper', {})),
  item('light', piece('light', { plugs: 1, powerW: 40 })),
]
const needsOf = (setup: Parameters<typeof report>[0]) => report(setup).missing.map(({ need }) => need)

describe('a setup whose owner forgot how to measure salinity', () => {
  it('is told that, and that alone, is missing', () => {
    const { missing, verdict } = report(wholeSetup({}, { items }))
    expect(missing.map(({ need }) => need)).toEqual(['salinity-reading'])
    expect(missing[0]?.message).toContain('Nothing measures salinity')
    expect(verdict).not.toBe('fits')
  })

  it('is told of nothing missing once there is a meter, and told again when it is gone', () => {
    expect(needsOf(wholeSetup({}, { items: [...items, item('meter', meter)] }))).toEqual([])
    const gone = [...items, item('meter', meter, { state: 'gone' })]
    expect(needsOf(wholeSetup({}, { items: gone }))).toEqual(['salinity-reading'])
  })

  it('does not charge the replacement of something else with it', () => {
    const catalogue = catalogueOf(heater({ powerW: 150, lengthMm: 250 }, 'other'), meter)
    const result = replacements(wholeSetup({}, { items }), 'heater', catalogue, { limit: 1, offset: 0 })!
    expect(findAnswer(result, 'other')).toMatchObject({ knockOns: [], addOns: [] })
  })
})
