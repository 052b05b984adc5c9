import fc from 'fast-check'
import { describe, expect, it } from 'vitest'
import { systemHeadM } from '#shared/engine/physics/flow'
import {
  findOperatingPoint,
  pumpHeadM,
  readPumpCurve,
  slowPump,
  slowPumpPowerW,
  type PumpCurve,
} from '#shared/engine/physics/pump'
import { expectWithin } from './within'

function read(...points: [headM: number, flowLph: number][]): PumpCurve {
  const curve = readPumpCurve(points.map(([headM, flowLph]) => ({ headM, flowLph })))
  if (curve === null) throw new Error('too few points')
  return curve
}

describe('an operating point', () => {
  it('of H0 4 m, Qm 6000 L/h against 1.2 m + 5e-8 Q² is 4168.85 L/h at 2.06897 m', () => {
    // Closed form √((H0 − Hs)/(H0/Qm² + k)), by hand.
    const { flowLph, headM } = findOperatingPoint(read([0, 6000], [4, 0]), (flow) => 1.2 + 5e-8 * flow * flow)
    expectWithin(flowLph, 4168.85, 0.005)
    expectWithin(headM, 2.06897, 5e-6)
  })

  it('is where a fine scan of flows finds it', () => {
    const curve = read([3.2, 0], [2.9, 800], [2.2, 1700], [1.1, 2600], [0, 3100])
    const system = (flow: number) => systemHeadM(flow, 0.6, { boreMm: 20, lengthMm: 1800, fittingsK: 3 })
    let scanned = 0
    while (pumpHeadM(curve, scanned + 0.1) >= system(scanned + 0.1)) scanned += 0.1
    expect(scanned).toBeGreaterThan(500)
    expectWithin(findOperatingPoint(curve, system).flowLph, scanned, 0.1)
  })

  it('is no flow at all when the water stands higher than the pump can lift it', () => {
    expect(findOperatingPoint(read([1, 0], [0, 1000]), () => 1.5)).toEqual({ flowLph: 0, headM: 1 })
  })

  it('never claims more than the curve does', () => {
    expect(findOperatingPoint(read([3, 0], [2.5, 500], [2, 1000]), () => 0.1).flowLph).toBe(1000)
  })

  it('moves down with lift and up with speed', () => {
    const curve = read([3.2, 0], [2.2, 1700], [0, 3100])
    const at = (lift: number, speed: number) =>
      findOperatingPoint(slowPump(curve, speed), (flow) => lift + 1e-7 * flow * flow).flowLph
    fc.assert(
      fc.property(
        fc.double({ min: 0, max: 2, noNaN: true }),
        fc.double({ min: 0.8, max: 0.99, noNaN: true }),
        (lift, speed) => {
          expect(at(lift + 0.05, 1)).toBeLessThan(at(lift, 1))
          expect(at(lift, speed)).toBeLessThan(at(lift, 1))
        },
      ),
    )
  })
})

describe('a pump curve', () => {
  it('runs straight between points and as a parabola through only two', () => {
    expect(pumpHeadM(read([4, 0], [3, 1000], [0, 2000]), 1500)).toBe(1.5)
    expect(pumpHeadM(read([4, 0], [0, 2000]), 1000)).toBe(3)
    expect(pumpHeadM(read([0, 2000], [4, 0]), 1000)).toBe(3)
  })

  it('never has more head at more flow, whatever was typed', () => {
    const curve = read([3, 0], [5, 500], [2, 1000], [0, 1500])
    expect(pumpHeadM(curve, 500)).toBe(3)
    expect(readPumpCurve([{ headM: 3, flowLph: 0 }])).toBeNull()
    expect(
      readPumpCurve([
        { headM: 3, flowLph: 0 },
        { headM: 2, flowLph: 0 },
      ]),
    ).toBeNull()
  })
})

describe('a pump slowed down', () => {
  it('from 3500 to 1700 rpm goes from 400 gpm, 126 ft and 17.5 hp to 194.2857, 29.7257 and 2.00531', () => {
    // Flow of Fluids (TP-410M), example 7.33; 1e-5. The laws are ratios: units do not matter.
    const share = 1700 / 3500
    const [point] = slowPump([{ headM: 126, flowLph: 400 }], share)
    expectWithin(point?.flowLph, 194.2857, 5e-5)
    expectWithin(point?.headM, 29.7257, 5e-5)
    expectWithin(slowPumpPowerW(17.5, share), 2.00531, 1e-5)
  })
})
