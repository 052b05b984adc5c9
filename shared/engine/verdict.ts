import { defaultPlusMinus, isCloseCall } from './physics/conformance'
import type { Judged } from './judge'
import type { Confidence, Piece, Source, Verdict } from './types'

export const verdictOrder: readonly Verdict[] = ['fits', 'changes', 'unknown', 'no']

/** The verdict that checks add up to: see "Outcomes and verdicts" on the method page. */
export function decideVerdict(judged: readonly Judged[]): Verdict {
  const outcomes = judged.map(({ outcome, eitherWay }) => eitherWay ?? outcome)
  if (outcomes.includes('fail')) return 'no'
  if (judged.some(({ rule }, index) => outcomes[index] === 'nodata' && rule.worst === 'fail')) return 'unknown'
  return outcomes.includes('change') ? 'changes' : 'fits'
}

const isClose = ({ judgement, outcome }: Judged) =>
  outcome !== 'nodata' && judgement.probability !== undefined && isCloseCall(judgement.probability())

/** Where the values that decided came from, and how many checks could as well have gone the other way. */
export function rateConfidence(piece: Piece, judged: readonly Judged[]): Confidence {
  const sources = new Set<Source>()
  for (const { rule } of judged)
    for (const key of rule.reads) {
      const source = piece.specs[key]?.source
      if (source) sources.add(source)
    }
  const [only] = sources
  const level = sources.size === 1 && only ? only : sources.size === 0 ? 'estimate' : 'mixed'
  return { level, closeCalls: judged.filter(isClose).length }
}

const backing = Object.keys(defaultPlusMinus)

/** For ordering: 0 all measured, then maker, mixed, estimates; close calls behind clear ones. */
export function rankConfidence({ level, closeCalls }: Confidence): number {
  const rank = level === 'mixed' ? 1.5 : backing.indexOf(level)
  return rank + 10 * closeCalls
}
