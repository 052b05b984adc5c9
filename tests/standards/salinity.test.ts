import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  conductivityMSCm,
  practicalSalinity,
  salinityFromConductivity,
} from '#shared/engine/physics/practical-salinity'
import {
  brixFromIndex,
  brixOfSeawater,
  naclReading,
  salinityFromGravity,
  salinityFromNacl,
  seawaterIndex,
} from '#shared/engine/physics/salinity'
import { specificGravity } from '#shared/engine/physics/seawater'
import { expectWithin } from './within'

describe('practical salinity', () => {
  // UNESCO 44 (1983), check table on page 9; 1e-6.
  it.each([
    [1, 15, 0, 35],
    [1.2, 20, 2000, 37.245628],
    [0.65, 5, 1500, 27.995347],
  ])('of conductivity ratio %f at %d °C and %d dbar is %f', (ratio, t68, pressure, salinity) => {
    expectWithin(practicalSalinity(ratio, t68, pressure), salinity, 1e-6)
  })

  // TEOS-10, example of gsw_SP_from_C; mS/cm, ITS-90 °C, dbar; 1e-9.
  it.each([
    [34.5487, 28.7856, 10, 20.009869599086951],
    [34.681, 10.26, 250, 31.204503263727982],
    [34.56, 4.4036, 1000, 36.40030849438817],
  ])('of %f mS/cm at %f °C and %d dbar', (mSCm, t90, pressure, salinity) => {
    expectWithin(salinityFromConductivity(mSCm, t90, pressure), salinity, 1e-9)
  })

  // Inverse at the surface, computed and confirmed with the GSW library; 5e-4 mS/cm.
  it.each([
    [35, 20, 47.918],
    [35, 25, 53.071],
    [35, 26, 54.118],
    [34, 25, 51.72],
    [36, 25, 54.416],
  ])('%d at %d °C conducts %f mS/cm', (salinity, temperature, mSCm) => {
    expectWithin(conductivityMSCm(salinity, temperature), mSCm, 5e-4)
  })

  it('comes back from its conductivity', () => {
    fc.assert(
      fc.property(fc.double({ min: 2, max: 42, noNaN: true }), fc.double({ min: 0, max: 35, noNaN: true }), (s, t) => {
        expectWithin(salinityFromConductivity(conductivityMSCm(s, t), t), s, 1e-9)
      }),
    )
  })
})

describe('the refractive index of sea water', () => {
  // Quan & Fry 1995, Applied Optics 34, 3477; computed by an independent code, 1e-6.
  it.each([
    [0, 20, 589.26, 1.333006],
    [34, 20, 589.26, 1.339225],
    [35, 20, 589.26, 1.339408],
    [36, 20, 589.26, 1.339591],
    [0, 25, 589.26, 1.332515],
    [35, 25, 589.26, 1.338859],
    [35, 25, 450, 1.345302],
    [35, 25, 550, 1.340238],
    [35, 25, 650, 1.337116],
  ])('at salinity %d, %d °C and %f nm is %f', (salinity, temperature, nm, index) => {
    expectWithin(seawaterIndex(salinity, temperature, nm), index, 1e-6)
  })

  it('of pure water is that of the sugar scale’s zero', () => {
    // ICUMSA 1974: 1.33299 at 20 °C and 589 nm.
    expectWithin(seawaterIndex(0, 20), 1.33299, 3e-5)
  })
})

describe('a refractometer with the wrong scale', () => {
  it('for sugar reads 5.8 °Brix at 1.341452', () => {
    // ICUMSA 1974, as in the test suite of CalebBell/chemicals.
    expectWithin(brixFromIndex(1.341452), 5.8, 1e-3)
    expectWithin(brixFromIndex(1.33299), 0, 1e-9)
    expectWithin(brixFromIndex(1.34782), 10, 1e-9)
  })

  it('for sugar squeezes salinity 34 to 36 into a quarter of a degree Brix', () => {
    // Derived from ICUMSA 1974 and Quan & Fry 1995: 4.30, 4.42, 4.54 °Brix (0.01); 1.61 salinity units to 0.2 °Brix.
    expectWithin(brixOfSeawater(34), 4.3, 0.01)
    expectWithin(brixOfSeawater(35), 4.42, 0.01)
    expectWithin(brixOfSeawater(36), 4.54, 0.01)
    expectWithin(0.2 / (brixOfSeawater(36) - brixOfSeawater(35)), 1.61, 0.03)
  })

  it('for NaCl reads 36.5 in sea water of 35', () => {
    // CRC Handbook, 57th edition, p. D-252, interpolated (seen quoted): 3.65 % NaCl has n = 1.3394, sea water of 35 too.
    expectWithin(naclReading(35), 36.5, 1e-9)
    expectWithin(seawaterIndex(35, 20), 1.3394, 1e-5)
    expectWithin(naclReading(35) / 35, 1.0429, 1e-4)
    expectWithin(salinityFromNacl(naclReading(33)), 33, 1e-12)
  })
})

describe('salinity from specific gravity', () => {
  it('is 35 at 1.026373 and 33 at 1.024858, both 25/25 °C', () => {
    // EOS-80 pairs, computed by an independent code.
    expectWithin(salinityFromGravity(1.026373, 25, 25), 35, 1e-3)
    expectWithin(salinityFromGravity(1.024858, 25, 25), 33, 1e-3)
  })

  it('moves by 4.6 units with the pair of temperatures alone', () => {
    // The same water, S 35, spans 1.0234–1.0269 by convention; on one scale that is about 4.6 units.
    const span = (specificGravity(35, 15, 15) - specificGravity(35, 25, 4)) / 0.00076
    expectWithin(span, 4.6, 0.1)
    expect(salinityFromGravity(1.2, 25, 25)).toBeNull()
  })
})
