import { assessAll, judgeAll, toCandidate, type Assessment } from '../assess'
import { listAfter, planAfter, type Bench } from '../bench'
import { isCovered, type Lack } from '../concession'
import { judge, type Judged } from '../judge'
import { checkEssentials, lackOf } from '../needs'
import type { Candidate, Rule, Say } from '../rule'
import { createScene, withItems } from '../scene'
import type { Plan } from '../setup/plan'
import { resolve } from '../setup/resolve'
import type { Item, Verdict } from '../types'

/** The setup with the replacement in its place, to be tried with whatever is bought beside it. */
export interface Outfit {
  readonly bench: Bench
  readonly candidate: Candidate
  readonly items: readonly Item[]
  readonly plan: Plan
}

/** Something asked for and not there: by an item, by the tank, or by the setup as a whole. */
export interface Unmet extends Lack {
  readonly asker: Item | 'tank' | 'setup'
  readonly say: Say
  readonly rule?: Rule
}

export interface State {
  readonly unmet: readonly Unmet[]
  /** Ids of items that do not fit. */
  readonly failing: ReadonlySet<string>
  /** Ids of items that cannot be judged for want of a number. */
  readonly unjudged: ReadonlySet<string>
}

const keyOf = ({ need, asker }: Unmet): string => `${need} ${typeof asker === 'string' ? asker : asker.id}`

/** Whether something is asked for in a state; where the whole setup is short of it, all its pieces are. */
function createAsked(unmet: readonly Unmet[]): (one: Unmet) => boolean {
  const known = new Set(unmet.map(keyOf))
  const short = new Set(unmet.filter(({ asker }) => asker === 'setup').map(({ need }) => need))
  return (one) => known.has(keyOf(one)) || short.has(one.need)
}

/** What is unmet in one state and was not asked for in the other at all. */
export function findUnasked(unmet: readonly Unmet[], before: readonly Unmet[]): readonly Unmet[] {
  const isAsked = createAsked(before)
  return unmet.filter((one) => !isAsked(one))
}

/** What was asked and still is, be it less of it. */
export const listStill = (asked: readonly Unmet[], now: readonly Unmet[]): readonly Unmet[] =>
  asked.filter(createAsked(now))

/**
 * What is unmet in one state and was not in the other, or not so much of it. Where the whole setup was short of something
 * before, that it is shorter of it now is the setup's own to say.
 */
export function findNew(unmet: readonly Unmet[], before: readonly Unmet[]): readonly Unmet[] {
  const isAsked = createAsked(before)
  const isShort = (need: string) => before.some((was) => was.asker === 'setup' && was.need === need)
  return unmet.filter((one) => {
    if (!isAsked(one)) return true
    if (one.asker !== 'setup' && isShort(one.need)) return false
    return !before.some((was) => keyOf(was) === keyOf(one) && isCovered(one, was))
  })
}

export const listAsked = (asker: Unmet['asker'], judged: readonly Judged[]): readonly Unmet[] =>
  judged.flatMap(({ rule, judgement: { asks, say } }): Unmet[] => (asks ? [{ ...asks, asker, say, rule }] : []))

export function describeState({ items, essentials }: Assessment, tank: readonly Judged[]): State {
  const missing = essentials
    .filter(({ isMet }) => !isMet)
    .map((essential): Unmet => ({ ...lackOf(essential), asker: 'setup', say: essential.say }))
  const idsWith = (wanted: Verdict) =>
    new Set(items.filter(({ verdict }) => verdict === wanted).map(({ item }) => item.id))
  return {
    unmet: [...listAsked('tank', tank), ...items.flatMap(({ item, judged }) => listAsked(item, judged)), ...missing],
    failing: idsWith('no'),
    unjudged: idsWith('unknown'),
  }
}

/** Whether an item fails in one state, or cannot be judged, that was better off in the other. */
export const isWorseOff = ({ failing, unjudged }: State, than: State): boolean =>
  [...failing].some((id) => !than.failing.has(id)) ||
  [...unjudged].some((id) => !than.unjudged.has(id) && !than.failing.has(id))

export function createOutfit(bench: Bench, candidate: Candidate): Outfit {
  const items = listAfter(bench, candidate)
  return { bench, candidate, items, plan: planAfter(bench, candidate, items) }
}

/** The outfit with more in it, or with other items. */
export function changeItems(outfit: Outfit, items: readonly Item[]): Outfit {
  const { setup } = outfit.plan
  return { ...outfit, items, plan: resolve(withItems(setup, items)) }
}

/** A tank that is judged asks in the setup as it was: what it holds is compared with what the old one held. */
const sceneOfTank = ({ bench }: Outfit, items: readonly Item[]) => createScene(bench.scene.plan, items)

export function assessOutfit(outfit: Outfit): State {
  const { bench, candidate, items, plan } = outfit
  const tank = bench.kind === 'tank' ? judgeAll(sceneOfTank(outfit, items), candidate) : []
  return describeState(assessAll(plan, items), tank)
}

/** What was asked for before, with what is gone still there. */
export const assessBefore = ({ before, kind, gone }: Bench): State =>
  describeState(before, kind === 'tank' ? (gone?.judged ?? []) : [])

/** Whether `extra` alone meets what is asked, at a glance: nothing else is judged again. */
export function meets(outfit: Outfit, extra: Item, asked: readonly Unmet[]): boolean {
  const items = [...outfit.items, extra]
  return asked.every(({ need, asker, rule }) => {
    if (asker === 'setup' || !rule)
      return checkEssentials(outfit.plan, items).every((essential) => essential.need !== need || essential.isMet)
    const scene =
      asker === 'tank'
        ? sceneOfTank(outfit, items)
        : createScene(
            outfit.plan,
            items.filter((other) => other !== asker),
          )
    const judged = judge(scene, rule, asker === 'tank' ? outfit.candidate : toCandidate(asker))
    return judged?.judgement.asks?.need !== need
  })
}
