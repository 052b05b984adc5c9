import type { KindKey } from '../kinds/index'
import { getAttribute } from '../kinds/index'
import { createPrinter, type Printer } from '../units/print'
import {
  assessCandidate,
  complete,
  findRestKnockOns,
  setBench,
  type AssessedCandidate,
  type CandidateOptions,
} from './candidates'
import { getRules } from './checks/index'
import { listAssumptions } from './assumptions'
import { presentKnockOns } from './knock-ons'
import { groupByVerdict, sortGroup, takePage } from './ranking'
import { presentCautions, presentCheck } from './present'
import { drawScales } from './scales'
import { sweep, type Sweep } from './sweep'
import type { Answer, FitOptions, FitResult, Piece, Setup } from './types'
import { decideVerdict, rateConfidence, verdictOrder } from './verdict'

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
    cautions: presentCautions(judged, words),
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

function tally(
  indexes: readonly number[],
  keysOf: (index: number) => readonly string[],
): readonly { key: string; count: number }[] {
  const counts = new Map<string, number>()
  for (const index of indexes) for (const key of new Set(keysOf(index))) counts.set(key, (counts.get(key) ?? 0) + 1)
  return [...counts]
    .map(([key, count]) => ({ key, count }))
    .sort((a, b) => b.count - a.count || (a.key < b.key ? -1 : 1))
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
  const { bench } = swept
  const groups = groupByVerdict(swept)
  const { check } = options
  const asked = verdictOrder.filter((verdict) => !options.verdict || verdict === options.verdict)
  const page = takePage(
    asked.map((verdict) =>
      check ? groups[verdict].filter((index) => swept.isDecidedBy(index, check)) : groups[verdict],
    ),
    options.offset,
    options.limit,
    (indexes, needed) => sortGroup(indexes, swept, pieces, needed),
  )
  const rules = getRules(kind)
  const labels = new Map(rules.rules.map(({ id, failLabel }) => [id, failLabel]))
  const answers = page.indexes.map((index) => {
    const candidate = swept.candidateOf(index)
    const judged = swept.judgedOf(index)
    const own = decideVerdict(judged)
    return presentAnswer(
      bench.scene,
      complete(candidate, judged, own, own === 'no' ? [] : findRestKnockOns(bench, candidate)),
      words,
    )
  })
  const { fits, changes, no, unknown } = groups
  return {
    answers,
    counts: { fits: fits.length, changes: changes.length, no: no.length, unknown: unknown.length },
    failedBy: swept.countFailures().map(({ check, count }) => ({ check, count, label: labels.get(check) ?? check })),
    missingBy: tally(unknown, (index) => swept.tableOf(index).missingOf(index)).map(({ key, count }) => ({
      key,
      count,
      label: getAttribute(kind, key)?.label ?? key,
    })),
    assumptions: listAssumptions(bench.scene.plan, words),
    total: page.total,
    ...(options.scales &&
      drawScales(
        kind,
        swept,
        verdictOrder.flatMap((verdict) => groups[verdict]),
        pieces,
        words,
      )),
  }
}
