import type { Judged } from './judge'
import type { Ask } from './rule'
import type { Outcome } from './types'

/** How much of a need is unmet, and what exactly, where one need can be about different things. */
export type Lack = Pick<Ask, 'need' | 'amount' | 'lacks'>

/** Whether what is asked was all asked before: no more of it, and nothing that was not lacking then. */
export function isCovered(now: Lack, before: Lack): boolean {
  if (now.need !== before.need) return false
  const isMore =
    now.amount === null || before.amount === null ? now.amount !== before.amount : now.amount > before.amount + 1e-9
  return !isMore && (now.lacks ?? []).every((one) => before.lacks?.includes(one))
}

/** What a check comes to: of no data what every usual value of the missing gives, where they agree. */
export const outcomeOf = ({ outcome, eitherWay }: Judged): Outcome => eitherWay ?? outcome

/** No data where that leaves the piece unjudged. */
export const isOpen = (judged: Judged): boolean => outcomeOf(judged) === 'nodata' && judged.rule.worst === 'fail'

/** Whether a replacement asks by a rule only what the piece before it asked. One that did not fit excuses no change. */
export function isConcededBy(was: Judged | undefined, now: Judged): boolean {
  if (!was) return false
  const [before, after] = [outcomeOf(was), outcomeOf(now)]
  if (after === 'fail') return before === 'fail'
  if (before !== 'change' || after !== 'change') return false
  const [had, asks] = [was.judgement.asks, now.judgement.asks]
  return had && asks ? isCovered(asks, had) : had === asks
}
