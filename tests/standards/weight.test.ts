import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  boxVolumeL,
  filledMassKg,
  floorPressureKPa,
  netVolumeL,
  seawaterMassKg,
  shellMassKg,
  type OpenBox,
} from '#shared/engine/physics/weight'
import { expectWithin, expectWithinShare } from './within'

/** 1.2 × 0.6 × 0.6 m outside, 12 mm glass. */
const tank: OpenBox = {
  outerLengthMm: 1200,
  outerWidthMm: 600,
  outerHeightMm: 600,
  wallMm: 12,
  bottomMm: 12,
  material: 'glass',
}

describe('the weight of a tank', () => {
  it('of glass is 2.5 kg per square metre and millimetre, of acrylic 1.18', () => {
    // EN 572-1: 2500 kg/m³; ISO 10456: PMMA 1180 kg/m³. A pane of 1.2 × 0.6 × 0.012 m weighs 21.6 and 10.20 kg.
    const solid = { outerLengthMm: 1200, outerWidthMm: 600, outerHeightMm: 12, wallMm: 0, bottomMm: 12 }
    expectWithin(shellMassKg({ ...solid, material: 'glass' }), 21.6, 1e-9)
    expectWithin(shellMassKg({ ...solid, material: 'acrylic' }), 10.2, 0.005)
  })

  it('is 84.26 kg of glass around 398.30 litres in the worked tank', () => {
    // Outer less inner volume by EN 572-1 density; 0.1 %.
    expectWithinShare(shellMassKg(tank), 84.26, 1e-3)
    expectWithinShare(boxVolumeL(1176, 576, 588), 398.3, 1e-3)
  })

  it('filled to 95 % on a stand of 50 kg presses with 7.10 kPa on its own footprint', () => {
    // Worked by hand with EOS-80 water of salinity 35 at 25 °C: 387.20 kg, 521.5 kg in all; 148 lbf/ft²; 0.1 %.
    const waterKg = seawaterMassKg(0.95 * boxVolumeL(1176, 576, 588), 35, 25)
    expectWithinShare(waterKg, 387.2, 1e-3)
    const filled = filledMassKg({ shellKg: shellMassKg(tank), waterKg, rockKg: 0, sandKg: 0 }) + 50
    expectWithinShare(filled, 521.5, 1e-3)
    expectWithinShare(floorPressureKPa(filled, 1200, 600), 7.1, 1e-3)
    // 40 lbf/ft² is 1.91521 kPa (exact definitions of pound, foot and standard gravity).
    expectWithinShare((floorPressureKPa(filled, 1200, 600) / 1.91521) * 40, 148, 3e-3)
  })

  it('stands in the known relation to the uniform loads that dwellings are designed for', () => {
    // 40 lbf/ft² (IRC table R301.5) is 195.3 kg/m² and 0.191 m of sea water; 1.5 and 2.0 kN/m² (EN 1991-1-1) 153 and 204.
    expectWithinShare(floorPressureKPa(195.3, 1000, 1000), 1.91521, 1e-3)
    expectWithinShare(floorPressureKPa(seawaterMassKg(191, 35, 25), 1000, 1000), 1.91521, 3e-3)
    expectWithinShare(floorPressureKPa(153, 1000, 1000), 1.5, 2e-3)
    expectWithinShare(floorPressureKPa(204, 1000, 1000), 2.0, 2e-3)
  })

  it('at 0.6 m of depth is a pressure of 6.021 kPa', () => {
    // ρ g h with EOS-80 at salinity 35 and 25 °C.
    expectWithin(floorPressureKPa(seawaterMassKg(600, 35, 25), 1000, 1000), 6.021, 0.001)
  })

  it('loses water to rock and sand by the volume of their grains', () => {
    expectWithin(netVolumeL(100, 27, 28), 80, 1e-9)
    expect(netVolumeL(10, 270, 0)).toBe(0)
  })

  it('grows with every wall, and stays below that of a solid block', () => {
    const thickness = fc.double({ min: 2, max: 30, noNaN: true })
    fc.assert(
      fc.property(thickness, thickness, (wallMm, bottomMm) => {
        const mass = shellMassKg({ ...tank, wallMm, bottomMm })
        expect(shellMassKg({ ...tank, wallMm: wallMm + 1, bottomMm })).toBeGreaterThan(mass)
        expect(shellMassKg({ ...tank, wallMm, bottomMm: bottomMm + 1 })).toBeGreaterThan(mass)
        expect(mass).toBeLessThan(432 * 2.5)
      }),
    )
  })
})
