import { addUp } from './budgets'
import { getRules } from './checks/index'
import { judge, type Judged } from './judge'
import { checkEssentials, type Essential } from './needs'
import type { RawBudget } from './raw-budget'
import type { Candidate } from './rule'
import { createScene, type Scene } from './scene'
import type { Plan } from './setup/plan'
import { resolve } from './setup/resolve'
import type { Item, Placement, Setup, Verdict } from './types'
import { decideVerdict } from './verdict'

/** A piece in its setup, judged by every rule of its kind. */
export interface AssessedItem {
  readonly item: Item
  readonly judged: readonly Judged[]
  readonly verdict: Verdict
  readonly placement?: Placement
}

/** A whole setup judged, before anybody asks for words. */
export interface Assessment {
  readonly plan: Plan
  readonly items: readonly AssessedItem[]
  readonly essentials: readonly Essential[]
  readonly budgets: Readonly<Record<string, RawBudget>>
}

/** Every rule of the candidate's kind that applies to it in the scene. */
export function judgeAll(scene: Scene, candidate: Candidate): readonly Judged[] {
  return getRules(candidate.piece.kind).rules.flatMap((rule) => judge(scene, rule, candidate) ?? [])
}

export const findPlacement = (judged: readonly Judged[]): Placement | undefined =>
  judged.find(({ judgement }) => judgement.placement)?.judgement.placement

export const toCandidate = ({ piece, quantity, place, mountHeightMm }: Item): Candidate => ({
  piece,
  quantity,
  ...(place && { place }),
  ...(mountHeightMm !== undefined && { mountHeightMm }),
})

export function assessItem(plan: Plan, items: readonly Item[], item: Item): AssessedItem {
  const scene = createScene(
    plan,
    items.filter((other) => other !== item),
  )
  const judged = judgeAll(scene, toCandidate(item))
  const placement = findPlacement(judged)
  return { item, judged, verdict: decideVerdict(judged), ...(placement && { placement }) }
}

/** Items judged against each other in a setup that is planned; they need not be those of the plan. */
export const assessAll = (plan: Plan, items: readonly Item[]): Assessment => ({
  plan,
  items: items.map((item) => assessItem(plan, items, item)),
  essentials: checkEssentials(plan, items),
  budgets: addUp(plan, items),
})

/** Judges every piece that counts against the rest. RangeError where the tank has neither size nor volume. */
export function assess(setup: Setup): Assessment {
  const plan = resolve(setup)
  return assessAll(plan, plan.items)
}
