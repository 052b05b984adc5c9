import type { Sweep } from './sweep'
import type { Piece, Verdict } from './types'
import { rankLevel, rateSources } from './verdict'

/** Indexes of the pieces with each verdict, in catalogue order. */
export function groupByVerdict({ verdicts }: Sweep): Readonly<Record<Verdict, number[]>> {
  const groups: Record<Verdict, number[]> = { fits: [], changes: [], unknown: [], no: [] }
  verdicts.forEach((verdict, index) => {
    if (verdict) groups[verdict].push(index)
  })
  return groups
}

function addTo<K>(lists: Map<K, number[]>, key: K, index: number): void {
  const list = lists.get(key)
  if (list) list.push(index)
  else lists.set(key, [index])
}

const inOrder = <T>(map: ReadonlyMap<number, T>): readonly T[] =>
  [...map].sort(([a], [b]) => a - b).map(([, value]) => value)

function splitBy(indexes: readonly number[], numberOf: (index: number) => number): readonly (readonly number[])[] {
  const lists = new Map<number, number[]>()
  for (const index of indexes) addTo(lists, numberOf(index), index)
  return inOrder(lists)
}

/** Lists of pieces that are alike in demands, extra pieces and closeness to the target, the best first. */
function* groupTies(indexes: readonly number[], { demands, extrasOf, targetOf }: Sweep): Generator<readonly number[]> {
  for (const alike of splitBy(indexes, (index) => demands[index]!))
    for (const cheap of splitBy(alike, extrasOf)) yield* splitBy(cheap, targetOf)
}

/**
 * The first of some tied pieces: fewer close calls, then better backing, then slug. Close calls take every probability of
 * a piece to tell, so they are counted only until enough pieces without one are found.
 */
function takeBest(tied: readonly number[], swept: Sweep, pieces: readonly Piece[], needed: number): readonly number[] {
  if (tied.length < 2) return tied
  const slugOf = (index: number) => pieces[index]!.gear?.slug ?? ''
  const ranks = new Map(tied.map((index) => [index, rankLevel(rateSources(swept.tableOf(index).sourcesOf(index)))]))
  const sorted = [...tied].sort(
    (a, b) => ranks.get(a)! - ranks.get(b)! || (slugOf(a) < slugOf(b) ? -1 : slugOf(a) > slugOf(b) ? 1 : a - b),
  )
  const byCloseCalls = new Map<number, number[]>()
  for (const index of sorted) {
    addTo(byCloseCalls, swept.tableOf(index).countCloseCalls(index), index)
    const clear = byCloseCalls.get(0)
    if (clear && clear.length >= needed) return clear
  }
  return [...byCloseCalls].sort(([a], [b]) => a - b).flatMap(([, list]) => list)
}

/** The first `needed` pieces of one verdict in order: fewer demands, fewer extra pieces, closeness to the target, backing, slug. */
export function sortGroup(
  indexes: readonly number[],
  swept: Sweep,
  pieces: readonly Piece[],
  needed: number,
): readonly number[] {
  const sorted: number[] = []
  for (const tied of groupTies(indexes, swept)) {
    if (sorted.length >= needed) break
    sorted.push(...takeBest(tied, swept, pieces, needed - sorted.length))
  }
  return sorted
}

/** One page of several groups one after the other; only the groups that the page touches are put in order. */
export function takePage(
  groups: readonly (readonly number[])[],
  offset: number,
  limit: number,
  sort: (group: readonly number[], needed: number) => readonly number[],
): { indexes: readonly number[]; total: number } {
  const indexes: number[] = []
  let start = 0
  for (const group of groups) {
    const from = Math.max(0, offset + indexes.length - start)
    const to = from + limit - indexes.length
    if (indexes.length < limit && from < group.length) indexes.push(...sort(group, to).slice(from, to))
    start += group.length
  }
  return { indexes, total: start }
}
