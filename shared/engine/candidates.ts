import { findPlacement, judgeAll } from './assess'
import { findRestKnockOns, isConceded, type Bench, type Seat } from './bench'
import type { Judged } from './judge'
import { isDemand, listDemands, type RawKnockOn } from './knock-ons'
import type { Candidate, Way } from './rule'
import type { Scene } from './scene'
import type { Piece, Place, Placement, Verdict } from './types'
import { decideVerdict } from './verdict'

/** How a piece is judged: how many, where, and instead of or beside what. */
export interface CandidateOptions extends Seat {
  readonly quantity?: number
  /** So many were there of what is gone: no more of a piece than that is nothing to be told. */
  readonly there?: number
  readonly place?: Place
  readonly mountHeightMm?: number
}

/** A piece judged in a setup, before anybody asks for words. */
export interface AssessedCandidate {
  readonly candidate: Candidate
  readonly judged: readonly Judged[]
  readonly verdict: Verdict
  readonly placement?: Placement
  readonly knockOns: readonly RawKnockOn[]
}

/** How a candidate is judged, the piece itself left out. */
export const describeWay = (options: CandidateOptions, quantity: number, mayMultiply = true): Way => ({
  quantity,
  asked: options.quantity ?? options.there ?? 1,
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
 * fails elsewhere (no room), one is judged without that way out.
 */
function judgeCandidate(scene: Scene, piece: Piece, options: CandidateOptions = {}): JudgedCandidate {
  const asked = options.quantity ?? 1
  const attempt = (quantity: number, mayMultiply: boolean): JudgedCandidate => {
    const candidate: Candidate = { piece, ...describeWay(options, quantity, mayMultiply) }
    const judged = judgeAll(scene, candidate)
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
  return complete(bench, candidate, judged, verdict, rest)
}

/** Where the tank itself is replaced, all else can follow it: also of one that its stand does not carry that is told. */
export const isFrame = ({ kind, gone }: Bench): boolean => kind === 'tank' && gone !== undefined

export function complete(
  bench: Bench,
  candidate: Candidate,
  judged: readonly Judged[],
  own: Verdict,
  rest: readonly RawKnockOn[],
): AssessedCandidate {
  const placement = findPlacement(judged)
  const asked = judged.filter((one) => !isConceded(bench, one))
  const knockOns = own === 'no' && !isFrame(bench) ? [] : [...listDemands(asked), ...rest]
  const verdict = weighKnockOns(own, rest.filter(isDemand).length)
  return { candidate, judged, verdict, knockOns, ...(placement && { placement }) }
}
