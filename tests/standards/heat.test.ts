import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import {
  surfaceResistanceM2KW,
  tankHeatLoss,
  wallTransmittanceWM2K,
  type TankHeatInput,
  type WaterTub,
} from '#shared/engine/physics/heat'
import { expectWithin, expectWithinShare } from './within'

const box: WaterTub = {
  insideLengthMm: 1200,
  insideWidthMm: 600,
  waterDepthMm: 550,
  wallMm: 12,
  bottomMm: 12,
  material: 'glass',
}
const worked: TankHeatInput = { boxes: [box], lid: 'none', waterC: 26, roomC: 22, relativeHumidity: 0.5 }

describe('heat through a wall', () => {
  // U = 1/(t/λ + R) with ISO 6946 surface resistances, EN 572-1 glass and ISO 10456 PMMA; computed, 1e-4 W/(m² K).
  const { sides, bottom, surface } = surfaceResistanceM2KW
  it.each([
    ['10 mm glass, sideways', 10, 'glass', sides, 7.1429],
    ['12 mm glass, sideways', 12, 'glass', sides, 7.0423],
    ['19 mm glass, sideways', 19, 'glass', sides, 6.7114],
    ['12 mm acrylic, sideways', 12, 'acrylic', sides, 5.0847],
    ['12 mm glass, downwards', 12, 'glass', bottom, 5.4945],
    ['10 mm glass, upwards', 10, 'glass', surface, 9.0909],
  ] as const)('of %s', (_, thickness, material, resistance, transmittance) => {
    expectWithin(wallTransmittanceWM2K(thickness, material, resistance), transmittance, 1e-4)
  })

  it('meets surface resistances that follow from radiation and convection at 20 °C', () => {
    // ISO 6946, annex: 1/R = 0.9·4σT³ + hc, with hc 5.0, 2.5 and 0.7 W/(m² K) (quoted from memory); σ is CODATA's.
    const radiation = 0.9 * 4 * 5.670374419e-8 * 293.15 ** 3
    expectWithin(1 / (radiation + 5.0), surface, 0.0015)
    expectWithin(1 / (radiation + 2.5), sides, 0.0015)
    expectWithin(1 / (radiation + 0.7), bottom, 0.0015)
  })
})

describe('heat lost by a tank', () => {
  it('adds up as in the worked tank of 396 litres at 26 °C in a room of 22 °C', () => {
    // Worked by hand from ISO 6946, ASHRAE and Shah: inside 1.20 × 0.60 m, 0.55 m of water, 12 mm glass, open; 0.3 %.
    const loss = tankHeatLoss(worked)
    expectWithinShare(loss.sidesW, 55.8, 3e-3)
    expectWithinShare(loss.bottomW, 15.8, 3e-3)
    expectWithinShare(loss.surfaceW, 28.8, 3e-3)
    expectWithinShare(loss.evaporationW, 65.4, 3e-3)
    expectWithinShare(loss.evaporationUpperW, 87.1, 3e-3)
    expectWithinShare(loss.totalW, 165.8, 3e-3)
    expectWithinShare(loss.totalUpperW, 187.5, 3e-3)
    expectWithinShare(loss.evaporationLPerDay, 2.32, 3e-3)
    expectWithinShare(loss.evaporationUpperLPerDay, 3.09, 3e-3)
    expectWithinShare((loss.totalW - loss.evaporationW) / 4, 25.1, 3e-3)
  })

  it('lies in the range that keepers plan with', () => {
    // Common practice: 0.5–1 W per litre for a lift of 3–5 K. The worked tank, lifted 4 K, needs 0.42–0.47.
    const loss = tankHeatLoss(worked)
    expectWithin(loss.totalW / 396, 0.42, 0.005)
    expectWithin(loss.totalUpperW / 396, 0.47, 0.005)
  })

  it('keeps nine tenths of the evaporation in under a solid lid and none under a mesh', () => {
    const open = tankHeatLoss(worked)
    const solid = tankHeatLoss({ ...worked, lid: 'solid' })
    expect(solid.evaporationW).toBeCloseTo(open.evaporationW / 10, 9)
    expect(solid.surfaceW).toBe(open.surfaceW)
    expect(tankHeatLoss({ ...worked, lid: 'mesh' })).toEqual(open)
  })

  it('adds the sump, which the lid does not cover', () => {
    const both = tankHeatLoss({ ...worked, boxes: [box, box], lid: 'solid' })
    const open = tankHeatLoss(worked)
    expect(both.sidesW).toBeCloseTo(2 * open.sidesW, 9)
    expect(both.evaporationW).toBeCloseTo(1.1 * open.evaporationW, 9)
  })

  it('turns into a gain through the walls in a warmer room while the surface goes on evaporating', () => {
    const loss = tankHeatLoss({ ...worked, roomC: 30, relativeHumidity: 0.3 })
    expect(loss.sidesW).toBeLessThan(0)
    expect(loss.bottomW).toBeLessThan(0)
    expect(loss.surfaceW).toBeLessThan(0)
    expect(loss.evaporationW).toBeGreaterThan(0)
  })

  it('has no evaporation, rather than a negative one, in a hot and damp room', () => {
    const loss = tankHeatLoss({ ...worked, roomC: 34, relativeHumidity: 0.95 })
    expect(loss.evaporationW).toBe(0)
    expect(loss.evaporationUpperW).toBe(0)
    expect(loss.totalW).toBeLessThan(0)
  })

  it('rises with the water, falls with the room and with thicker walls, and its upper figure is never the lower', () => {
    const temperature = fc.double({ min: 15, max: 34, noNaN: true })
    fc.assert(
      fc.property(
        temperature,
        temperature,
        fc.double({ min: 0.2, max: 0.9, noNaN: true }),
        (waterC, roomC, humidity) => {
          const at = { ...worked, waterC, roomC, relativeHumidity: humidity }
          const loss = tankHeatLoss(at)
          expect(tankHeatLoss({ ...at, waterC: waterC + 0.5 }).totalW).toBeGreaterThan(loss.totalW)
          expect(tankHeatLoss({ ...at, roomC: roomC + 0.5 }).totalW).toBeLessThan(loss.totalW)
          expect(loss.totalUpperW).toBeGreaterThanOrEqual(loss.totalW)
          const thicker = tankHeatLoss({ ...at, boxes: [{ ...box, wallMm: 19 }] })
          expect(Math.abs(thicker.sidesW)).toBeLessThanOrEqual(Math.abs(loss.sidesW))
        },
      ),
    )
  })

  it('refuses what is not a number', () => {
    expect(() => tankHeatLoss({ ...worked, waterC: Number.NaN })).toThrow(RangeError)
    expect(() => tankHeatLoss({ ...worked, boxes: [{ ...box, wallMm: Number.NaN }] })).toThrow(RangeError)
  })
})
