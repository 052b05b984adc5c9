import { assessAll, judgeAll, toCandidate, type Assessment } from '../assess'
import { listAfter, planAfter, type Bench } from '../bench'
import { judge, type Judged } from '../judge'
import { checkEssentials } from '../needs'
import type { Candidate, Rule, Say } from '../rule'
import { createScene, withItems } from '../scene'
import type { Plan } from '../setup/plan'
import { resolve } from '../setup/resolve'
import type { Item } from '../types'

/** The setup with the replacement in its place, to be tried with whatever is bought beside it. */
export interface Outfit {
  readonly bench: Bench
  readonly candidate: Candidate
  readonly items: readonly Item[]
  readonly plan: Plan
}

/** Something asked for and not there: by an item, by the tank, or by the setup as a whole. */
export interface Unmet {
  readonly need: string
  readonly asker: Item | 'tank' | 'setup'
  readonly amount: number | null
  readonly say: Say
  readonly rule?: Rule
}

export interface State {
  readonly unmet: readonly Unmet[]
  /** Ids of items that do not fit. */
  readonly failing: ReadonlySet<string>
}

const keyOf = ({ need, asker }: Unmet): string => `${need} ${typeof asker === 'string' ? asker : asker.id}`

/** What is unmet in one state and was not in the other; where the whole setup is short of something, all its pieces are. */
export function findNew(unmet: readonly Unmet[], before: readonly Unmet[]): readonly Unmet[] {
  const known = new Set(before.map(keyOf))
  const short = new Set(before.filter(({ asker }) => asker === 'setup').map(({ need }) => need))
  return unmet.filter((one) => !known.has(keyOf(one)) && !short.has(one.need))
}

export const listAsked = (asker: Unmet['asker'], judged: readonly Judged[]): readonly Unmet[] =>
  judged.flatMap(({ rule, judgement: { asks, say } }): Unmet[] =>
    asks ? [{ need: asks.need, amount: asks.amount, asker, say, rule }] : [],
  )

export function describeState({ items, essentials }: Assessment, tank: readonly Judged[]): State {
  const missing = essentials
    .filter(({ isMet }) => !isMet)
    .map(({ need, amount, say }): Unmet => ({ need, amount, asker: 'setup', say }))
  return {
    unmet: [...listAsked('tank', tank), ...items.flatMap(({ item, judged }) => listAsked(item, judged)), ...missing],
    failing: new Set(items.filter(({ verdict }) => verdict === 'no').map(({ item }) => item.id)),
  }
}

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
