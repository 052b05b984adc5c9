import { readNumber } from '../values'
import type { Goals, Item, Mains, Room, Setup, Water } from '../types'
import { evaporationLPerDay } from '../physics/heat'
import { chooseMains, defaults, hasKnownMains } from './defaults'
import type { Plan, TankPlan } from './plan'
import { resolveTank } from './tank'

type Assumed = number | string | boolean | readonly string[] | readonly number[]

/** Mass in kg of what the items of a kind hold, or undefined where there are none or one has no pack size. */
function packMassKg(items: readonly Item[], kind: 'rock' | 'sand'): number | undefined {
  const packs = items.filter((item) => item.piece.kind === kind)
  if (packs.length === 0) return undefined
  return packs.reduce<number | undefined>((sum, { piece, quantity }) => {
    const packKg = readNumber(piece.specs, 'packKg')
    return sum === undefined || packKg === undefined ? undefined : sum + packKg * quantity
  }, 0)
}

/** Mass in kg of a sand bed over the display, usual sand's unless its bulk density (kg/L) is told. */
export const sandMassKg = (
  area: { displayLengthMm: number; displayWidthMm: number },
  depthMm: number,
  bulkDensityKgL: number = defaults.sandBulkDensityKgL,
): number => ((area.displayLengthMm * area.displayWidthMm * depthMm) / 1e6) * bulkDensityKgL

/** Litres of water that rock and sand take the place of; 0 unless the person gave both. */
function displacedL(
  setup: Setup,
  items: readonly Item[],
  area: { displayLengthMm: number; displayWidthMm: number },
): number {
  const rockKg = setup.goals?.rockKg ?? packMassKg(items, 'rock')
  const depthMm = setup.goals?.sandDepthMm
  const sandKg = depthMm === undefined ? packMassKg(items, 'sand') : sandMassKg(area, depthMm)
  if (rockKg === undefined || sandKg === undefined) return 0
  return rockKg / defaults.rockSolidDensityKgL + sandKg / defaults.sandSolidDensityKgL
}

function resolveWater(
  given: Partial<Water> = {},
  tank: TankPlan,
  room: Room,
  goals: Goals,
  assume: <T extends Assumed>(key: string, value: T) => T,
): Water {
  const weekly = () => {
    const evaporatedL = evaporationLPerDay({
      boxes: tank.boxes,
      lid: tank.lid,
      waterC: goals.temperatureC,
      roomC: room.temperatureC,
      relativeHumidity: room.relativeHumidity,
    })
    return defaults.weeklyChangeShare * tank.waterL + 7 * evaporatedL
  }
  return {
    feedKPa: given.feedKPa ?? assume('water.feedKPa', defaults.water.feedKPa),
    feedTempC: given.feedTempC ?? assume('water.feedTempC', defaults.water.feedTempC),
    feedTdsPpm: given.feedTdsPpm ?? assume('water.feedTdsPpm', defaults.water.feedTdsPpm),
    litresPerWeek: given.litresPerWeek ?? assume('water.litresPerWeek', weekly()),
  }
}

/** The room's temperatures; a default gives way to what was said, so that coldest, usual and warmest stay in order. */
function resolveTemperatures(
  given: Partial<Room>,
  assume: (key: string, value: number) => number,
): Pick<Room, 'temperatureC' | 'coldestC' | 'warmestC'> {
  const { temperatureC, coldestC, warmestC } = given
  const atLeast = Math.max(temperatureC ?? -Infinity, coldestC ?? -Infinity)
  const atMost = Math.min(temperatureC ?? Infinity, warmestC ?? Infinity)
  const between = Math.min(Math.max(defaults.room.temperatureC, coldestC ?? -Infinity), warmestC ?? Infinity)
  return {
    temperatureC: temperatureC ?? assume('room.temperatureC', between),
    coldestC: coldestC ?? assume('room.coldestC', Math.min(defaults.room.coldestC, atMost)),
    warmestC: warmestC ?? assume('room.warmestC', Math.max(defaults.room.warmestC, atLeast)),
  }
}

/** The outlets. A country tells voltage and plug; which circuit and how many outlets it does not. */
function resolveMains(
  { country, mains: given = {} }: Setup,
  assume: <T extends Assumed>(key: string, value: T) => T,
): Mains {
  const usual = chooseMains(country, given)
  const isTold = hasKnownMains(country)
  return {
    volts: given.volts ?? (isTold ? usual.volts : assume('mains.volts', usual.volts)),
    circuitA: given.circuitA ?? assume('mains.circuitA', usual.circuitA),
    plugType: given.plugType ?? (isTold ? usual.plugType : assume('mains.plugType', usual.plugType)),
    outlets: given.outlets ?? assume('mains.outlets', defaults.freeWallOutlets),
    residualCurrentProtected: given.residualCurrentProtected ?? assume('mains.residualCurrentProtected', false),
  }
}

/**
 * The setup with every default filled in and each default named.
 * Throws RangeError where neither the tank's outside size nor a volume is known.
 */
export function resolve(setup: Setup): Plan {
  const assumed = new Map<string, Assumed>()
  const assume = <T extends Assumed>(key: string, value: T): T => {
    assumed.set(key, value)
    return value
  }
  const items = setup.items.filter((item) => item.state !== 'gone')
  const tank = resolveTank(setup.tank, (area) => displacedL(setup, items, area), assume)
  const given = setup.room ?? {}
  const room: Room = {
    ...resolveTemperatures(given, assume),
    relativeHumidity: given.relativeHumidity ?? assume('room.relativeHumidity', defaults.room.relativeHumidity),
    ceilingMm: given.ceilingMm ?? assume('room.ceilingMm', defaults.room.ceilingMm),
    tankTopMm: given.tankTopMm ?? assume('room.tankTopMm', defaults.supportHeightMm + tank.outerHeightMm),
  }
  const mains = resolveMains(setup, assume)
  const wanted = setup.goals ?? {}
  const goals: Goals = {
    temperatureC: wanted.temperatureC ?? assume('goals.temperatureC', defaults.goals.temperatureC),
    salinityPpt: wanted.salinityPpt ?? assume('goals.salinityPpt', defaults.goals.salinityPpt),
    coral: wanted.coral ?? assume('goals.coral', defaults.goals.coral),
    sandDepthMm: wanted.sandDepthMm ?? assume('goals.sandDepthMm', defaults.goals.sandDepthMm),
    rockKg:
      wanted.rockKg ?? packMassKg(items, 'rock') ?? assume('goals.rockKg', defaults.goals.rockKgPerL * tank.grossL),
    turnoverPerHour:
      wanted.turnoverPerHour ?? assume('goals.turnoverPerHour', defaults.turnoverPerHour[tank.filtration]),
    appControl: wanted.appControl ?? assume('goals.appControl', false),
    switchedOutlets: wanted.switchedOutlets ?? assume('goals.switchedOutlets', 0),
  }
  const water = resolveWater(setup.water, tank, room, goals, assume)
  return { setup, tank, room, mains, water, goals, items, assumed }
}
