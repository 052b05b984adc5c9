import type { Judgement } from './rule'

/** On which side of an interval something measured lies: −1 below, 1 above, 0 inside; undefined where the limit is none. */
export function findSide(judgement: Judgement | null | undefined): -1 | 0 | 1 | undefined {
  const { measured, limit } = judgement ?? {}
  if (typeof measured !== 'number' || limit === undefined || limit === null || typeof limit === 'number')
    return undefined
  return measured < limit[0] ? -1 : measured > limit[1] ? 1 : 0
}
