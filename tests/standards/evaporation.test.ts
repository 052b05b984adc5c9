import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { ashraeEvaporationKgM2H, evaporationHeatW, shahEvaporationKgM2H } from '#shared/engine/physics/evaporation'
import { dryAirDensityKgM3, latentHeatKJKg, saturationPressureKPa } from '#shared/engine/physics/vapour'
import { expectWithin, expectWithinShare } from './within'

const air = (waterC: number, roomC: number, relativeHumidity: number) => ({ waterC, roomC, relativeHumidity })

describe('evaporation by Shah', () => {
  // Shah 2014, ASHRAE Transactions 120(2), table for 50 % humidity, in a public transcription; 0.6 %. The model's
  // constants are quoted from memory, so this table is what establishes them.
  it.each([
    [28, 28, 0.136, 0.0219],
    [28, 29, 0.1171, 0.0168],
    [28, 30, 0.0968, 0.0116],
    [29, 28, 0.1651, 0.0282],
    [29, 29, 0.1463, 0.0231],
    [29, 30, 0.1268, 0.018],
    [30, 28, 0.1959, 0.0347],
    [30, 29, 0.1771, 0.0295],
    [30, 30, 0.1575, 0.0244],
  ])('of water at %d °C in a room of %d °C is the published %f kg/(m² h)', (waterC, roomC, evaporation, lift) => {
    expectWithinShare(shahEvaporationKgM2H(air(waterC, roomC, 0.5)), evaporation, 6e-3)
    const room = dryAirDensityKgM3(roomC, 0.5 * saturationPressureKPa(roomC))
    expectWithin(room - dryAirDensityKgM3(waterC, saturationPressureKPa(waterC)), lift, 1.1e-4)
  })
})

describe('evaporation by both models', () => {
  // Computed by an independent code: ASHRAE with activity factor 0.5 in still air, and Shah; 5e-4 kg/(m² h).
  it.each([
    [26, 22, 0.5, 0.134, 0.1786],
    [25, 22, 0.5, 0.1212, 0.1534],
    [26, 24, 0.6, 0.1032, 0.1204],
    [25, 25, 0.5, 0.104, 0.1083],
  ])('of water at %d °C in a room of %d °C at humidity %f', (waterC, roomC, humidity, ashrae, shah) => {
    expectWithin(ashraeEvaporationKgM2H(air(waterC, roomC, humidity)), ashrae, 5e-4)
    expectWithin(shahEvaporationKgM2H(air(waterC, roomC, humidity)), shah, 5e-4)
  })

  it('agrees with the inch-pound form of ASHRAE within 1 %', () => {
    // ASHRAE Transactions 1998, 104(1A), abstract: (95 + 0.425 v)(pw − pa)/Y in lb/(h ft²), inHg, Btu/lb; v = 0.
    const inHgKPa = 3.386389
    const perBtuLb = 2.326
    const pressureInHg = (saturationPressureKPa(26) - 0.5 * saturationPressureKPa(22)) / inHgKPa
    const poundsPerFt2 = (0.5 * 95 * pressureInHg) / (latentHeatKJKg(26) / perBtuLb)
    expectWithinShare(ashraeEvaporationKgM2H(air(26, 22, 0.5)), (poundsPerFt2 * 0.45359237) / 0.09290304, 0.01)
  })

  it('falls as the room gets damper, and is never negative', () => {
    const temperature = fc.double({ min: 15, max: 32, noNaN: true })
    fc.assert(
      fc.property(
        temperature,
        temperature,
        fc.double({ min: 0.1, max: 0.9, noNaN: true }),
        (waterC, roomC, humidity) => {
          for (const model of [ashraeEvaporationKgM2H, shahEvaporationKgM2H]) {
            const dry = model(air(waterC, roomC, humidity))
            const damp = model(air(waterC, roomC, humidity + 0.1))
            expect(damp).toBeGreaterThanOrEqual(0)
            expect(dry).toBeGreaterThanOrEqual(damp)
          }
        },
      ),
    )
  })

  it('stops where the room holds more vapour than the surface', () => {
    expect(ashraeEvaporationKgM2H(air(20, 30, 0.9))).toBe(0)
    expect(shahEvaporationKgM2H(air(20, 30, 0.9))).toBe(0)
  })

  it('carries off 677.7 W per kilogram an hour at 26 °C', () => {
    // 2501 − 2.361·26 = 2439.6 kJ/kg over 3600 s.
    expectWithin(evaporationHeatW(1, 26), 677.67, 0.01)
  })
})
