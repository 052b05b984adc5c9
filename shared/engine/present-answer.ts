import type { Printer } from '../units/print'
import type { AssessedCandidate } from './candidates'
import { getRules } from './checks/index'
import { isOpen, outcomeOf } from './concession'
import { isDemand, presentKnockOns } from './knock-ons'
import { presentCautions, presentCheck } from './present'
import type { Scene } from './scene'
import { findTurn, type JudgeAnew } from './turns/find-turn'
import { presentTurn } from './turns/present-turn'
import type { Answer, Outcome } from './types'
import { rateConfidence } from './verdict'

/** The answer in one sentence: what is wrong, what is not known, what must change, or how it fits. */
function summarise(
  scene: Scene,
  { candidate, judged, verdict, placement, knockOns }: AssessedCandidate,
  words: Printer,
): string {
  const findFirst = (outcome: Outcome) => judged.find((one) => outcomeOf(one) === outcome)
  const decisive = verdict === 'no' ? findFirst('fail') : verdict === 'unknown' ? judged.find(isOpen) : undefined
  if (decisive) return presentCheck(decisive, words).message
  const summary = getRules(candidate.piece.kind).summary
  const covered = judged.filter(({ rule }) => summary?.covers.includes(rule.id))
  if (summary && covered.length > 0 && covered.every(({ outcome }) => outcome === 'pass'))
    return summary.write(scene, candidate, placement)(words)
  const changed = findFirst('change')
  if (changed) return presentCheck(changed, words).message
  const demand = knockOns.find(isDemand)
  if (demand) return demand.say(words)
  // What is not recorded and changes nothing is no way to say that a piece fits.
  const told = judged.find(({ outcome }) => outcome === 'pass') ?? judged[0]
  return told ? presentCheck(told, words).message : 'Nothing about it could be checked yet.'
}

/** An answer in words; with `judgeAnew` also what would turn it. */
export function presentAnswer(
  scene: Scene,
  assessed: AssessedCandidate,
  words: Printer,
  judgeAnew?: JudgeAnew,
): Answer {
  const { candidate, judged, verdict, placement, knockOns } = assessed
  const { piece, quantity } = candidate
  const gear = piece.gear ?? null
  const turn = judgeAnew && findTurn(scene, assessed, judgeAnew)
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
    ...(turn && { turnsBy: presentTurn(turn, verdict, words) }),
  }
}
