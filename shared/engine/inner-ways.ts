import type { Rule } from './rule'

/** Points of a usual range short of its end, nearer ones closer together; for a model of the whole tank a few. */
const innerShares: readonly number[] = [0.06, 0.15, 0.3, 0.5, 0.75]
const fewShares: readonly number[] = [0.3]

export const listInnerShares = ({ isModelled }: Rule): readonly number[] => (isModelled ? fewShares : innerShares)

const points = [0, ...innerShares, 1]
/** Further from its limit than this no point between two neighbours keeps it. */
const hopeless = -0.35
/** The same where nothing tried is better than what is there. */
const hopelessHere = -0.1
const golden = (Math.sqrt(5) - 1) / 2
const narrowings = 10

/**
 * The share of a direction at which a margin is greatest, between the neighbours of the best of a few points, by golden
 * section. Undefined where nothing turns on the direction, or it is far from enough at all of them. `at` is asked for the
 * few points, `near` for the rest.
 */
export function findPeak(
  at: (share: number) => number | null,
  near: (share: number) => number | null,
): number | undefined {
  const margins = points.map((share) => at(share) ?? -Infinity)
  const most = Math.max(...margins)
  const best = margins.indexOf(most)
  if (most < (best === 0 ? hopelessHere : hopeless) || margins.every((margin) => margin === most)) return undefined
  let low = points[Math.max(0, best - 1)] ?? 0
  let high = points[Math.min(points.length - 1, best + 1)] ?? 1
  const probe = (share: number) => ({ share, margin: near(share) ?? -Infinity })
  let left = probe(high - golden * (high - low))
  let right = probe(low + golden * (high - low))
  for (let step = 0; step < narrowings; step += 1) {
    if (left.margin > right.margin) {
      high = right.share
      right = left
      left = probe(high - golden * (high - low))
    } else {
      low = left.share
      left = right
      right = probe(low + golden * (high - low))
    }
  }
  return left.margin > right.margin ? left.share : right.share
}
