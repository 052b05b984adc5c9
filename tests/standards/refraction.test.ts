import { describe, expect, it } from 'vitest'
import {
  attenuationPerM,
  ppfdUnderWaterPerIntensity,
  refractRad,
  surfaceTransmission,
  tabulateUnderWater,
  transmissionTo,
  waterIndex,
} from '#shared/engine/physics/refraction'
import { seawaterIndex } from '#shared/engine/physics/salinity'
import { expectWithin, expectWithinShare } from './within'

const toRad = Math.PI / 180

describe('the surface of the water', () => {
  // Snell with n = 1.3394 (sea water at 589 nm by Quan & Fry); computed, 2e-3 degrees.
  it.each([
    [15, 11.143],
    [30, 21.921],
    [45, 31.864],
    [60, 40.284],
    [80, 47.33],
  ])('turns a ray of %d° to %f°', (incident, refracted) => {
    expectWithin(refractRad(incident * toRad, 1.3394) / toRad, refracted, 2e-3)
  })

  it('lets nothing through from beyond the critical angle of 48.297°', () => {
    // asin(1/1.3394).
    expectWithin(refractRad(90 * toRad, 1.3394) / toRad, 48.297, 2e-3)
  })

  it('passes what Fresnel gives at normal incidence', () => {
    // R = ((n − 1)/(n + 1))² = 0.021112 at n = 1.34.
    expectWithin(1 - ((waterIndex - 1) / (waterIndex + 1)) ** 2, 1 - 0.021112, 1e-6)
    expectWithin(surfaceTransmission, 1 - 0.021112, 2e-4)
  })

  it('has the index of sea water in the middle of the visible', () => {
    // Quan & Fry 1995 at 550 nm, salinity 35, 25 °C.
    expectWithin(waterIndex, seawaterIndex(35, 25, 550), 0.001)
  })
})

describe('the water itself', () => {
  // Pope & Fry 1997, Applied Optics 36, 8710, table 3: absorption of pure water in 1/m, 400–700 nm by 10 nm.
  const absorption = [
    0.00663, 0.00473, 0.00454, 0.00495, 0.00635, 0.00922, 0.00979, 0.0106, 0.0127, 0.015, 0.0204, 0.0325, 0.0409,
    0.0434, 0.0474, 0.0565, 0.0619, 0.0695, 0.0896, 0.1351, 0.2224, 0.2644, 0.2755, 0.2916, 0.3108, 0.34, 0.41, 0.439,
    0.465, 0.516, 0.624,
  ]
  const flatSpectrum = (depthM: number) =>
    absorption.reduce((sum, a, index) => sum + Math.exp(-a * depthM) * (index % 30 === 0 ? 0.5 : 1), 0) / 30

  it('takes from a flat spectrum what pure water takes in the depths of a tank', () => {
    // Checks the table against its published integrals (3e-4), then the model's single figure against the table.
    expectWithin(flatSpectrum(0.3), 0.957, 3e-4)
    expectWithin(flatSpectrum(0.6), 0.9182, 3e-4)
    expectWithin(-Math.log(flatSpectrum(0.6)) / 0.6, attenuationPerM, 0.003)
    for (const depthM of [0.1, 0.3, 0.6]) {
      expectWithin(transmissionTo(depthM * 1000) / surfaceTransmission, flatSpectrum(depthM), 0.003)
    }
  })
})

describe('a beam under water', () => {
  it('on the axis is as far away as air and water/n together', () => {
    // ppfd (d_ref/(h + z/n))² × 0.979 exp(−0.14 z): by hand for 200 µmol/(m² s) at 300 mm, h = 150, z = 268 mm.
    const intensity = 200 * 0.3 ** 2
    const byHand = 200 * (300 / (150 + 268 / 1.34)) ** 2 * 0.979 * Math.exp(-0.14 * 0.268)
    expectWithin(intensity * ppfdUnderWaterPerIntensity(2, { heightMm: 150, depthMm: 268 }, 0), byHand, 1e-6)
  })

  it('is what air gives where there is no water above the plane, but for the surface', () => {
    const inAir = (0.3 / Math.hypot(0.3, 0.2)) ** 3 / (0.3 ** 2 + 0.2 ** 2)
    const atSurface = ppfdUnderWaterPerIntensity(2, { heightMm: 300, depthMm: 0 }, 200)
    expectWithinShare(atSurface, inAir * surfaceTransmission, 1e-9)
  })

  it('keeps every photon that gets through, whatever the height and the depth', () => {
    for (const order of [1, 2, 8.75]) {
      for (const depths of [
        { heightMm: 60, depthMm: 400 },
        { heightMm: 300, depthMm: 100 },
      ]) {
        // Rings widening geometrically, each weighed at its middle, out to 100 m.
        let sum = 0
        let inner = 0
        for (let outer = 0.5; outer < 1e5; outer *= 1.005) {
          const middle = (inner + outer) / 2
          sum += (ppfdUnderWaterPerIntensity(order, depths, middle) * Math.PI * (outer ** 2 - inner ** 2)) / 1e6
          inner = outer
        }
        // A beam with unit axial intensity sends out 2π/(m + 1).
        expectWithinShare(sum, ((2 * Math.PI) / (order + 1)) * transmissionTo(depths.depthMm), 2e-3)
      }
    }
  })

  it('gets dimmer outwards and deeper down', () => {
    const at = (depthMm: number, offsetMm: number) =>
      ppfdUnderWaterPerIntensity(2, { heightMm: 150, depthMm }, offsetMm)
    for (let offset = 0; offset < 800; offset += 20) expect(at(300, offset + 20)).toBeLessThan(at(300, offset))
    for (let depth = 0; depth < 800; depth += 20) expect(at(depth + 20, 0)).toBeLessThan(at(depth, 0))
  })

  it('reads the same from its table', () => {
    // With its lens on the water a light ends sharply at the critical angle, which a table rounds off.
    for (const [heightMm, depthMm, tolerance] of [
      [20, 400, 1e-4],
      [200, 275, 1e-4],
      [0, 300, 1e-3],
    ] as const) {
      const depths = { heightMm, depthMm }
      const table = tabulateUnderWater(2, depths, 900)
      const axial = ppfdUnderWaterPerIntensity(2, depths, 0)
      for (let offset = 0; offset < 900; offset += 7.3) {
        expectWithin(table(offset), ppfdUnderWaterPerIntensity(2, depths, offset), tolerance * axial)
      }
      expect(table(901)).toBe(0)
    }
  })
})
