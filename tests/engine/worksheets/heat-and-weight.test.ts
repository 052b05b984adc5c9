import { describe, expect, it } from 'vitest'
import { expectWithin, expectWithinShare } from '../../standards/within'
import { refusals, result, stepValue, work, type Body } from './work'

describe('the worksheet of a heat balance', () => {
  // Inside 1.20 × 0.60 m with 0.55 m of water, 12 mm glass, open top, water 26 °C, room 22 °C, humidity 50 %.
  const tank = {
    outerLengthMm: 1224,
    outerWidthMm: 624,
    outerHeightMm: 612,
    wallMm: 12,
    bottomMm: 12,
    waterLineMm: 550,
    material: 'glass',
    lid: 'none',
    filtration: 'none',
  }
  const room = { coldestC: 22, temperatureC: 22, warmestC: 22, relativeHumidity: 0.5 }
  const body = { tank, room, goals: { temperatureC: 26, salinityPpt: 35 }, heaterW: 300, inTankW: 0 }

  it.each([
    ['Through the sides', 55.8],
    ['Through the bottom', 15.8],
    ['From the surface, dry', 28.8],
    ['From the surface, by evaporation', 65.4],
    ['Heat lost', 165.8],
    ['Heat lost, upper figure', 187.5],
  ])('loses %s: %f W', (title, watts) => {
    // Computed by hand from ISO 6946 and EN 572-1, evaporation by ASHRAE (activity 0.5) and Shah 2014; 0.3 %.
    expectWithinShare(stepValue('heat-balance', body, title), watts, 3e-3)
  })

  it('evaporates 2.32 L a day', () => {
    expectWithinShare(result('heat-balance', body, 'evaporationLPerDay'), 2.32, 3e-3)
  })

  it('runs the heater for the share of the time that the need is of its power', () => {
    const found = work('heat-balance', { ...body, inTankW: 40 }).result
    expectWithinShare(found['needW'] as number, 125.8, 5e-3)
    expect(found['needUpperW']).toBeCloseTo((found['lossUpperW'] as number) - (found['gainW'] as number), 9)
    expectWithinShare(found['duty'] as number, 125.8 / 300, 5e-3)
    expect(found['gainW']).toBe(40)
  })

  it('goes to 30.2 °C with 300 W stuck on and the room at 22 °C', () => {
    // By hand: where the loss with ASHRAE’s evaporation is 300 W; ± 0.05 °C.
    const found = work('heat-balance', body).result
    expectWithin(found['stuckOnC'] as number, 30.2, 0.05)
    expect(found['hoursTo34C']).toBeNull()
    const series = found['series'] as { hour: number; tempC: number }[]
    expect(series).toHaveLength(25)
    expect(series[0]).toEqual({ hour: 0, tempC: 26 })
    // It creeps up to where it settles: the time constant is about half a day.
    series.slice(1).forEach(({ tempC }, hour) => expect(tempC).toBeGreaterThan(series[hour]?.tempC ?? Infinity))
    expect(series[24]?.tempC).toBeGreaterThan(29)
    expect(series[24]?.tempC).toBeLessThan(30.2)
  })

  it('warms at first by the power left over the heat capacity, 1.620 MJ/K', () => {
    // The same tank: (300 − 165.8) W × 3600 s over 1.620 MJ/K is 0.298 K in the first hour, a little less as it warms.
    const series = work('heat-balance', body).result['series'] as { tempC: number }[]
    expectWithin(stepValue('heat-balance', body, 'Heat to warm the water by 1 K'), 1.62, 5e-3)
    expectWithin((series[1]?.tempC ?? 0) - 26, 0.298, 0.02)
  })

  it('answers without a heater what is needed, and says nothing of one', () => {
    const { heaterW: _, ...bare } = body
    const found = work('heat-balance', bare).result
    expect(found).toMatchObject({ duty: null, stuckOnC: null, hoursTo30C: null, series: [] })
    expectWithinShare(found['needW'] as number, 165.8, 3e-3)
  })

  it('says that no heater is needed where gear gives enough', () => {
    const found = work('heat-balance', { ...body, inTankW: 500 })
    expect(found.result).toMatchObject({ needW: 0, duty: 0 })
    expect(found.cautions).toContain('No heater is needed at these temperatures.')
  })

  it('names what contradicts itself, and a shape that it cannot compute', () => {
    expect(refusals('heat-balance', { tank: {} })).toEqual(['tank'])
    expect(refusals('heat-balance', { ...body, tank: { ...tank, wallMm: 400 } })).toEqual(['tank.wallMm'])
    expect(refusals('heat-balance', { ...body, room: { coldestC: 30, warmestC: 20 } })).toContain('room.warmestC')
    expect(refusals('heat-balance', { ...body, tank: { ...tank, shape: 'cylinder' } })).toEqual(['tank.shape'])
  })

  it('takes a volume alone and names every default', () => {
    const keys = work('heat-balance', { tank: { volumeL: 75 }, heaterW: 100 }).assumptions.map(({ key }) => key)
    expect(keys).toEqual(
      expect.arrayContaining(['tank.outerLengthMm', 'room.coldestC', 'goals.temperatureC', 'inTankW']),
    )
  })

  it('writes its cautions in the reader’s units', () => {
    const weak = { ...body, heaterW: 20 }
    expect(work('heat-balance', weak, 'us').cautions.join(' ')).toMatch(/cannot hold 79\s°F with the room at 72\s°F/)
    expect(work('heat-balance', weak, 'metric').cautions.join(' ')).toMatch(/cannot hold 26\s°C/)
  })
})

describe('the worksheet of a filled tank', () => {
  // 1.2 × 0.6 × 0.6 m outside, 12 mm glass, 95 % full, salinity 35, a stand of 50 kg; by hand, 0.1 %.
  const body = {
    tank: {
      outerLengthMm: 1200,
      outerWidthMm: 600,
      outerHeightMm: 600,
      wallMm: 12,
      bottomMm: 12,
      waterLineMm: 0.95 * 588,
      material: 'glass',
    },
    temperatureC: 25,
    salinityPpt: 35,
    rockKg: 0,
    sandDepthMm: 0,
    standKg: 50,
  }

  it.each([
    // EN 572-1: 2500 kg/m³.
    ['shellKg', 84.26],
    // EOS-80.
    ['waterKg', 387.2],
    ['totalKg', 471.46],
    // 521.5 kg × 9.80665 m/s² over 0.72 m².
    ['floorKPa', 7.1],
  ])('gives %s: %f', (key, expected) => {
    expectWithinShare(result('filled-weight', body, key), expected, 1e-3)
  })

  it('presses less on the floor under a larger stand, in proportion', () => {
    const wide = { ...body, standLengthMm: 1400, standWidthMm: 720 }
    expectWithinShare(result('filled-weight', wide, 'floorKPa'), (7.1 * 1200 * 600) / (1400 * 720), 1e-3)
  })

  it('names what it took where nobody said what the stand weighs or how large it is', () => {
    const { standKg: _, ...unsaid } = body
    const taken = (more: Body) => {
      const { assumptions, cautions } = work('filled-weight', { ...unsaid, ...more })
      const own = assumptions.filter(({ key }) => key.startsWith('stand')).map(({ key, value }) => [key, value])
      return [Object.fromEntries(own), /The tank’s own (\w+) was taken/.exec(cautions.join(' '))?.[1]]
    }
    expect(taken({})).toEqual([{ standKg: 0, standLengthMm: 1200, standWidthMm: 600 }, 'footprint'])
    expect(taken({ standKg: 50, standLengthMm: 1400 })).toEqual([{ standWidthMm: 600 }, 'width'])
    expect(taken({ standKg: 50, standWidthMm: 720 })).toEqual([{ standLengthMm: 1200 }, 'length'])
    expect(taken({ standKg: 50, standLengthMm: 1400, standWidthMm: 720 })).toEqual([{}, undefined])
  })

  it('counts rock and sand, and takes the water away that they displace', () => {
    // 27 kg of rock at 2.7 kg/L takes the place of 10 L of water of 1.0233 kg/L.
    const [bare, filled] = [work('filled-weight', body).result, work('filled-weight', { ...body, rockKg: 27 }).result]
    expectWithin((bare['waterKg'] as number) - (filled['waterKg'] as number), 10.233, 1e-2)
    expect(filled['rockKg']).toBe(27)
  })

  it('refuses sand deeper than the water', () => {
    expect(refusals('filled-weight', { ...body, sandDepthMm: 590 })).toEqual(['sandDepthMm'])
  })
})

describe('the worksheet of watts and plugs', () => {
  const circuit = { volts: 120, circuitA: 15 }
  const items = [
    { powerW: 100, quantity: 2 },
    { powerW: 40, plugs: 2 },
  ]

  it.each([
    [15, 1440],
    [20, 1920],
  ])('lets a circuit of %d A at 120 V run %d W without pause', (circuitA, limitW) => {
    // NEC (NFPA 70) 210.19(A)(1), 210.20(A): four fifths, by hand.
    expect(result('power-load', { items, circuit: { volts: 120, circuitA } }, 'limitW')).toBeCloseTo(limitW, 9)
  })

  it('adds up watts, amps, plugs and the share', () => {
    const found = work('power-load', { items, circuit, strip: { ratedA: 10, outlets: 3 } })
    expect(found.result).toMatchObject({ watts: 240, amps: 2, plugsUsed: 4, limitW: 960, share: 0.25 })
    expect(found.cautions.join(' ')).toMatch(/1 more outlet/)
  })

  it('says where it is too much for hours, and where it is too much at all', () => {
    const at = (powerW: number) => work('power-load', { items: [{ powerW }], circuit }).cautions[0]
    expect(at(1500)).toMatch(/too much to run for hours/)
    expect(at(1900)).toMatch(/more than the 1800\sW/)
  })
})
