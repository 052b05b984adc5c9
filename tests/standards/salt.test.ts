import { describe, expect, it } from 'vitest'
import { countPacks, naturalSeawater, saltPacks } from '#shared/engine/physics/salt'
import { expectWithin, expectWithinShare } from './within'

describe('salt for new water', () => {
  it('is in proportion to volume and salinity', () => {
    // A pack for 200 L at 35 ppt: 300 L need one and a half, and at 33.25 ppt a twentieth less.
    expectWithin(saltPacks(300, 35, 200), 1.5, 1e-12)
    expectWithin(saltPacks(300, 33.25, 200), 1.425, 1e-12)
    expect(() => saltPacks(300, 35, 0)).toThrow(RangeError)
  })

  it('is bought by the whole pack', () => {
    expect(countPacks(1.5)).toBe(2)
    expect(countPacks(2)).toBe(2)
    // What rounding leaves over is no reason to buy another.
    expect(countPacks(1.0000000000000002)).toBe(1)
    expect(countPacks(0)).toBe(0)
  })
})

describe('natural sea water', () => {
  it('of salinity 35 has about 412 mg/kg of calcium, 1284 of magnesium and 2.3 meq/kg of alkalinity', () => {
    // Textbook composition of sea water at 35 (from memory): Ca 412, Mg 1284 mg/kg; per litre times 1.0233 kg.
    const { calciumPpm, magnesiumPpm, alkalinityDkh } = naturalSeawater(35)
    expectWithinShare(calciumPpm, 412 * 1.0233, 2e-3)
    expectWithinShare(magnesiumPpm, 1284 * 1.0233, 2e-3)
    // 1 dKH = 0.35714 meq/L (17.87 mg/L CaCO3).
    expectWithinShare(alkalinityDkh * 0.35714, 2.3 * 1.0233, 2e-3)
  })

  it('is thinner at a lower salinity', () => {
    expect(naturalSeawater(33).calciumPpm).toBeLessThan(naturalSeawater(35).calciumPpm)
  })
})
