import { saltPacks } from './physics/salt'
import type { RawBudget } from './raw-budget'
import { sandMassKg } from './setup/resolve'
import type { Plan } from './setup/plan'
import type { Item } from './types'
import { readNumber } from './values'
import type { KindKey } from '../kinds/index'

/** What the packs of a kind hold together; null where there are none or one does not state it. */
function sumPacks(items: readonly Item[], kind: KindKey, read: (item: Item) => number | undefined): number | null {
  const packs = items.filter(({ piece }) => piece.kind === kind)
  if (packs.length === 0) return null
  const held = packs.map((item) => read(item))
  return held.includes(undefined) ? null : held.reduce<number>((sum, one) => sum + (one ?? 0), 0)
}

const massOf = ({ piece, quantity }: Item): number | undefined => {
  const packKg = readNumber(piece.specs, 'packKg')
  return packKg === undefined ? undefined : packKg * quantity
}

/** As the sand in the setup has it, where its maker or somebody says so: the same bed as its own check asks for. */
const findSandDensity = (items: readonly Item[]): number | undefined =>
  items.flatMap(({ piece }) => (piece.kind === 'sand' ? (readNumber(piece.specs, 'bulkDensityKgL') ?? []) : []))[0]

/** Sand, rock and salt water that the tank takes, and what the packs in the setup come to. */
export function addUpSupplies(plan: Plan, items: readonly Item[]): Readonly<Record<string, RawBudget>> {
  const { tank, goals } = plan
  const sandKg = sandMassKg(tank, goals.sandDepthMm, findSandDensity(items))
  const makes = (item: Item): number | undefined => {
    const makesL = readNumber(item.piece.specs, 'makesL')
    return makesL === undefined ? undefined : item.quantity / saltPacks(1, goals.salinityPpt, makesL)
  }
  return {
    sandKg: {
      used: sandKg,
      limit: sumPacks(items, 'sand', massOf),
      unit: 'kg',
      say: (words) =>
        sandKg === 0
          ? 'No sand is wanted.'
          : `${words.mass(sandKg)} of sand for a bed ${words.length(goals.sandDepthMm)} deep.`,
    },
    rockKg: {
      used: goals.rockKg,
      limit: sumPacks(items, 'rock', massOf),
      unit: 'kg',
      say: (words) => `${words.mass(goals.rockKg)} of rock.`,
    },
    saltWaterL: {
      used: tank.waterL,
      limit: sumPacks(items, 'salt-mix', makes),
      unit: 'L',
      say: (words) =>
        `${words.volume(tank.waterL)} of salt water at ${words.measure(goals.salinityPpt, 'ppt')} for the first fill.`,
    },
  }
}
