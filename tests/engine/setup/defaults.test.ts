import { describe, expect, it } from 'vitest'
import { resolve } from '#shared/engine/setup/resolve'
import type { Setup } from '#shared/engine/types'
import { tankHeatLoss } from '#shared/engine/physics/heat'
import { toSpecs } from '../build'

type Values = Readonly<Record<string, unknown>>

const bare = (tank: Values = {}, rest: Partial<Setup> = {}): Setup => ({
  units: 'metric',
  tank: { specs: toSpecs({ outerLengthMm: 600, outerWidthMm: 400, outerHeightMm: 400, ...tank }, 'measured') },
  items: [],
  ...rest,
})
const plan = (tank?: Values, rest?: Partial<Setup>) => resolve(bare(tank, rest))

// Common practice throughout, as the method page states it.
describe('what is taken where nobody said', () => {
  it('is a glass box whose walls grow with its height', () => {
    for (const [heightMm, wallMm] of [
      [350, 6],
      [351, 8],
      [450, 8],
      [451, 10],
      [550, 10],
      [551, 12],
      [900, 12],
    ] as const) {
      const { tank } = plan({ outerHeightMm: heightMm })
      expect([tank.wallMm, tank.bottomMm], `${heightMm} mm`).toEqual([wallMm, wallMm])
    }
    expect(plan({ wallMm: 15 }).tank.bottomMm).toBe(15)
    expect(plan().tank).toMatchObject({
      material: 'glass',
      rim: 'rimless',
      lid: 'none',
      shape: 'rectangle',
      waterLineMm: 368,
    })
  })

  it('is a display of the whole inside, less the widest chamber', () => {
    expect(plan().tank).toMatchObject({ displayLengthMm: 584, displayWidthMm: 384, filtration: 'none' })
    const chambers = [
      { id: 'a', widthMm: 90 },
      { id: 'b', widthMm: 110 },
    ]
    expect(plan({ chambers }).tank).toMatchObject({ displayWidthMm: 274, filtration: 'rear-chambers' })
    expect(plan({ chambers, displayWidthMm: 260 }).tank.displayWidthMm).toBe(260)
  })

  it('is a sump of 0.6 by 0.7 of the tank with 250 mm of water, where there is one', () => {
    const [, sump] = plan({ filtration: 'sump' }).tank.boxes
    expect(sump).toMatchObject({ insideLengthMm: 360, insideWidthMm: 280, waterDepthMm: 250, wallMm: 6 })
    expect(plan({ sump: { lengthMm: 400, widthMm: 250, waterDepthMm: 200 } }).tank.filtration).toBe('sump')
    expect(plan().tank.boxes).toHaveLength(1)
  })

  it('is a room of 21, 18 and 28 °C, half humid, 2.4 m high', () => {
    expect(plan().room).toEqual({
      temperatureC: 21,
      coldestC: 18,
      warmestC: 28,
      relativeHumidity: 0.5,
      ceilingMm: 2400,
      tankTopMm: 750 + 400,
    })
  })

  it('gives way to what was said of the room', () => {
    const room = (given: Partial<Setup['room']>) => {
      const { temperatureC, coldestC, warmestC } = plan({}, { room: given ?? {} }).room
      return [coldestC, temperatureC, warmestC]
    }
    expect(room({ temperatureC: 16 })).toEqual([16, 16, 28])
    expect(room({ temperatureC: 30 })).toEqual([18, 30, 30])
    expect(room({ coldestC: 23 })).toEqual([23, 23, 28])
    expect(room({ warmestC: 20 })).toEqual([18, 20, 20])
    expect(room({ warmestC: 15 })).toEqual([15, 15, 15])
    expect(room({ coldestC: 10, warmestC: 19 })).toEqual([10, 19, 19])
  })

  it('is 120 V without a country, and what a country has with one', () => {
    const mains = (country?: string, given: Setup['mains'] = {}) => {
      const { volts, circuitA, plugType } = plan({}, { ...(country && { country }), mains: given }).mains
      return [volts, circuitA, plugType]
    }
    expect(mains()).toEqual([120, 15, 'A/B'])
    expect(mains('US')).toEqual([120, 15, 'A/B'])
    expect(mains('GB')).toEqual([230, 13, 'G'])
    expect(mains('gb')).toEqual([230, 13, 'G'])
    expect(mains('DE')).toEqual([230, 16, 'F'])
    expect(mains('AU')).toEqual([230, 10, 'I'])
    expect(mains('JP')).toEqual([100, 15, 'A/B'])
    expect(mains(undefined, { volts: 230 })).toEqual([230, 13, 'G'])
    expect(mains(undefined, { plugType: 'F' })).toEqual([230, 16, 'F'])
    expect(mains(undefined, { volts: 100 })).toEqual([100, 15, 'A/B'])
    expect(mains('DE', { circuitA: 10 })).toEqual([230, 10, 'F'])
    expect(plan().mains).toMatchObject({ outlets: 2, residualCurrentProtected: false })
  })

  it('takes a known country’s voltage and plug for said', () => {
    const assumed = (country?: string) => [...plan({}, country ? { country } : {}).assumed.keys()]
    expect(assumed('GB')).not.toEqual(expect.arrayContaining(['mains.volts']))
    expect(assumed('GB')).toEqual(expect.arrayContaining(['mains.circuitA', 'mains.outlets']))
    expect(assumed()).toEqual(expect.arrayContaining(['mains.volts', 'mains.plugType', 'mains.circuitA']))
  })

  it('is 25.5 °C, 35 ppt, soft and large-polyp corals, 40 mm of sand and 0.12 kg of rock for each litre', () => {
    const { goals, tank } = plan()
    expect(goals).toMatchObject({
      temperatureC: 25.5,
      salinityPpt: 35,
      coral: ['soft', 'lps'],
      sandDepthMm: 40,
      appControl: false,
      switchedOutlets: 0,
    })
    expect(goals.rockKg).toBeCloseTo(0.12 * tank.grossL, 9)
    expect(plan({ filtration: 'sump' }).goals.turnoverPerHour).toEqual([3, 10])
    expect(plan({ filtration: 'rear-chambers' }).goals.turnoverPerHour).toEqual([4, 12])
  })

  it('is tap water of 350 kPa, 15 °C and 250 ppm, and a weekly change of 15 % with what evaporates', () => {
    const { water, tank, room, goals } = plan()
    expect(water).toMatchObject({ feedKPa: 350, feedTempC: 15, feedTdsPpm: 250 })
    const { evaporationLPerDay } = tankHeatLoss({
      boxes: tank.boxes,
      lid: tank.lid,
      waterC: goals.temperatureC,
      roomC: room.temperatureC,
      relativeHumidity: 0.5,
    })
    expect(water.litresPerWeek).toBeCloseTo(0.15 * tank.waterL + 7 * evaporationLPerDay, 9)
  })

  it('names each default, and none that was said', () => {
    const { assumed } = plan({ wallMm: 8 }, { room: { coldestC: 17 }, goals: { temperatureC: 25 } })
    for (const path of ['tank.wallMm', 'tank.outerLengthMm', 'room.coldestC', 'goals.temperatureC'])
      expect(assumed.has(path), path).toBe(false)
    for (const path of ['tank.bottomMm', 'tank.waterLineMm', 'room.temperatureC', 'goals.sandDepthMm', 'water.feedKPa'])
      expect(assumed.has(path), path).toBe(true)
  })

  it('cannot be a tank of neither size nor volume', () => {
    expect(() => resolve({ units: 'us', tank: { specs: {} }, items: [] })).toThrow(RangeError)
  })
})
