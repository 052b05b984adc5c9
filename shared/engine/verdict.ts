import { defaultPlusMinus, isCloseCall } from './physics/conformance'
import { outcomeOf } from './concession'
import type { Judged } from './judge'
import type { Confidence, Piece, Source, Specs, Verdict } from './types'

export const verdictOrder: readonly Verdict[] = ['fits', 'changes', 'unknown', 'no']

/** The verdict that checks add up to: see "Outcomes and verdicts" on the method page. */
export function decideVerdict(judged: readonly Judged[]): Verdict {
  const outcomes = judged.map(outcomeOf)
  if (outcomes.includes('fail')) return 'no'
  if (judged.some(({ rule }, index) => outcomes[index] === 'nodata' && rule.worst === 'fail')) return 'unknown'
  return outcomes.includes('change') ? 'changes' : 'fits'
}

/** Whether a check could as well have gone the other way. */
export const isCloseJudgement = ({ judgement, outcome }: Judged): boolean =>
  outcome !== 'nodata' && judgement.probability !== undefined && isCloseCall(judgement.probability())

const bitOf: Readonly<Record<Source, number>> = { measured: 1, maker: 2, estimate: 4 }

/** Where the values under some keys came from, one bit per source. */
export const readSources = (specs: Specs, keys: readonly string[]): number =>
  keys.reduce((bits, key) => {
    const source = specs[key]?.source
    return source ? bits | bitOf[source] : bits
  }, 0)

/** One source alone, or a mixture; nothing that is known counts as an estimate. */
export function rateSources(bits: number): Confidence['level'] {
  if (bits === bitOf.measured) return 'measured'
  if (bits === bitOf.maker) return 'maker'
  return bits === 0 || bits === bitOf.estimate ? 'estimate' : 'mixed'
}

/** Where the values that decided came from, and how many checks could as well have gone the other way. */
export function rateConfidence({ specs }: Piece, judged: readonly Judged[]): Confidence {
  const bits = judged.reduce((all, { rule }) => all | readSources(specs, rule.reads), 0)
  return { level: rateSources(bits), closeCalls: judged.filter(isCloseJudgement).length }
}

const backing = Object.keys(defaultPlusMinus)

/** For ordering: 0 all measured, then maker, mixed, estimates. */
export const rankLevel = (level: Confidence['level']): number => (level === 'mixed' ? 1.5 : backing.indexOf(level))
