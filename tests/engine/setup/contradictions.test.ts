import { describe, expect, it } from 'vitest'
import { findContradictions } from '#shared/engine/setup/contradictions'
import type { Setup, Specs } from '#shared/engine/types'
import { seedPieces } from '../../../seeds/gear/index'
import { heater, item, toPlain, toSpecs, wholeSetup } from '../build'

type Values = Readonly<Record<string, unknown>>

const paths = (setup: Setup) => findContradictions(setup).map(({ path }) => path)
const volumeOnly = (volumeL: number, values: Values = {}): Setup => ({
  units: 'metric',
  tank: { specs: toSpecs(values, 'measured'), volumeL },
  items: [],
})
const rear = (sizes: Values) => ({ chambers: [{ id: 'rear', lengthMm: 100, widthMm: 100, ...sizes }] })

describe('a setup that contradicts itself', () => {
  it('is not the one that these tests start from', () => {
    expect(findContradictions(wholeSetup())).toEqual([])
  })

  it('has a tank of no size and no volume', () => {
    expect(paths({ units: 'us', tank: { specs: {} }, items: [] })).toEqual(['tank'])
    expect(paths({ units: 'us', tank: { specs: toSpecs({ outerLengthMm: 600 }) }, items: [] })).toEqual(['tank'])
    expect(paths({ units: 'us', tank: { specs: toSpecs({ nominalVolumeL: 60 }) }, items: [] })).toEqual([])
    expect(paths(volumeOnly(60))).toEqual([])
  })

  const tankCases: readonly (readonly [string, Values, string])[] = [
    ['walls that leave no inside', { wallMm: 210 }, 'tank.wallMm'],
    ['a bottom as thick as the tank is high', { bottomMm: 400 }, 'tank.bottomMm'],
    ['water above the inside height', { waterLineMm: 390.1 }, 'tank.waterLineMm'],
    ['a display longer than the inside', { displayLengthMm: 601 }, 'tank.displayLengthMm'],
    ['a display wider than the inside', { displayWidthMm: 401 }, 'tank.displayWidthMm'],
    ['a nominal volume that its outside cannot hold', { nominalVolumeL: 115 }, 'tank.nominalVolumeL'],
    ['a nominal volume far below its outside', { nominalVolumeL: 41 }, 'tank.nominalVolumeL'],
    ['a chamber longer than the inside', rear({ lengthMm: 601 }), 'tank.chambers.0.lengthMm'],
    ['a chamber wider than the inside', rear({ widthMm: 401 }), 'tank.chambers.0.widthMm'],
    ['a chamber deeper than the inside', rear({ waterDepthMm: 391 }), 'tank.chambers.0.waterDepthMm'],
    ['a chamber higher than the inside', rear({ heightMm: 391 }), 'tank.chambers.0.heightMm'],
    ['water above the chamber’s height', rear({ waterDepthMm: 301, heightMm: 300 }), 'tank.chambers.0.waterDepthMm'],
    ['an opening longer than its chamber', rear({ openingLengthMm: 101 }), 'tank.chambers.0.openingLengthMm'],
    ['an opening wider than its chamber', rear({ openingWidthMm: 101 }), 'tank.chambers.0.openingWidthMm'],
    [
      'chambers longer together than the inside',
      {
        chambers: [
          { id: 'a', lengthMm: 301, widthMm: 90 },
          { id: 'b', lengthMm: 300, widthMm: 90 },
        ],
      },
      'tank.chambers',
    ],
    [
      'two chambers of one name',
      {
        chambers: [
          { id: 'a', lengthMm: 100 },
          { id: 'a', lengthMm: 100 },
        ],
      },
      'tank.chambers.1.id',
    ],
  ]
  it.each(tankCases)('has %s', (_, values, path) => {
    expect(paths(wholeSetup(values))).toEqual([path])
  })

  it('allows each of those at its limit', () => {
    const atLimit: readonly Values[] = [
      { waterLineMm: 390 },
      { displayLengthMm: 600, displayWidthMm: 400 },
      { nominalVolumeL: 114 },
      { nominalVolumeL: 42 },
      rear({
        lengthMm: 600,
        widthMm: 400,
        waterDepthMm: 390,
        heightMm: 390,
        openingLengthMm: 600,
        openingWidthMm: 400,
      }),
      {
        chambers: [
          { id: 'a', lengthMm: 300, widthMm: 90 },
          { id: 'b', lengthMm: 300.05, widthMm: 90 },
        ],
      },
    ]
    for (const values of atLimit) expect(paths(wholeSetup(values)), JSON.stringify(values)).toEqual([])
  })

  const setupCases: readonly (readonly [string, Partial<Setup>, string])[] = [
    ['a coldest room warmer than the usual one', { room: { coldestC: 22, temperatureC: 21 } }, 'room.coldestC'],
    ['a usual room warmer than the warmest', { room: { temperatureC: 30, warmestC: 29 } }, 'room.warmestC'],
    ['a coldest room warmer than the warmest', { room: { coldestC: 25, warmestC: 24 } }, 'room.warmestC'],
    ['a tank that reaches through the ceiling', { room: { tankTopMm: 2500, ceilingMm: 2400 } }, 'room.tankTopMm'],
    ['a tank that reaches into the floor', { room: { tankTopMm: 390 } }, 'room.tankTopMm'],
    ['sand up to the water line', { goals: { sandDepthMm: 350 } }, 'goals.sandDepthMm'],
    ['rock that leaves no water', { goals: { rockKg: 2.7 * 84 } }, 'goals.rockKg'],
    ['a least turnover above the greatest', { goals: { turnoverPerHour: [9, 3] } }, 'goals.turnoverPerHour'],
    ['two items of one name', { items: [item('a', heater()), item('a', heater())] }, 'items.1.id'],
    [
      'an item in a chamber that is not there',
      { items: [item('a', heater(), { place: { chamber: 'attic' } })] },
      'items.0.place.chamber',
    ],
  ]
  it.each(setupCases)('has %s', (_, rest, path) => {
    expect(paths(wholeSetup({}, rest))).toEqual([path])
  })

  it('has its sump and display as places, where there are any', () => {
    const at = (chamber: string, tank: Values) =>
      paths(wholeSetup(tank, { items: [item('a', heater(), { place: { chamber } })] }))
    expect(at('display', {})).toEqual([])
    expect(at('sump', { filtration: 'sump' })).toEqual([])
    expect(at('sump', {})).toEqual(['items.0.place.chamber'])
  })

  it('is told of everything at once', () => {
    const setup = wholeSetup(
      {
        waterLineMm: 395,
        chambers: [
          { id: 'a', lengthMm: 700 },
          { id: 'a', waterDepthMm: 500 },
        ],
      },
      {
        room: { coldestC: 30, temperatureC: 20 },
        goals: { rockKg: 900, turnoverPerHour: [5, 1] },
        items: [item('x', heater()), item('x', heater(), { place: { chamber: 'b' } })],
      },
    )
    expect(new Set(paths(setup))).toEqual(
      new Set([
        'tank.waterLineMm',
        'tank.chambers.0.lengthMm',
        'tank.chambers.1.waterDepthMm',
        'tank.chambers',
        'tank.chambers.1.id',
        'room.coldestC',
        'goals.rockKg',
        'goals.turnoverPerHour',
        'items.1.id',
        'items.1.place.chamber',
      ]),
    )
    const shell = wholeSetup(
      { wallMm: 300 },
      { room: { coldestC: 30, temperatureC: 20 }, items: [item('x', heater()), item('x', heater())] },
    )
    expect(paths(shell)).toEqual(['tank.wallMm', 'room.coldestC', 'items.1.id'])
  })

  it('is described in the setup’s own units', () => {
    const detail = (units: 'us' | 'metric') =>
      toPlain(findContradictions({ ...wholeSetup(rear({ lengthMm: 650 })), units })[0]?.detail)
    expect(detail('metric')).toBe('650 mm is more than the tank’s inside length (600 mm).')
    expect(detail('us')).toBe('25.6 in is more than the tank’s inside length (23.6 in).')
  })
})

describe('a tank known by its volume', () => {
  it('stretches for its chambers rather than contradicting them', () => {
    for (const sizes of [
      { waterDepthMm: 600 },
      { heightMm: 700 },
      { lengthMm: 900 },
      { waterDepthMm: 450, heightMm: 460 },
    ])
      expect(paths(volumeOnly(75.7, rear(sizes))), JSON.stringify(sizes)).toEqual([])
  })

  it('says that its inside was assumed where a chamber is too wide for it', () => {
    const [found] = findContradictions(volumeOnly(40, rear({ widthMm: 500 })))
    expect(found?.path).toBe('tank.chambers.0.widthMm')
    expect(found?.detail).toContain('assumed from the volume; give the tank’s outside size')
  })
})

describe('the tanks of the demo data', () => {
  const tanks = seedPieces.filter(({ kind }) => kind === 'tank')

  it('contradict nothing, as first entered and after each revision', () => {
    for (const { brand, model, revisions } of tanks) {
      let specs: Specs = {}
      for (const { values } of revisions) {
        const known = Object.entries({ ...specs, ...values }).filter(([, entry]) => entry !== null)
        specs = Object.fromEntries(known) as Specs
        expect(findContradictions({ units: 'metric', tank: { specs }, items: [] }), `${brand} ${model}`).toEqual([])
      }
    }
    expect(tanks.length).toBeGreaterThan(30)
  })

  it('may be a drawing and somebody’s calipers that are a few millimetres apart, and no more', () => {
    const mixed = (displayLengthMm: number) => ({
      ...wholeSetup(),
      tank: { specs: { ...wholeSetup().tank.specs, ...toSpecs({ displayLengthMm }, 'maker') } },
    })
    // ± 3 mm for a maker's length and ± 1 mm for a measured one, on an inside of 600 mm.
    expect(paths(mixed(604))).toEqual([])
    expect(paths(mixed(604.1))).toEqual(['tank.displayLengthMm'])
  })
})
