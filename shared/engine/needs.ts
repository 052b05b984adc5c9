import type { KindKey } from '../kinds/index'
import { hasAreas } from './checks/shape'
import type { Lack } from './concession'
import { findHeaterNeed } from './heat-budget'
import { countPlugs } from './mains-budget'
import { countOf } from './counting'
import type { Say } from './rule'
import { createScene, once } from './scene'
import type { Plan } from './setup/plan'
import type { Item } from './types'
import { readSet } from './values'
import type { CanonicalUnit } from '../units/units'

/** What a marine setup cannot do without, and what in this setup meets it. */
export interface Essential {
  readonly need: string
  readonly amount: number | null
  readonly unit: CanonicalUnit | null
  readonly metBy: readonly string[]
  readonly isMet: boolean
  /** How much of it is lacking and what exactly, where part of it may be there. */
  readonly short?: Omit<Lack, 'need'>
  /** What is missing, in a sentence. */
  readonly say: Say
  /** What was needed and is there. */
  readonly sayMet: Say
}

interface EssentialRule {
  readonly need: string
  readonly kinds: readonly KindKey[]
  readonly missing: string
  readonly met: string
  readonly applies?: (plan: Plan) => boolean
  readonly metByTank?: (plan: Plan) => boolean
}

/** By presence alone; what each piece must be able to do is for its own checks. */
const essentials: readonly EssentialRule[] = [
  {
    need: 'salinity-reading',
    kinds: ['salinity-meter'],
    missing: 'Nothing measures salinity: a refractometer or conductivity meter with a seawater scale is missing.',
    met: 'Salinity can be measured.',
  },
  { need: 'salt', kinds: ['salt-mix'], missing: 'There is no salt mix for the first fill.', met: 'There is salt mix.' },
  {
    need: 'pure-water',
    kinds: ['ro-unit'],
    missing: 'There is no RO/DI unit; without one, pure water has to be bought.',
    met: 'Pure water can be made.',
  },
  {
    need: 'circulation',
    kinds: ['wavemaker', 'return-pump'],
    missing: 'Nothing moves the water: a wavemaker or return pump is missing.',
    met: 'The water is moved.',
    metByTank: (plan) => plan.tank.includedPump !== undefined,
  },
  {
    need: 'glass-cleaning',
    kinds: ['scraper'],
    missing: 'There is nothing to clean the viewing panes with.',
    met: 'The panes can be cleaned.',
  },
  {
    need: 'light',
    kinds: ['light'],
    missing: 'Corals need light, and there is none.',
    met: 'There is a light.',
    applies: (plan) => plan.goals.coral.length > 0,
  },
]

const cycleTests = ['ammonia', 'nitrite', 'nitrate']

function checkTests(items: readonly Item[]): Essential {
  const kits = items.filter((item) => item.piece.kind === 'test-kit')
  const covered = new Set(kits.flatMap((kit) => readSet<string>(kit.piece.specs, 'parameters') ?? []))
  const lacking = cycleTests.filter((parameter) => !covered.has(parameter))
  return {
    need: 'cycle-tests',
    amount: lacking.length,
    unit: 'count',
    metBy: kits.map(({ id }) => id),
    isMet: lacking.length === 0,
    short: { amount: lacking.length, lacks: lacking },
    say: () => `Tests are missing for ${lacking.join(', ')}: without them the cycle cannot be followed.`,
    sayMet: () => 'Ammonia, nitrite and nitrate can be tested.',
  }
}

function checkHeat(plan: Plan, items: readonly Item[]): Essential | null {
  const heaters = items.filter((item) => item.piece.kind === 'heater')
  const scene = createScene(
    plan,
    items.filter((item) => item.piece.kind !== 'heater'),
  )
  const base = { need: 'heat', unit: 'W' as const, metBy: heaters.map(({ id }) => id), isMet: heaters.length > 0 }
  if (!hasAreas(plan))
    return {
      ...base,
      amount: null,
      say: () => 'There is no heater; how much power it takes cannot be computed for this shape of tank yet.',
      sayMet: () => 'There is a heater; how much power it takes cannot be computed for this shape of tank yet.',
    }
  const { needW, needUpperW } = once(scene, findHeaterNeed)
  if (needUpperW === 0) return null
  return {
    ...base,
    amount: needUpperW,
    say: (words) =>
      `There is no heater: with the room at ${words.temperature(plan.room.coldestC)} it takes ${words.pair([needW, needUpperW], 'W')}.`,
    sayMet: (words) =>
      `It takes ${words.pair([needW, needUpperW], 'W')} to hold ${words.temperature(plan.goals.temperatureC)} with the room at ${words.temperature(plan.room.coldestC)}.`,
  }
}

function checkOutlets(plan: Plan, items: readonly Item[]): Essential {
  const { used, capacity } = countPlugs(plan, items)
  const strips = items.filter((item) => item.piece.kind === 'power-strip')
  return {
    need: 'outlets',
    amount: used,
    unit: 'count',
    metBy: strips.map(({ id }) => id),
    isMet: used <= capacity,
    short: { amount: used - capacity },
    say: () =>
      `${countOf(used, 'plug')} for ${countOf(capacity, 'outlet')}: ${strips.length > 0 ? 'another' : 'a'} power strip is missing.`,
    sayMet: () => `${countOf(used, 'plug')} for ${countOf(capacity, 'outlet')}.`,
  }
}

/** How much of what a setup cannot do without is lacking. */
export const lackOf = ({ need, short }: Essential): Lack => ({ need, amount: null, ...short })

/** Every essential of a setup, met or not, in the order in which people buy them. */
export function checkEssentials(plan: Plan, items: readonly Item[]): readonly Essential[] {
  const byPresence = essentials
    .filter(({ applies }) => applies?.(plan) ?? true)
    .map(({ need, kinds, missing, met, metByTank }): Essential => {
      const metBy = items.filter((item) => kinds.includes(item.piece.kind)).map(({ id }) => id)
      const byTank = metByTank?.(plan) ? ['tank'] : []
      return {
        need,
        amount: null,
        unit: null,
        metBy: [...byTank, ...metBy],
        isMet: byTank.length + metBy.length > 0,
        say: () => missing,
        sayMet: () => met,
      }
    })
  const heat = checkHeat(plan, items)
  return [...(heat ? [heat] : []), checkOutlets(plan, items), checkTests(items), ...byPresence]
}
