import fc from 'fast-check'
import psychrolib from 'psychrolib'
import { describe, expect, it } from 'vitest'
import { dryAirDensityKgM3, humidityRatio, latentHeatKJKg, saturationPressureKPa } from '#shared/engine/physics/vapour'
import { expectWithin, expectWithinShare } from './within'

psychrolib.SetUnitSystem(psychrolib.SI)

describe('the saturation pressure of water vapour', () => {
  // ASHRAE Fundamentals 2017, chapter 1, table of saturation pressures, as quoted in PsychroLib's test suite; 0.03 %.
  it.each([
    [5, 872.6],
    [25, 3169.7],
    [50, 12351.3],
  ])('at %d °C is the ASHRAE table value %f Pa', (temperature, pascals) => {
    expectWithinShare(saturationPressureKPa(temperature) * 1000, pascals, 3e-4)
  })

  // Hyland–Wexler computed by an independent code; 0.05 Pa.
  it.each([
    [20, 2338.8],
    [22, 2644.75],
    [24, 2985.13],
    [26, 3363.13],
    [27, 3567.31],
    [28, 3782.21],
  ])('at %d °C is %f Pa', (temperature, pascals) => {
    expectWithin(saturationPressureKPa(temperature) * 1000, pascals, 0.05)
  })

  it('agrees with the IAPWS-IF97 check value at 300 K to 0.02 %', () => {
    // IAPWS-IF97, table 35: 300 K → 3536.58941 Pa.
    expectWithinShare(saturationPressureKPa(300 - 273.15) * 1000, 3536.58941, 2e-4)
  })

  it('agrees with PsychroLib from 1 to 95 °C', () => {
    fc.assert(
      fc.property(fc.double({ min: 1, max: 95, noNaN: true }), (temperature) => {
        expectWithinShare(saturationPressureKPa(temperature) * 1000, psychrolib.GetSatVapPres(temperature), 1e-6)
      }),
    )
  })

  it('refuses temperatures that are not numbers or do not exist', () => {
    expect(() => saturationPressureKPa(Number.NaN)).toThrow(RangeError)
    expect(() => saturationPressureKPa(-300)).toThrow(RangeError)
  })
})

describe('moist air', () => {
  it('at 3169.7 Pa of vapour and 95 461 Pa holds 0.0213604 kg of water per kg of dry air', () => {
    // PsychroLib's test suite, after ASHRAE Fundamentals 2017.
    expectWithin(humidityRatio(3.1697, 95.461), 0.0213604, 5e-7)
  })

  it('has the humidity ratio and the dry-air density of PsychroLib', () => {
    const pressure = 101325
    fc.assert(
      fc.property(
        fc.double({ min: 1, max: 40, noNaN: true }),
        fc.double({ min: 0.05, max: 1, noNaN: true }),
        (temperature, humidity) => {
          const vapour = humidity * psychrolib.GetSatVapPres(temperature)
          const ratio = psychrolib.GetHumRatioFromVapPres(vapour, pressure)
          expectWithinShare(humidityRatio(vapour / 1000), ratio, 1e-9)
          // Volume per kilogram of dry air: its inverse is the mass of dry air in a cubic metre.
          const density = 1 / psychrolib.GetMoistAirVolume(temperature, ratio, pressure)
          expectWithinShare(dryAirDensityKgM3(temperature, vapour / 1000), density, 2e-5)
        },
      ),
    )
  })

  it('takes the latent heat of IAPWS-IF97 to 0.3 kJ/kg at 25 °C', () => {
    // IAPWS-IF97 at 25 °C: 2441.7 kJ/kg.
    expectWithin(latentHeatKJKg(25), 2441.7, 0.3)
  })
})
