import type { Sweep } from './sweep'
import type { Piece, Verdict } from './types'
import { rankConfidence, rateConfidence } from './verdict'

/** Indexes of the pieces with each verdict, in catalogue order. */
export function groupByVerdict({ verdicts }: Sweep): Readonly<Record<Verdict, number[]>> {
  const groups: Record<Verdict, number[]> = { fits: [], changes: [], unknown: [], no: [] }
  verdicts.forEach((verdict, index) => groups[verdict].push(index))
  return groups
}

/** Pieces of one verdict in order: fewer demands, closeness to the target, backing, slug. */
export function sortGroup(indexes: readonly number[], swept: Sweep, pieces: readonly Piece[]): number[] {
  const backings = new Map<number, number>()
  // Only ties ask how well the data is backed, which takes every probability of a piece to tell.
  const backingOf = (index: number): number => {
    const known = backings.get(index)
    if (known !== undefined) return known
    const rank = rankConfidence(rateConfidence(pieces[index]!, swept.judgedOf(index)))
    backings.set(index, rank)
    return rank
  }
  const slugOf = (index: number) => pieces[index]!.gear?.slug ?? ''
  return [...indexes].sort(
    (a, b) =>
      swept.demands[a]! - swept.demands[b]! ||
      swept.targets[a]! - swept.targets[b]! ||
      backingOf(a) - backingOf(b) ||
      (slugOf(a) < slugOf(b) ? -1 : slugOf(a) > slugOf(b) ? 1 : a - b),
  )
}

/** One page of several groups one after the other; only the groups that the page touches are put in order. */
export function takePage(
  groups: readonly (readonly number[])[],
  offset: number,
  limit: number,
  sort: (group: readonly number[]) => readonly number[],
): { indexes: readonly number[]; total: number } {
  const indexes: number[] = []
  let start = 0
  for (const group of groups) {
    const from = Math.max(0, offset + indexes.length - start)
    if (indexes.length < limit && from < group.length)
      indexes.push(...sort(group).slice(from, from + limit - indexes.length))
    start += group.length
  }
  return { indexes, total: start }
}
