import { Engine } from 'json-rules-engine'
import { fit } from '#shared/engine/fit'
import { lossAt } from '#shared/engine/heat-budget'
import { resolve } from '#shared/engine/setup/resolve'
import type { Piece, Setup } from '#shared/engine/types'
import { createSlug } from '../../server/modules/gear/slug'
import { generatePieces } from '../generate-catalogue/generate-pieces'
import { summarise } from './figures.mjs'

const heaters = 10_000

const catalogue: readonly Piece[] = [...generatePieces({ pieces: heaters, heaterShare: 1 })].map(
  ({ kind, brand, model, revisions: [revision] }): Piece => ({
    kind,
    gear: { slug: createSlug(brand, model), brand, model },
    specs: Object.fromEntries(
      Object.entries(revision?.values ?? {}).flatMap(([key, value]) =>
        value ? [[key, { value: value.value, source: value.source }]] : [],
      ),
    ),
  }),
)

function describeSetup(index: number): Setup {
  const chambers = [{ id: 'rear', lengthMm: 100 + (index % 17), widthMm: 110, waterDepthMm: 280 + (index % 29) }]
  return {
    units: 'metric',
    tank: { specs: { chambers: { value: chambers, source: 'measured' } }, volumeL: 75 + index / 10 },
    room: { coldestC: 16 + (index % 31) / 10 },
    items: [],
  }
}

interface Limits {
  readonly waterDepthMm: number
  readonly heightMm: number
  readonly leanMm: number
  readonly acrossMm: number
  readonly leastW: number
  readonly mostW: number
  readonly ratedL: number
  readonly volts: number
}

/** What a setup comes down to for heaters; both yardsticks are given it ready. */
function findLimits(setup: Setup): Limits {
  const plan = resolve(setup)
  const [chamber] = plan.tank.chambers
  if (!chamber) throw new Error('The setup has no chamber')
  const { totalW, totalUpperW } = lossAt(plan, plan.goals.temperatureC, plan.room.coldestC)
  return {
    waterDepthMm: chamber.waterDepthMm,
    heightMm: chamber.heightMm,
    leanMm: Math.hypot(chamber.lengthMm, chamber.widthMm, chamber.waterDepthMm),
    acrossMm: Math.min(chamber.lengthMm, chamber.widthMm) - 20,
    leastW: totalUpperW,
    mostW: Math.max(6 * totalW, 3 * plan.tank.waterL),
    ratedL: plan.tank.ratedL,
    volts: plan.mains.volts,
  }
}

interface Heater {
  readonly lengthMm: number
  readonly diameterMm: number
  readonly powerW: number
  readonly immersionMm: number
  readonly ratedMostL: number
  readonly volts: readonly number[]
}

function readHeater({ specs }: Piece): Heater | null {
  const read = (key: string) => specs[key]?.value as number | undefined
  const lengthMm = read('lengthMm')
  const diameterMm = read('diameterMm')
  const powerW = read('powerW')
  if (lengthMm === undefined || diameterMm === undefined || powerW === undefined) return null
  const immersionMm = read('minImmersionMm') ?? lengthMm
  const ratedMostL = 1.2 * (read('ratedVolumeMaxL') ?? Infinity)
  const volts = (specs['volts']?.value as readonly number[] | undefined) ?? []
  return { lengthMm, diameterMm, powerW, immersionMm, ratedMostL, volts }
}

/** What a heater's checks come down to, written out by hand: compared, counted, and nothing kept to be explained. */
function countByHand(setup: Setup): number {
  const limits = findLimits(setup)
  let fits = 0
  for (const piece of catalogue) {
    const heater = readHeater(piece)
    if (!heater) continue
    const { lengthMm, diameterMm, powerW } = heater
    const stands = heater.immersionMm <= limits.waterDepthMm && lengthMm <= limits.heightMm
    const leans = lengthMm + diameterMm <= limits.leanMm
    const isRightHeat = powerW >= limits.leastW && powerW <= limits.mostW
    const isRated = limits.ratedL <= heater.ratedMostL
    const isSafe = heater.volts.includes(limits.volts)
    if ((stands || leans) && diameterMm <= limits.acrossMm && isRightHeat && isRated && isSafe) fits += 1
  }
  return fits
}

const reaches = (fact: string, operator: string, limit: string) => ({ fact, operator, value: { fact: limit } })

/** The same in a library for rules written as data; a fact of each piece is what the loop by hand compares. */
const library = new Engine(
  [
    {
      event: { type: 'fits' },
      conditions: {
        all: [
          {
            any: [
              {
                all: [
                  reaches('immersionMm', 'lessThanInclusive', 'waterDepthMm'),
                  reaches('lengthMm', 'lessThanInclusive', 'heightMm'),
                ],
              },
              reaches('leaningMm', 'lessThanInclusive', 'leanMm'),
            ],
          },
          reaches('diameterMm', 'lessThanInclusive', 'acrossMm'),
          reaches('powerW', 'greaterThanInclusive', 'leastW'),
          reaches('powerW', 'lessThanInclusive', 'mostW'),
          reaches('ratedMostL', 'greaterThanInclusive', 'ratedL'),
          reaches('heaterVolts', 'contains', 'volts'),
        ],
      },
    },
  ],
  { replaceFactsInEventParams: false },
)

async function countByLibrary(setup: Setup): Promise<number> {
  const limits = findLimits(setup)
  let fits = 0
  for (const piece of catalogue) {
    const heater = readHeater(piece)
    if (!heater) continue
    const { volts: heaterVolts, ...facts } = heater
    const leaningMm = facts.lengthMm + facts.diameterMm
    const { events } = await library.run({ ...limits, ...facts, leaningMm, heaterVolts })
    fits += events.length
  }
  return fits
}

async function time(times: number, work: (index: number) => unknown) {
  for (let index = 0; index < Math.ceil(times / 3); index += 1) await work(1000 + index)
  const taken: number[] = []
  for (let index = 0; index < times; index += 1) {
    const startedMs = performance.now()
    await work(index)
    taken.push(performance.now() - startedMs)
  }
  return summarise(taken)
}

const [byHand, byLibrary] = [countByHand(describeSetup(0)), await countByLibrary(describeSetup(0))]
if (byHand !== byLibrary) throw new Error(`The yardsticks disagree: ${byHand} and ${byLibrary} heaters fit`)

const engine = await time(30, (index) => fit(describeSetup(index), 'heater', catalogue, { limit: 10, offset: 0 }))
const loop = await time(30, (index) => countByHand(describeSetup(index)))
const rules = await time(3, (index) => countByLibrary(describeSetup(index)))
process.stdout.write(JSON.stringify({ heaters, engine, loop, rules }))
