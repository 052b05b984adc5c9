import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { tankHeatLoss, type TankHeatInput } from '#shared/engine/physics/heat'
import { heatCapacityJK } from '#shared/engine/physics/seawater'
import {
  findEquilibriumC,
  stuckOn,
  timeToTemperatureH,
  warmWithoutEvaporationC,
  type HeatedTank,
} from '#shared/engine/physics/stuck-on'
import { expectWithin, expectWithinShare } from './within'

/** Inside 1.20 × 0.60 m, 0.55 m of water, 12 mm glass, open, in a room of 22 °C at 50 %: the worked tank. */
const tank: TankHeatInput = {
  boxes: [{ insideLengthMm: 1200, insideWidthMm: 600, waterDepthMm: 550, wallMm: 12, bottomMm: 12, material: 'glass' }],
  lid: 'none',
  waterC: 26,
  roomC: 22,
  relativeHumidity: 0.5,
}
const heatCapacity = heatCapacityJK(396, 35, 26)
const withEvaporation = (inputW: number): HeatedTank => ({
  heatCapacityJK: heatCapacity,
  inputW,
  lossW: (waterC) => tankHeatLoss({ ...tank, waterC }).totalW,
})
const conductionWK = (tankHeatLoss(tank).totalW - tankHeatLoss(tank).evaporationW) / 4
const withoutEvaporation = (inputW: number): HeatedTank => ({
  heatCapacityJK: heatCapacity,
  inputW,
  lossW: (waterC) => conductionWK * (waterC - tank.roomC),
})

/** Independent of the code under test: small explicit steps of ten seconds. */
function stepTo({ heatCapacityJK, inputW, lossW }: HeatedTank, startC: number, hours: number): number {
  let waterC = startC
  for (let second = 0; second < hours * 3600; second += 10) waterC += (10 * (inputW - lossW(waterC))) / heatCapacityJK
  return waterC
}

describe('a heater stuck on in the worked tank', () => {
  // Worked by hand for 300 W: C 1.620 MJ/K, UA 25.10 W/K, τ 17.9 h; tolerances as stated there.
  it('warms it at 0.667 K an hour at first', () => {
    expectWithinShare(heatCapacity, 1.62e6, 3e-3)
    expectWithinShare((300 / heatCapacity) * 3600, 0.667, 3e-3)
    const shortly = stuckOn(withoutEvaporation(300), 22).series[1]
    expectWithinShare(((shortly?.waterC ?? 0) - 22) / (shortly?.hours ?? 0), 0.667, 0.05)
  })

  it('settles 11.95 K above the room if nothing evaporates', () => {
    expectWithin(findEquilibriumC(withoutEvaporation(300)) - 22, 11.95, 0.05)
  })

  it('settles at 30.2 °C with evaporation', () => {
    expectWithin(stuckOn(withEvaporation(300), 22).equilibriumC, 30.2, 0.05)
  })

  it('lifts 100 litres by 1 K in 1.136 hours at 100 W without losses', () => {
    // 0.11364 kWh, from UNESCO 44 density and specific heat.
    const lossless: HeatedTank = { heatCapacityJK: heatCapacityJK(100, 35, 25), inputW: 100, lossW: () => 0 }
    expectWithin(timeToTemperatureH(lossless, 25, 26), 1.136, 0.001)
  })
})

describe('the course of warming', () => {
  it('follows the closed form where nothing evaporates', () => {
    for (const { hours, waterC } of stuckOn(withoutEvaporation(300), 22).series) {
      expectWithin(waterC, warmWithoutEvaporationC(300, conductionWK, heatCapacity, 22, hours), 1e-6)
    }
    const oneTau = heatCapacity / conductionWK / 3600
    expectWithinShare(oneTau, 17.9, 3e-3)
    const at = 22 + (300 / conductionWK) * (1 - Math.exp(-1))
    expectWithinShare(timeToTemperatureH(withoutEvaporation(300), 22, at), oneTau, 1e-9)
  })

  it('follows small steps with evaporation, warming and cooling', () => {
    for (const [watts, startC] of [
      [300, 26],
      [900, 24],
      [40, 33],
    ] as const) {
      const heated = withEvaporation(watts)
      const { series } = stuckOn(heated, startC)
      for (const point of [series[8], series[24]]) {
        expectWithin(point?.waterC, stepTo(heated, startC, point?.hours ?? 0), 0.003)
      }
    }
  })

  it('gives the hours to 30 and 34 °C, and null for what is never reached', () => {
    const warm = stuckOn(withEvaporation(900), 26)
    expect(warm.hoursTo30C).not.toBeNull()
    expectWithin(stepTo(withEvaporation(900), 26, warm.hoursTo30C ?? 0), 30, 0.003)
    expectWithin(stepTo(withEvaporation(900), 26, warm.hoursTo34C ?? 0), 34, 0.003)
    expect(stuckOn(withEvaporation(300), 26).hoursTo34C).toBeNull()
    expect(stuckOn(withEvaporation(300), 31).hoursTo30C).toBe(0)
  })

  it('settles where loss and input balance, hotter for more watts', () => {
    fc.assert(
      fc.property(fc.double({ min: 0, max: 1500, noNaN: true }), (watts) => {
        const heated = withEvaporation(watts)
        const equilibrium = findEquilibriumC(heated)
        expectWithin(heated.lossW(equilibrium), watts, 1e-6)
        expect(findEquilibriumC(withEvaporation(watts + 10))).toBeGreaterThan(equilibrium)
      }),
    )
  })

  it('ends at the boiling point however strong the heater', () => {
    const boiling = stuckOn(withEvaporation(2e4), 26)
    expect(boiling.equilibriumC).toBe(100)
    expectWithin(stepTo(withEvaporation(2e4), 26, boiling.hoursTo34C ?? 0), 34, 0.15)
  })

  it('stays where it is when it starts in balance', () => {
    const heated = withEvaporation(300)
    expect(stuckOn(heated, findEquilibriumC(heated)).series).toHaveLength(1)
  })
})
