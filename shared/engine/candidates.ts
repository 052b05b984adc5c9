import { assessItem, findPlacement, judgeAll, type Assessment } from './assess'
import { addUp } from './budgets'
import { getRules } from './checks/index'
import type { Judged } from './judge'
import { diff, isDemand, listDemands, type RawKnockOn } from './knock-ons'
import { checkEssentials } from './needs'
import type { Candidate } from './rule'
import { createScene, withItems, type Scene } from './scene'
import type { Plan } from './setup/plan'
import { resolve } from './setup/resolve'
import type { Item, Piece, Place, Placement, Setup, Verdict } from './types'
import { decideVerdict } from './verdict'
import { getKind, type KindKey } from '../kinds/index'

/** How a piece is judged: how many, where, and instead of or beside what. */
export interface CandidateOptions {
  readonly quantity?: number
  readonly place?: Place
  readonly instead?: readonly string[]
  readonly beside?: boolean
}

/** A piece judged in a setup, before anybody asks for words. */
export interface AssessedCandidate {
  readonly candidate: Candidate
  readonly judged: readonly Judged[]
  readonly verdict: Verdict
  readonly placement?: Placement
  readonly knockOns: readonly RawKnockOn[]
}

/** The setup a candidate joins: what is left when it takes the place of its kind's pieces. */
export interface Bench {
  readonly scene: Scene
  readonly before: Assessment
  readonly kind: KindKey
}

export const candidateId = 'candidate'

/** Items that stay when a piece of `kind` is judged: kinds that add up count beside what is there. */
function keepItems(plan: Plan, kind: KindKey, options: CandidateOptions): readonly Item[] {
  if (options.instead) return plan.items.filter((item) => !options.instead?.includes(item.id))
  if (options.beside ?? getKind(kind).additive) return plan.items
  return plan.items.filter((item) => item.piece.kind !== kind)
}

/** Prepares a setup for judging pieces of one kind. RangeError where the tank has neither size nor volume. */
export function setBench(setup: Setup, kind: KindKey, options: CandidateOptions = {}): Bench {
  const whole = resolve(setup)
  const others = keepItems(whole, kind, options)
  const plan = others.length === whole.items.length ? whole : resolve(withItems(setup, others))
  const before = {
    plan,
    items: others.map((item) => assessItem(plan, others, item)),
    essentials: checkEssentials(plan, others),
    budgets: addUp(plan, others),
  }
  return { scene: createScene(plan, others), before, kind }
}

/** The whole setup with the candidate in it, its own judgements taken as they are. */
function assessAfter(
  { scene, before, kind }: Bench,
  candidate: Candidate,
  judged: readonly Judged[],
  verdict: Verdict,
): Assessment {
  const { piece, quantity } = candidate
  const item: Item = {
    id: candidateId,
    piece,
    quantity,
    state: 'planned',
    ...(candidate.place && { place: candidate.place }),
  }
  if (kind === 'tank') {
    const tank = { specs: piece.specs, ...(piece.gear && { gear: piece.gear }) }
    const plan = resolve(withItems(scene.plan.setup, scene.others, tank))
    const items = scene.others.map((other) => assessItem(plan, scene.others, other))
    return { plan, items, essentials: checkEssentials(plan, scene.others), budgets: addUp(plan, scene.others) }
  }
  const items = [...scene.others, item]
  const { plan } = before
  return {
    plan,
    items: [...scene.others.map((other) => assessItem(plan, items, other)), { item, judged, verdict }],
    essentials: checkEssentials(plan, items),
    budgets: addUp(plan, items),
  }
}

/** What else changes with the candidate: its own demands, and those that its arrival makes of the rest. */
export function findKnockOns(
  bench: Bench,
  candidate: Candidate,
  judged: readonly Judged[],
  verdict: Verdict,
): readonly RawKnockOn[] {
  if (bench.scene.others.length === 0 && bench.kind !== 'tank') return listDemands(judged)
  // A tank of unknown size cannot be resolved; what it asks itself is all that can be said.
  if (bench.kind === 'tank' && verdict === 'unknown') return listDemands(judged)
  const after = assessAfter(bench, candidate, judged, verdict)
  const own = bench.kind === 'tank' ? listDemands(judged) : []
  return [...own, ...diff(bench.before, after).filter(isDemand)]
}

/** How many of the piece would do, where a rule says that several would. */
export const countEnough = (judged: readonly Judged[]): number | undefined =>
  judged.find(({ judgement }) => judgement.enough !== undefined)?.judgement.enough

/**
 * Judges one candidate. Where a rule finds that several of it would do, all rules are asked again for so many; if that
 * fails elsewhere (no room, no outlet), one is judged without that way out.
 */
export function judgeCandidate(
  scene: Scene,
  piece: Piece,
  options: CandidateOptions = {},
): { candidate: Candidate; judged: readonly Judged[]; verdict: Verdict } {
  const asked = options.quantity ?? 1
  const attempt = (quantity: number, mayMultiply: boolean) => {
    const candidate: Candidate = { piece, quantity, mayMultiply, ...(options.place && { place: options.place }) }
    const judged = judgeAll(scene, candidate)
    return { candidate, judged, verdict: decideVerdict(judged) }
  }
  const first = attempt(asked, options.quantity === undefined)
  const enough = countEnough(first.judged)
  if (enough === undefined || first.verdict === 'no') return first
  const several = attempt(enough, true)
  return several.verdict === 'no' ? attempt(asked, false) : several
}

/** One candidate with its knock-ons; what fits by itself but asks something of the rest fits with changes. */
export function assessCandidate(bench: Bench, piece: Piece, options: CandidateOptions = {}): AssessedCandidate {
  const { candidate, judged, verdict } = judgeCandidate(bench.scene, piece, options)
  const knockOns = verdict === 'no' ? [] : findKnockOns(bench, candidate, judged, verdict)
  const placement = findPlacement(judged)
  return {
    candidate,
    judged,
    verdict: verdict === 'fits' && knockOns.length > 0 ? 'changes' : verdict,
    knockOns,
    ...(placement && { placement }),
  }
}

export const getTarget = (scene: Scene, candidate: Candidate): number | null =>
  getRules(candidate.piece.kind).target?.(scene, candidate) ?? null
