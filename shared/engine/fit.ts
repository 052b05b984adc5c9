import type { KindKey } from '../kinds/index'
import { getAttribute } from '../kinds/index'
import { createPrinter, type Printer } from '../units/print'
import { assessCandidate, findKnockOns, setBench, type AssessedCandidate, type CandidateOptions } from './candidates'
import { findPlacement } from './assess'
import { getRules, hasOwnRules } from './checks/index'
import { listAssumptions } from './assumptions'
import type { Judged } from './judge'
import { presentKnockOns, type RawKnockOn } from './knock-ons'
import { presentCautions, presentCheck } from './present'
import { readNumber } from './values'
import { sweep, type Sweep } from './sweep'
import type { Answer, FitOptions, FitResult, Mark, Piece, Scale, Setup, Verdict } from './types'
import { rankConfidence, rateConfidence, verdictOrder } from './verdict'
import { getKind } from '../kinds/index'

const onTheWay = (kind: KindKey): readonly string[] =>
  hasOwnRules(kind)
    ? []
    : [`Checks of their own for ${getKind(kind).plural} are on the way; only the general ones were made.`]

/** The answer in one sentence: what is wrong, what is not known, what must change, or how it fits. */
function summarise(
  scene: Sweep['bench']['scene'],
  { candidate, judged, verdict, placement, knockOns }: AssessedCandidate,
  words: Printer,
): string {
  const sayFirst = (outcome: string) => judged.find((one) => (one.eitherWay ?? one.outcome) === outcome)
  if (verdict === 'no') return presentCheck(sayFirst('fail')!, words).message
  if (verdict === 'unknown')
    return presentCheck(
      judged.find((one) => one.outcome === 'nodata' && one.rule.worst === 'fail')!,
      words,
    ).message
  const summary = getRules(candidate.piece.kind).summary
  const covered = judged.filter(({ rule }) => summary?.covers.includes(rule.id))
  if (summary && covered.length > 0 && covered.every(({ outcome }) => outcome === 'pass'))
    return summary.write(scene, candidate, placement)(words)
  const changed = sayFirst('change')
  if (changed) return presentCheck(changed, words).message
  if (knockOns[0]) return knockOns[0].say(words)
  return judged.length > 0 ? presentCheck(judged[0]!, words).message : 'Nothing about it could be checked yet.'
}

function presentAnswer(scene: Sweep['bench']['scene'], assessed: AssessedCandidate, words: Printer): Answer {
  const { candidate, judged, verdict, placement, knockOns } = assessed
  const { piece, quantity } = candidate
  const gear = piece.gear ?? null
  return {
    gear,
    kind: piece.kind,
    specs: piece.specs,
    pieces: [{ gear, quantity }],
    verdict,
    summary: summarise(scene, assessed, words),
    checks: judged.map((one) => presentCheck(one, words)),
    knockOns: presentKnockOns(knockOns, words),
    cautions: [...presentCautions(judged, words), ...onTheWay(piece.kind)],
    confidence: rateConfidence(piece, judged),
    ...(placement && { place: placement }),
  }
}

/**
 * One piece judged in place of the setup's pieces of its kind (or of `instead`, or `beside` them).
 * RangeError where the tank has neither an outside size nor a volume.
 */
export function fitCheck(setup: Setup, piece: Piece, options: CandidateOptions = {}): Answer {
  const bench = setBench(setup, piece.kind, options)
  return presentAnswer(bench.scene, assessCandidate(bench, piece, options), createPrinter(setup.units))
}

interface Ranked {
  readonly index: number
  readonly verdict: Verdict
  readonly knockOns: readonly RawKnockOn[] | undefined
  readonly demands: number
  readonly backing: number
}

/** Knock-ons are looked for only where the setup holds more than the piece; otherwise its own changes are all there are. */
function rank(swept: Sweep, pieces: readonly Piece[]): Ranked[] {
  const { bench, verdicts, changes, quantities, judgedOf } = swept
  const isAlone = bench.scene.others.length === 0 && bench.kind !== 'tank'
  return pieces.map((piece, index) => {
    const own = verdicts[index]!
    const judged = judgedOf(index)
    const knockOns =
      isAlone || own === 'no' ? undefined : findKnockOns(bench, { piece, quantity: quantities[index]! }, judged, own)
    return {
      index,
      verdict: own === 'fits' && knockOns && knockOns.length > 0 ? 'changes' : own,
      knockOns,
      demands: knockOns?.length ?? changes[index]!,
      backing: rankConfidence(rateConfidence(piece, judged)),
    }
  })
}

const verdictRank = Object.fromEntries(verdictOrder.map((verdict, index) => [verdict, index])) as Record<
  Verdict,
  number
>

function compare(swept: Sweep, pieces: readonly Piece[]) {
  const slugOf = (index: number) => pieces[index]?.gear?.slug ?? ''
  return (a: Ranked, b: Ranked): number =>
    verdictRank[a.verdict] - verdictRank[b.verdict] ||
    a.demands - b.demands ||
    swept.targets[a.index]! - swept.targets[b.index]! ||
    a.backing - b.backing ||
    (slugOf(a.index) < slugOf(b.index) ? -1 : 1)
}

const decides = (judged: readonly Judged[], verdict: Verdict): readonly Judged[] =>
  verdict === 'no'
    ? judged.filter((one) => (one.eitherWay ?? one.outcome) === 'fail')
    : judged.filter((one) => one.outcome === 'nodata' && one.eitherWay === undefined && one.rule.worst === 'fail')

function tally<T>(
  entries: readonly T[],
  keysOf: (entry: T) => readonly string[],
): readonly { key: string; count: number }[] {
  const counts = new Map<string, number>()
  for (const entry of entries) for (const key of new Set(keysOf(entry))) counts.set(key, (counts.get(key) ?? 0) + 1)
  return [...counts]
    .map(([key, count]) => ({ key, count }))
    .sort((a, b) => b.count - a.count || (a.key < b.key ? -1 : 1))
}

const mostMarks = 400

function markAll(scales: readonly Scale[], ranked: readonly Ranked[], pieces: readonly Piece[]): readonly Mark[] {
  return ranked.slice(0, mostMarks).flatMap(({ index, verdict }) => {
    const { gear, specs } = pieces[index]!
    if (!gear) return []
    return [
      {
        ...gear,
        verdict,
        values: Object.fromEntries(scales.map(({ key }) => [key, readNumber(specs, key) ?? null])),
      },
    ]
  })
}

/**
 * Every piece of a kind judged in a setup and put in order: verdict, fewer knock-ons, closeness to the kind's target,
 * backing, slug. `pieces` must be one kind's, and the same array from call to call where speed matters.
 * RangeError where the tank has neither an outside size nor a volume.
 */
export function fit(
  setup: Setup,
  kind: KindKey,
  pieces: readonly Piece[],
  options: FitOptions & CandidateOptions,
): FitResult {
  const words = createPrinter(setup.units)
  const swept = sweep(setup, kind, pieces, options)
  const { scene } = swept.bench
  const ranked = rank(swept, pieces).sort(compare(swept, pieces))
  const byVerdict = (verdict: Verdict) => ranked.filter((one) => one.verdict === verdict)
  const failed = byVerdict('no')
  const unknown = byVerdict('unknown')
  const decidingRules = ({ index, verdict }: Ranked) =>
    decides(swept.judgedOf(index), verdict).map(({ rule }) => rule.id)
  const asked = ranked.filter(
    (one) =>
      (!options.verdict || one.verdict === options.verdict) &&
      (!options.check || decidingRules(one).includes(options.check)),
  )
  const labels = new Map(getRules(kind).rules.map(({ id, failLabel }) => [id, failLabel]))
  const scales = options.scales ? getRules(kind).scales?.(scene, words) : undefined
  const answers = asked.slice(options.offset, options.offset + options.limit).map(({ index, verdict, knockOns }) => {
    const judged = swept.judgedOf(index)
    const candidate = { piece: pieces[index]!, quantity: swept.quantities[index]! }
    const found = knockOns ?? (verdict === 'no' ? [] : findKnockOns(swept.bench, candidate, judged, verdict))
    const placement = findPlacement(judged)
    return presentAnswer(scene, { candidate, judged, verdict, knockOns: found, ...(placement && { placement }) }, words)
  })
  return {
    answers,
    counts: {
      fits: byVerdict('fits').length,
      changes: byVerdict('changes').length,
      no: failed.length,
      unknown: unknown.length,
    },
    failedBy: tally(failed, decidingRules).map(({ key, count }) => ({
      check: key,
      count,
      label: labels.get(key) ?? key,
    })),
    missingBy: tally(unknown, ({ index, verdict }) =>
      decides(swept.judgedOf(index), verdict).flatMap(({ judgement }) => judgement.missing ?? []),
    ).map(({ key, count }) => ({ key, count, label: getAttribute(kind, key)?.label ?? key })),
    assumptions: listAssumptions(scene.plan, words),
    total: asked.length,
    ...(scales && { scales, marks: markAll(scales, ranked, pieces) }),
  }
}
