import type { StoredProvenance } from '../../db/schema/index'

export type Standing = 'plain' | 'chosen' | 'reset'

/** One row of a value's history, as far as telling which is used needs it. */
export interface HistoryRow {
  readonly revision: number
  readonly value: unknown
  readonly source: StoredProvenance['source'] | null
  readonly standing: Standing
  readonly author: string | null
  readonly authorId: number | null
}

const ranks = { estimate: 1, maker: 2, measured: 3 } as const

/** Whether a value takes the place of the one in use: the newest within the highest rank does, and what was settled. */
export function takesPlace(
  next: { readonly source: StoredProvenance['source']; readonly standing: Standing },
  used: { readonly source: StoredProvenance['source'] } | undefined,
): boolean {
  return next.standing !== 'plain' || used === undefined || ranks[next.source] >= ranks[used.source]
}

export interface Sources<Row> {
  readonly used: Row | null
  /** All that still count, in the order in which they came; of one person and kind of source the newest alone. */
  readonly live: readonly Row[]
}

type Backed<Row> = Row & { readonly source: StoredProvenance['source'] }

const isBacked = <Row extends HistoryRow>(row: Row): row is Backed<Row> => row.source !== null

function isOvertaken(row: HistoryRow, by: HistoryRow): boolean {
  return row.source === by.source && row.author === by.author && row.authorId === by.authorId
}

/** Reads one value's rows, oldest first: which is used, and which others still count. */
export function readSources<Row extends HistoryRow>(rows: readonly Row[]): Sources<Row> {
  let used: Backed<Row> | null = null
  let live: Row[] = []
  for (const row of rows) {
    if (!isBacked(row)) {
      used = null
      live = []
      continue
    }
    if (row.standing === 'reset') live = []
    live = [...live.filter((other) => !isOvertaken(other, row)), row]
    if (takesPlace(row, used ?? undefined)) used = row
  }
  return { used, live }
}

/** The values that were in use one after the other since a moderator last settled them; equal ones in a row are one. */
export function listUsed<Row extends HistoryRow>(rows: readonly Row[]): readonly Row[] {
  const turns: Row[] = []
  rows.forEach((row, index) => {
    if (row.standing !== 'plain') turns.length = 0
    const { used } = readSources(rows.slice(0, index + 1))
    const last = turns.at(-1)
    if (used !== null && (last === undefined || !isSameValue(last.value, used.value))) turns.push(used)
  })
  return turns
}

/** As PostgreSQL keeps it, an object's members have no order. */
function canonize(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(canonize)
  if (typeof value !== 'object' || value === null) return value
  const entries = Object.entries(value).toSorted(([a], [b]) => (a < b ? -1 : 1))
  return entries.map(([key, inner]) => [key, canonize(inner)])
}

/** Apart by less than this, two numbers are one as anybody would print them. */
const sameShare = 1e-6

export function isSameValue(a: unknown, b: unknown): boolean {
  if (typeof a === 'number' && typeof b === 'number') {
    return Math.abs(a - b) <= sameShare * Math.max(Math.abs(a), Math.abs(b))
  }
  return JSON.stringify(canonize(a)) === JSON.stringify(canonize(b))
}

/** A → B → A, and now B once more: the third turn between the same two values settles nothing. */
export function isThirdTurn(rows: readonly HistoryRow[], value: unknown): boolean {
  const [first, second, third] = listUsed(rows).slice(-3)
  if (first === undefined || second === undefined || third === undefined) return false
  return isSameValue(first.value, third.value) && isSameValue(second.value, value)
}
