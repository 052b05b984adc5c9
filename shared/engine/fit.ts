import type { KindKey } from '../kinds/index'
import { createPrinter } from '../units/print'
import { findRestKnockOns, setBench } from './bench'
import { assessCandidate, type CandidateOptions } from './candidates'
import { nameTogether } from './joint'
import { listAnswers } from './list-answers'
import { presentAnswer } from './present-answer'
import { groupByVerdict } from './ranking'
import { drawScales } from './scales'
import { sweep } from './sweep'
import type { JudgeAnew } from './turns/find-turn'
import type { Answer, FitOptions, FitResult, Piece, Setup } from './types'
import { verdictOrder } from './verdict'

/**
 * One piece judged in place of the setup's pieces of its kind (or of `instead`, or `beside` them).
 * RangeError where the tank has neither an outside size nor a volume.
 */
export function fitCheck(setup: Setup, piece: Piece, options: CandidateOptions = {}): Answer {
  const bench = setBench(setup, piece.kind, options)
  const assessed = assessCandidate(bench, piece, options)
  return presentAnswer(bench.scene, assessed, createPrinter(setup.units), judgeInChanged(setup, piece, options))
}

/** The piece judged in the setup with one of its numbers changed. */
const judgeInChanged =
  (setup: Setup, piece: Piece, options: CandidateOptions): JudgeAnew =>
  (change) =>
    assessCandidate(setBench(change(setup), piece.kind, options), piece, options).verdict

/**
 * Every piece of a kind judged in a setup and put in order: verdict, fewer knock-ons, closeness to the kind's target,
 * backing, slug; where only several together answer, those as one. `pieces` must be one kind's, and the same array from
 * call to call where speed matters. RangeError where the tank has neither an outside size nor a volume.
 */
export function fit(
  setup: Setup,
  kind: KindKey,
  pieces: readonly Piece[],
  options: FitOptions & CandidateOptions,
): FitResult {
  const words = createPrinter(setup.units)
  const bench = setBench(setup, kind, options)
  const swept = sweep(bench, pieces, options)
  const findRest = (candidate: Parameters<typeof findRestKnockOns>[1]) => findRestKnockOns(bench, candidate)
  const { found, ...listed } = listAnswers(swept, pieces, options, findRest, words)
  const answers = found.map(({ assessed, pieces: joined }) => {
    if (joined) return nameTogether(presentAnswer(bench.scene, assessed, words), joined)
    return presentAnswer(bench.scene, assessed, words, judgeInChanged(setup, assessed.candidate.piece, options))
  })
  if (!options.scales) return { ...listed, answers }
  const groups = groupByVerdict(swept)
  const order = verdictOrder.flatMap((verdict) => groups[verdict])
  return { ...listed, answers, ...drawScales(kind, swept, order, pieces, words) }
}
