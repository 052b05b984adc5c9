import type { CanonicalUnit } from '../units/units'
import { findColdestHeldC, findHeaterNeed, sumHeaterW } from './heat-budget'
import { countPlugs, findLimits, sumLoad } from './mains-budget'
import type { Say } from './rule'
import { createScene, once } from './scene'
import type { Plan } from './setup/plan'
import type { Item } from './types'
import { readNumber } from './values'
import { findFloorPressureKPa, weighFilled } from './weight-budget'

export interface RawBudget {
  readonly used: number
  readonly limit: number | null
  readonly unit: CanonicalUnit
  readonly say: Say
}

/** What the whole setup uses of what it has: outlets, watts, weight, floor pressure and heat. */
export function addUp(plan: Plan, items: readonly Item[]): Readonly<Record<string, RawBudget>> {
  const plugs = countPlugs(plan, items)
  const load = sumLoad(plan, items)
  const { continuousW } = findLimits(plan, items)
  const weight = weighFilled(plan)
  const stand = items.find((item) => item.piece.kind === 'stand')
  const standKg = stand ? (readNumber(stand.piece.specs, 'massKg') ?? 0) : 0
  const top = stand && {
    lengthMm: readNumber(stand.piece.specs, 'topLengthMm'),
    widthMm: readNumber(stand.piece.specs, 'topWidthMm'),
  }
  const footprint = top?.lengthMm && top.widthMm ? { lengthMm: top.lengthMm, widthMm: top.widthMm } : undefined
  const pressureKPa = findFloorPressureKPa(plan, standKg, footprint)
  const scene = createScene(
    plan,
    items.filter((item) => item.piece.kind !== 'heater'),
  )
  const { needW, needUpperW } = once(scene, findHeaterNeed)
  const heaterW = sumHeaterW(items)
  const budgets: Record<string, RawBudget> = {
    plugs: {
      used: plugs.used,
      limit: plugs.capacity,
      unit: 'count',
      say: () => `${plugs.used} of ${plugs.capacity} outlets.`,
    },
    powerW: {
      used: load.watts,
      limit: continuousW,
      unit: 'W',
      say: (words) => `${words.power(load.watts)} of ${words.power(continuousW)} that may run without pause.`,
    },
    massKg: {
      used: weight.totalKg + standKg,
      limit: (stand && readNumber(stand.piece.specs, 'loadRatingKg')) ?? null,
      unit: 'kg',
      say: (words) =>
        `About ${words.mass(weight.totalKg + standKg)} filled. A structural engineer and local building rules decide for anything large or upstairs.`,
    },
    floorKPa: {
      used: pressureKPa,
      limit: null,
      unit: 'kPa',
      say: (words) => `About ${words.measure(pressureKPa, 'kPa')} on the floor, as information only.`,
    },
    heatW: {
      used: needUpperW,
      limit: heaterW,
      unit: 'W',
      say: (words) =>
        heaterW === 0
          ? `${words.pair([needW, needUpperW], 'W')} hold the goal in the coldest room; there is no heater.`
          : `${words.pair([needW, needUpperW], 'W')} hold the goal in the coldest room, of ${words.power(heaterW)}: enough down to ${words.temperature(findColdestHeldC(scene, heaterW, 'totalUpperW'))}.`,
    },
  }
  return budgets
}
