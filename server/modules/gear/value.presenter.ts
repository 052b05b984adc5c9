import type { EvidenceRef, Gear, Provenance, SourceOfValue } from '#shared/schemas/gear'
import type { NameAuthor } from '../people/people.service'
import type { HistoricValue } from './gear-revise.queries'
import { readSources } from './value-history'

export type FilesById = ReadonlyMap<string, EvidenceRef>

const noFiles: FilesById = new Map()

/** What backs a value, as everybody reads it. Null for one that was taken away. */
export function presentBacking(
  row: HistoricValue,
  nameAuthor: NameAuthor,
  published: FilesById = noFiles,
): Provenance | null {
  const { source, plusMinus, evidence, dated, revision, reviewerId, raw } = row
  if (source === null) return null
  const files = row.files.flatMap((id) => published.get(id) ?? [])
  return {
    source,
    ...(plusMinus !== null && { plusMinus }),
    ...(evidence !== null && { evidence }),
    date: dated,
    author: nameAuthor(row),
    revision,
    ...(reviewerId !== null && { reviewer: nameAuthor({ authorId: reviewerId }) }),
    ...(raw !== null && { raw }),
    ...(files.length > 0 && { files }),
  }
}

export function groupByKey(history: readonly HistoricValue[]): ReadonlyMap<string, HistoricValue[]> {
  const groups = new Map<string, HistoricValue[]>()
  for (const row of history) groups.set(row.key, [...(groups.get(row.key) ?? []), row])
  return groups
}

/** What backs each value in use. */
export function presentUsed(
  history: readonly HistoricValue[],
  nameAuthor: NameAuthor,
  published: FilesById = noFiles,
): Gear['provenance'] {
  const entries = [...groupByKey(history)].flatMap(([key, rows]) => {
    const { used } = readSources(rows)
    const presented = used === null ? null : presentBacking(used, nameAuthor, published)
    return presented === null ? [] : [[key, presented] as const]
  })
  return Object.fromEntries(entries)
}

/** All sources of one value that still count, the one in use first, then the newest. */
export function presentSources(
  rows: readonly HistoricValue[],
  nameAuthor: NameAuthor,
  published: FilesById = noFiles,
): SourceOfValue[] {
  const { used, live } = readSources(rows)
  return live
    .toReversed()
    .toSorted((a, b) => Number(b === used) - Number(a === used))
    .flatMap((row) => {
      const backing = presentBacking(row, nameAuthor, published)
      return backing === null ? [] : [{ ...backing, value: row.value, isUsed: row === used }]
    })
}
