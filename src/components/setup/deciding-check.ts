import type { Check, Outcome } from '#shared/engine/types'

const severity: Readonly<Record<Outcome, number>> = { fail: 0, nodata: 1, change: 2, pass: 3 }

/** How near to its limit; a check without numbers has no nearness. */
function findTightness({ margin, probability }: Check): number {
  if (probability !== undefined && probability < 0.95) return probability - 1
  return margin ?? Number.POSITIVE_INFINITY
}

/** The check that decides for a piece: the worst one, and of several alike the one with least to spare. */
export function findDecidingCheck(checks: readonly Check[]): Check | undefined {
  return [...checks].sort((a, b) => severity[a.outcome] - severity[b.outcome] || findTightness(a) - findTightness(b))[0]
}
