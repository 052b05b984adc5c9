import { hasAreas } from './checks/shape'
import { countOf } from './counting'
import { findColdestHeldC, findHeaterNeed, sumHeaterW } from './heat-budget'
import { countPlugs, findLimits, sumLoad } from './mains-budget'
import type { RawBudget } from './raw-budget'
import { createScene, once } from './scene'
import type { Plan } from './setup/plan'
import type { Item } from './types'
import { readNumber } from './values'
import { addUpSupplies } from './supplies-budget'
import { findFloorPressureKPa, weighFilled } from './weight-budget'

/** The heat that the coldest room takes, and the heaters that are there to give it. */
function addUpHeat(plan: Plan, items: readonly Item[]): RawBudget {
  const scene = createScene(
    plan,
    items.filter((item) => item.piece.kind !== 'heater'),
  )
  const { needW, needUpperW } = once(scene, findHeaterNeed)
  const heaterW = sumHeaterW(items)
  return {
    used: needUpperW,
    limit: heaterW,
    unit: 'W',
    say: (words) => {
      if (needUpperW === 0) return 'No heater is needed at these temperatures.'
      const needed = `It takes ${words.pair([needW, needUpperW], 'W')} to hold the goal in the coldest room`
      if (heaterW === 0) return `${needed}; there is no heater, or none that states its power.`
      const heldC = findColdestHeldC(scene, heaterW, 'totalUpperW')
      return `${needed}; ${words.power(heaterW)} hold it with the room down to ${words.temperature(heldC)}.`
    },
  }
}

/** What the filled tank weighs, and what that puts on the floor. */
function addUpWeight(plan: Plan, items: readonly Item[]): { massKg: RawBudget; floorKPa: RawBudget } {
  const weight = weighFilled(plan)
  const stand = items.find((item) => item.piece.kind === 'stand')
  const standKg = stand ? (readNumber(stand.piece.specs, 'massKg') ?? 0) : 0
  const lengthMm = stand && readNumber(stand.piece.specs, 'topLengthMm')
  const widthMm = stand && readNumber(stand.piece.specs, 'topWidthMm')
  const footprint = lengthMm && widthMm ? { lengthMm, widthMm } : undefined
  const pressureKPa = findFloorPressureKPa(plan, standKg, footprint)
  return {
    massKg: {
      used: weight.totalKg,
      limit: (stand && readNumber(stand.piece.specs, 'loadRatingKg')) ?? null,
      unit: 'kg',
      say: (words) =>
        `About ${words.mass(weight.totalKg)} filled${standKg > 0 ? `, ${words.mass(weight.totalKg + standKg)} with the stand` : ''}. A structural engineer and local building rules decide for anything large or upstairs.`,
    },
    floorKPa: {
      used: pressureKPa,
      limit: null,
      unit: 'kPa',
      say: (words) => `About ${words.measure(pressureKPa, 'kPa')} on the floor, as information only.`,
    },
  }
}

/** What the whole setup uses of what it has: outlets and watts; weight, floor pressure, heat and supplies where the shape tells them. */
export function addUp(plan: Plan, items: readonly Item[]): Readonly<Record<string, RawBudget>> {
  const plugs = countPlugs(plan, items)
  const load = sumLoad(plan, items)
  const { continuousW } = findLimits(plan, items)
  const mains: Record<string, RawBudget> = {
    plugs: {
      used: plugs.used,
      limit: plugs.capacity,
      unit: 'count',
      say: () => `${countOf(plugs.used, 'plug')} for ${countOf(plugs.capacity, 'outlet')}.`,
    },
    powerW: {
      used: load.watts,
      limit: continuousW,
      unit: 'W',
      say: (words) => `${words.power(load.watts)} of ${words.power(continuousW)} that may run without pause.`,
    },
  }
  if (!hasAreas(plan)) return mains
  return { ...mains, ...addUpWeight(plan, items), heatW: addUpHeat(plan, items), ...addUpSupplies(plan, items) }
}
