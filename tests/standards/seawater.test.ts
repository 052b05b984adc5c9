import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  heatCapacityJK,
  seawaterDensityKgM3,
  seawaterKinematicViscosityM2S,
  seawaterSpecificHeatJKgK,
  seawaterViscosityPaS,
  specificGravity,
} from '#shared/engine/physics/seawater'
import { expectWithin } from './within'

describe('the density of sea water', () => {
  // UNESCO Technical Papers in Marine Science 44 (1983), check table on page 19, p = 0, temperatures on IPTS-68.
  it.each([
    [0, 5, 999.96675],
    [0, 25, 997.04796],
    [35, 5, 1027.67547],
    [35, 25, 1023.34306],
  ])('at salinity %d and %d °C is that of the UNESCO check table', (salinity, t68, density) => {
    expectWithin(seawaterDensityKgM3(salinity, t68), density, 1e-5)
  })

  it('agrees with TEOS-10 to 0.003 kg/m³ at salinity 35 and 25 °C', () => {
    // TEOS-10 rho_t_exact at SA 35.16504, computed with the GSW library 3.6.16; the thermometer (ITS-90) reads 25 °C.
    expectWithin(seawaterDensityKgM3(35, 25 * 1.00024), 1023.3436, 0.003)
  })

  it('rises with salinity everywhere in its range', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 41, noNaN: true }), fc.double({ min: -2, max: 40, noNaN: true }), (s, t) => {
        expect(seawaterDensityKgM3(s + 0.5, t)).toBeGreaterThan(seawaterDensityKgM3(s, t))
      }),
    )
  })

  it('refuses what is not a number', () => {
    expect(() => seawaterDensityKgM3(Number.NaN, 25)).toThrow(RangeError)
    expect(() => seawaterDensityKgM3(35, Number.POSITIVE_INFINITY)).toThrow(RangeError)
  })
})

describe('specific gravity', () => {
  // Computed with an independent EOS-80 code for the reference pairs named in ASTM E100-14, 3.2.3.1; tolerance 1e-6.
  const sixtyF = (60 - 32) / 1.8
  it.each([
    [35, 25, 25, 1.026373],
    [35, 20, 20, 1.026604],
    [35, sixtyF, sixtyF, 1.02686],
    [35, 15, 15, 1.026895],
    [35, 20, 4, 1.024789],
    [35, 25, 4, 1.023369],
    [35, 25, 20, 1.025182],
    [35, 25, sixtyF, 1.024351],
    [30, 25, 25, 1.022588],
    [33, 25, 25, 1.024858],
    [34, 25, 25, 1.025615],
    [36, 25, 25, 1.027131],
  ])('of salinity %d at %f °C over water at %f °C is %f', (salinity, sampleC, waterC, gravity) => {
    expectWithin(specificGravity(salinity, sampleC, waterC), gravity, 1e-6)
  })
})

describe('the heat that sea water holds', () => {
  it('is that of the UNESCO 44 check value for the specific heat at salinity 40 and 40 °C', () => {
    // UNESCO 44, check value under eqs 26–28 at p = 0: 3980.051 J/(kg K).
    expectWithin(seawaterSpecificHeatJKgK(40, 40), 3980.051, 6e-4)
  })

  it('is 3997.68 J/(kg K) and 4.0910 kJ/(L K) at salinity 35 and 25 °C', () => {
    // Computed from the UNESCO 44 polynomials by an independent code.
    expectWithin(seawaterSpecificHeatJKgK(35, 25), 3997.68, 0.005)
    expectWithin(heatCapacityJK(1, 35, 25), 4091.0, 0.05)
  })

  it('takes 0.11364 kWh to warm 100 litres by one kelvin', () => {
    // From the two values above; 3.6 MJ per kWh.
    expectWithin(heatCapacityJK(100, 35, 25) / 3.6e6, 0.11364, 5e-6)
  })
})

describe('the viscosity of sea water', () => {
  // Four-digit values for Sharqawy et al. 2010 from the test suite of the WaterTAP project; salinity in g/kg.
  it.each([
    [35, 25, 9.588e-4, 5e-8],
    [10, 50, 5.596e-4, 5e-8],
    [50, 10, 1.443e-3, 5e-7],
  ])('at %d g/kg and %d °C is %f Pa s', (salinity, temperature, viscosity, tolerance) => {
    expectWithin(seawaterViscosityPaS(salinity, temperature), viscosity, tolerance)
  })

  it('divided by the density is 9.369e-7 m²/s at 25 °C and 9.171e-7 at 26 °C', () => {
    // Computed from the same formulas by an independent code; tolerance 1e-9.
    expectWithin(seawaterKinematicViscosityM2S(35, 25), 9.369e-7, 1e-9)
    expectWithin(seawaterKinematicViscosityM2S(35, 26), 9.171e-7, 1e-9)
  })

  it('of pure water is within 0.2 % of IAPWS R12-08 at 25 °C', () => {
    // IAPWS R12-08 table of check values: 998 kg/m³, 298.15 K → 889.735100 µPa s.
    expectWithin(seawaterViscosityPaS(0, 25), 889.7351e-6, 889.7351e-6 * 0.002)
  })
})
