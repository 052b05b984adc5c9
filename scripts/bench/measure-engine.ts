import { fit } from '#shared/engine/fit'
import { lossAt } from '#shared/engine/heat-budget'
import { resolve } from '#shared/engine/setup/resolve'
import type { Piece, Setup } from '#shared/engine/types'
import { createSlug } from '../../server/modules/gear/slug'
import { generatePieces } from '../generate-catalogue/generate-pieces'
import { summarise } from './figures.mjs'

const heaters = 10_000
const calls = 30

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

/** What a heater's checks come down to, written out by hand: compared, counted, and nothing kept to be explained. */
function countByHand(setup: Setup): number {
  const plan = resolve(setup)
  const [chamber] = plan.tank.chambers
  if (!chamber) throw new Error('The setup has no chamber')
  const { totalW, totalUpperW } = lossAt(plan, plan.goals.temperatureC, plan.room.coldestC)
  const mostW = Math.max(6 * totalW, 3 * plan.tank.waterL)
  const acrossMm = Math.min(chamber.lengthMm, chamber.widthMm)
  let fits = 0
  for (const { specs } of catalogue) {
    const read = (key: string) => specs[key]?.value as number | undefined
    const lengthMm = read('lengthMm')
    const diameterMm = read('diameterMm')
    const powerW = read('powerW')
    if (lengthMm === undefined || diameterMm === undefined || powerW === undefined) continue
    const stands = (read('minImmersionMm') ?? lengthMm) <= chamber.waterDepthMm && lengthMm <= chamber.heightMm
    const leans = lengthMm <= Math.hypot(chamber.lengthMm, chamber.widthMm, chamber.waterDepthMm) - diameterMm
    const volts = specs['volts']?.value as readonly number[] | undefined
    const isRated = plan.tank.ratedL <= 1.2 * (read('ratedVolumeMaxL') ?? Infinity)
    const isRightHeat = powerW >= totalUpperW && powerW <= mostW
    if ((stands || leans) && diameterMm + 20 <= acrossMm && isRightHeat && isRated && volts?.includes(plan.mains.volts))
      fits += 1
  }
  return fits
}

function time(work: (index: number) => unknown) {
  for (let index = 0; index < 10; index += 1) work(1000 + index)
  const times = Array.from({ length: calls }, (_, index) => {
    const startedMs = performance.now()
    work(index)
    return performance.now() - startedMs
  })
  return summarise(times)
}

const engine = time((index) => fit(describeSetup(index), 'heater', catalogue, { limit: 10, offset: 0 }))
const loop = time((index) => countByHand(describeSetup(index)))
process.stdout.write(JSON.stringify({ heaters, engine, loop }))
