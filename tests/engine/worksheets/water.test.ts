import { describe, expect, it } from 'vitest'
import { expectWithin, expectWithinShare } from '../../standards/within'
import { refusals, result, stepValue, work } from './work'

describe('the worksheet of sea water', () => {
  it('gives the density of UNESCO 44 at salinity 35 and 25 and 5 °C', () => {
    // Fofonoff & Millard 1983, UNESCO Technical Papers in Marine Science 44, check table p. 19.
    expectWithin(result('seawater', { salinityPpt: 35, temperatureC: 25 }, 'densityKgM3'), 1023.34306, 1e-5)
    expectWithin(result('seawater', { salinityPpt: 35, temperatureC: 5 }, 'densityKgM3'), 1027.67547, 1e-5)
  })

  it.each([
    [30, 1.022588],
    [34, 1.025615],
    [35, 1.026373],
    [36, 1.027131],
  ])('gives %d ppt the specific gravity %f at 25/25 °C', (salinityPpt, gravity) => {
    // By hand from EOS-80, ρ(S, 25)/ρ(0, 25).
    expectWithin(result('seawater', { salinityPpt, temperatureC: 18 }, 'sg2525'), gravity, 1e-6)
  })

  it('gives 1.026604 at 20/20 °C', () => {
    expectWithin(result('seawater', { salinityPpt: 35, temperatureC: 25 }, 'sg2020'), 1.026604, 1e-6)
  })

  it.each([
    [35, 20, 47.918],
    [35, 25, 53.071],
    [35, 26, 54.118],
    [34, 25, 51.72],
    [36, 25, 54.416],
  ])('gives %d ppt at %d °C a conductivity of %f mS/cm', (salinityPpt, temperatureC, mSCm) => {
    // The inverse of PSS-78 as TEOS-10’s own library (gsw 3.6) gives it, temperatures on ITS-90.
    expectWithin(result('seawater', { salinityPpt, temperatureC }, 'conductivityMScm'), mSCm, 6e-4)
  })

  it('gives the refractive index of Quan and Fry', () => {
    // By hand from Applied Optics 34, 3477 at 589.26 nm.
    expectWithin(result('seawater', { salinityPpt: 35, temperatureC: 25 }, 'refractiveIndex'), 1.338859, 1e-6)
    expectWithin(result('seawater', { salinityPpt: 34, temperatureC: 20 }, 'refractiveIndex'), 1.339225, 1e-6)
  })

  it.each([
    [34, 4.3],
    [35, 4.42],
    [36, 4.54],
  ])('says that %d ppt reads %f on a sugar scale', (salinityPpt, brix) => {
    // ICUMSA 1974 sucrose table, 20 °C, interpolated.
    expectWithin(result('seawater', { salinityPpt, temperatureC: 25 }, 'brixEquivalent'), brix, 0.01)
  })
})

describe('the worksheet of a membrane', () => {
  const psi = 6.894757293168
  const gallon = 3.785411784
  const rated = {
    membraneLpd: 75 * gallon,
    testPressureKPa: 50 * psi,
    testTempC: 25,
    testTdsPpm: 250,
    feedTdsPpm: 250,
    rejectionFraction: 0.96,
    wasteRatio: 1e9,
  }

  it('makes 41.7 US gal/day of a rated 75 at 40 psi and 15 °C, and 90.8 at 60 psi and 25 °C', () => {
    // By hand from the membrane maker’s technical manual (form 45-D01504-en), without concentration; ± 0.1 US gal/day.
    const cold = { ...rated, feedKPa: 40 * psi, feedTempC: 15 }
    const strong = { ...rated, feedKPa: 60 * psi, feedTempC: 25 }
    expectWithin(result('membrane', cold, 'litresPerDay') / gallon, 41.7, 0.1)
    expectWithin(result('membrane', strong, 'litresPerDay') / gallon, 90.8, 0.1)
  })

  it('wastes three parts of four at one to three, and lets 4 % of the salt through at 96 % rejection', () => {
    // Definitions: recovery = product/(product + waste), rejection = 1 − product/feed.
    const found = work('membrane', { ...rated, wasteRatio: 3, feedKPa: 50 * psi, feedTempC: 25 }).result
    expectWithinShare(found['litresPerDay'] as number, rated.membraneLpd, 1e-12)
    expectWithinShare(found['wasteLitresPerDay'] as number, 3 * rated.membraneLpd, 1e-12)
    expectWithin(found['productTdsPpm'] as number, 10, 1e-9)
  })

  it('says so where the tap does not overcome osmosis', () => {
    const found = work('membrane', { ...rated, wasteRatio: 3, feedKPa: 20, feedTempC: 25, feedTdsPpm: 5000 })
    expect(found.result['litresPerDay']).toBe(0)
    expect(found.cautions.join(' ')).toMatch(/nothing comes through/)
  })

  it('refuses a test pressure that does not overcome osmosis, however strong the tap is', () => {
    // The manual’s C (T + 320)/491000 bar: 2000 ppm at 25 °C take 140.5 kPa.
    const body = { ...rated, testTdsPpm: 2000, feedKPa: 400, feedTempC: 25 }
    expect(refusals('membrane', { ...body, testPressureKPa: 60 })).toEqual(['testPressureKPa'])
    expect(refusals('membrane', { ...body, testPressureKPa: 140 })).toEqual(['testPressureKPa'])
    expect(refusals('membrane', { ...body, testPressureKPa: 141 })).toEqual([])
  })

  it('names the test salt content that it took', () => {
    const { testTdsPpm: _, ...unsaid } = rated
    const found = work('membrane', { ...unsaid, feedKPa: 300, feedTempC: 15 })
    expect(found.assumptions).toEqual([expect.objectContaining({ key: 'testTdsPpm', value: 250 })])
  })
})

describe('the worksheet of a sand bed', () => {
  const bed = { lengthMm: 1176, widthMm: 576, depthMm: 50, packKg: 9 }

  it('takes 52.16 kg for 1176 × 576 × 50 mm of carbonate with 45 % pores', () => {
    // Area × depth × 2800 kg/m³ × 0.55, by hand.
    expectWithin(result('sand-bed', bed, 'massKg'), 52.16, 5e-3)
    expectWithin(result('sand-bed', bed, 'litres'), 33.869, 1e-3)
    expect(result('sand-bed', bed, 'packs')).toBe(6)
    expectWithin(stepValue('sand-bed', bed, 'Bulk density'), 1.54, 1e-12)
  })

  it('takes the bulk density that was measured', () => {
    expectWithin(result('sand-bed', { ...bed, bulkDensityKgL: 1.2 }, 'massKg'), 40.642, 1e-3)
  })

  it('says when its grains move, by Soulsby, and what they are called, by Wentworth', () => {
    // Soulsby 1997 for carbonate of 0.5 mm in sea water at 25 °C under 0.5 m of water: 0.3026 m/s. The sheet’s water is
    // 0.4 m deep, and the speed goes with the seventh root of the depth.
    const grains = { ...bed, grainMinMm: 0.4, grainMaxMm: 0.625 }
    expectWithinShare(
      stepValue('sand-bed', grains, 'Such grains begin to move where the water runs at'),
      0.3026 * (0.4 / 0.5) ** (1 / 7),
      1e-3,
    )
    // Wentworth 1922: 0.5 to 1 mm.
    expect(
      work('sand-bed', grains)
        .steps.map(({ title }) => title)
        .join(' '),
    ).toContain('coarse sand')
  })

  it('refuses grains whose largest is smaller than the smallest', () => {
    expect(refusals('sand-bed', { ...bed, grainMinMm: 2, grainMaxMm: 1 })).toEqual(['grainMaxMm'])
  })
})

describe('the worksheet of salt', () => {
  it('takes salt in proportion, and whole packs', () => {
    // 100 L at 33 ppt of a pack of 10 kg for 200 L at 35 ppt: 100/200 × 33/35 × 10 kg, by hand.
    const found = work('salt-mix', { volumeL: 100, salinityPpt: 33, makesL: 200, packKg: 10 }).result
    expectWithin(found['massKg'] as number, 4.714286, 1e-6)
    expect(found['packs']).toBe(1)
    expect(result('salt-mix', { volumeL: 400, salinityPpt: 35, makesL: 200, packKg: 10 }, 'packs')).toBe(2)
    expect(result('salt-mix', { volumeL: 401, salinityPpt: 35, makesL: 200, packKg: 10 }, 'packs')).toBe(3)
  })
})
