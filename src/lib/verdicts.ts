import type { Outcome, Verdict } from '#shared/engine/types'

export const verdictWords: Readonly<Record<Verdict, string>> = {
  fits: 'Fits',
  changes: 'Fits with changes',
  no: 'Does not fit',
  unknown: 'Not enough data',
}

/** A single check is coloured and marked like the verdict it would lead to alone. */
export const outcomeVerdicts: Readonly<Record<Outcome, Verdict>> = {
  pass: 'fits',
  change: 'changes',
  fail: 'no',
  nodata: 'unknown',
}

export const verdictTextClasses: Readonly<Record<Verdict, string>> = {
  fits: 'text-fits',
  changes: 'text-changes',
  no: 'text-no',
  unknown: 'text-unknown',
}
