import { assessItem, findPlacement, judgeAll, type Assessment } from './assess'
import { addUp } from './budgets'
import type { Judged } from './judge'
import { diff, isDemand, listDemands, type RawKnockOn } from './knock-ons'
import { checkEssentials } from './needs'
import type { Candidate } from './rule'
import { createScene, withItems, type Scene } from './scene'
import type { Plan } from './setup/plan'
import { resolve } from './setup/resolve'
import { hasSize } from './setup/tank'
import type { Item, Piece, Place, Placement, Setup, Verdict } from './types'
import { decideVerdict } from './verdict'
import { getKind, type KindKey } from '../kinds/index'

/** How a piece is judged: how many, where, and instead of or beside what. */
export interface CandidateOptions {
  readonly quantity?: number
  readonly place?: Place
  readonly mountHeightMm?: number
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
  // What makes room stays listed as gone: what was planned tells what the piece has to live up to.
  const left = setup.items.map((item) => (others.includes(item) ? item : { ...item, state: 'gone' as const }))
  const plan = others.length === whole.items.length ? whole : resolve(withItems(setup, left))
  const before = {
    plan,
    items: others.map((item) => assessItem(plan, others, item)),
    essentials: checkEssentials(plan, others),
    budgets: addUp(plan, others),
  }
  return { scene: createScene(plan, others), before, kind }
}

/** The whole setup with the candidate in it, judged but for the candidate itself. */
function assessAfter({ scene, before, kind }: Bench, { piece, quantity, place }: Candidate): Assessment {
  const { others } = scene
  if (kind === 'tank') {
    const plan = resolve(
      withItems(scene.plan.setup, others, { specs: piece.specs, ...(piece.gear && { gear: piece.gear }) }),
    )
    const items = others.map((other) => assessItem(plan, others, other))
    return { plan, items, essentials: checkEssentials(plan, others), budgets: addUp(plan, others) }
  }
  const { plan } = before
  const items = [...others, { id: candidateId, piece, quantity, state: 'planned' as const, ...(place && { place }) }]
  return {
    plan,
    items: others.map((other) => assessItem(plan, items, other)),
    essentials: checkEssentials(plan, items),
    budgets: addUp(plan, items),
  }
}

/** What the candidate's arrival makes the rest of the setup ask: checks that got worse, essentials that went missing. */
export function findRestKnockOns(bench: Bench, candidate: Candidate): readonly RawKnockOn[] {
  if (bench.scene.others.length === 0) return []
  // A tank of unknown size cannot be put in the setup; what it asks itself is all that can be said.
  if (bench.kind === 'tank' && !hasSize(candidate.piece.specs)) return []
  return diff(bench.before, assessAfter(bench, candidate)).filter(isDemand)
}

/** How a candidate is judged, the piece itself left out. */
export const describeWay = (
  options: CandidateOptions,
  quantity: number,
  mayMultiply = true,
): Omit<Candidate, 'piece'> => ({
  quantity,
  asked: options.quantity ?? 1,
  mayMultiply,
  ...(options.place && { place: options.place }),
  ...(options.mountHeightMm !== undefined && { mountHeightMm: options.mountHeightMm }),
})

interface JudgedCandidate {
  readonly candidate: Candidate
  readonly judged: readonly Judged[]
  readonly verdict: Verdict
}

/**
 * Judges one candidate. Where a rule finds that several of it would do, all rules are asked again for so many; if that
 * fails elsewhere (no room), one is judged without that way out. `judgeAs` judges it so many times over.
 */
export function judgeCandidate(
  scene: Scene,
  piece: Piece,
  options: CandidateOptions = {},
  judgeAs?: (way: Omit<Candidate, 'piece'>) => readonly Judged[],
): JudgedCandidate {
  const asked = options.quantity ?? 1
  const attempt = (quantity: number, mayMultiply: boolean): JudgedCandidate => {
    const way = describeWay(options, quantity, mayMultiply)
    const candidate: Candidate = { piece, ...way }
    const judged = judgeAs?.(way) ?? judgeAll(scene, candidate)
    return { candidate, judged, verdict: decideVerdict(judged) }
  }
  const first = attempt(asked, true)
  const enough = first.judged.find(({ judgement }) => judgement.enough !== undefined)?.judgement.enough
  if (enough === undefined || options.quantity !== undefined || first.verdict === 'no') return first
  const several = attempt(enough, true)
  return several.verdict === 'no' ? attempt(asked, false) : several
}

/** What fits by itself but asks something of the rest fits with changes. */
export const weighKnockOns = (own: Verdict, restDemands: number): Verdict =>
  own === 'fits' && restDemands > 0 ? 'changes' : own

/** One candidate with its knock-ons: its own demands, then the rest's. A piece that does not fit has none. */
export function assessCandidate(bench: Bench, piece: Piece, options: CandidateOptions = {}): AssessedCandidate {
  const { candidate, judged, verdict } = judgeCandidate(bench.scene, piece, options)
  const rest = verdict === 'no' ? [] : findRestKnockOns(bench, candidate)
  return complete(candidate, judged, verdict, rest)
}

export function complete(
  candidate: Candidate,
  judged: readonly Judged[],
  own: Verdict,
  rest: readonly RawKnockOn[],
): AssessedCandidate {
  const placement = findPlacement(judged)
  const knockOns = own === 'no' ? [] : [...listDemands(judged), ...rest]
  return { candidate, judged, verdict: weighKnockOns(own, rest.length), knockOns, ...(placement && { placement }) }
}
