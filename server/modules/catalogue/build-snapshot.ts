import { isKindKey, kindKeys, type KindKey } from '#shared/kinds/index'
import type { GearRef, Piece, Value } from '#shared/engine/types'
import type { PieceRow } from './catalogue.queries'

/** A piece with what the list of gear is narrowed and ordered by, beside its specs. */
export interface CatalogueEntry {
  readonly id: number
  readonly kind: KindKey
  readonly piece: Piece
  readonly gear: GearRef
  readonly status: PieceRow['status']
  /** Milliseconds since 1970. */
  readonly updatedAt: number
}

/** Everything in the catalogue at one version, as the engine reads it. Shared by all requests: nothing in it may be changed. */
export interface Snapshot {
  readonly version: number
  readonly byKind: Readonly<Record<KindKey, readonly Piece[]>>
  readonly bySlug: ReadonlyMap<string, Piece>
  readonly entries: readonly CatalogueEntry[]
}

/** Gives the same object for equal values: thousands of pieces are alike in most of what is known of them. */
function createSharer(): (value: unknown, source: Value['source'], plusMinus: number | undefined) => Value {
  const known = new Map<string, Value>()
  return (value, source, plusMinus) => {
    const key = JSON.stringify([value, source, plusMinus])
    let shared = known.get(key)
    if (!shared) {
      shared = { value, source, ...(plusMinus !== undefined && { plusMinus }) }
      known.set(key, shared)
    }
    return shared
  }
}

type Share = ReturnType<typeof createSharer>

function toEntry(row: PieceRow, kind: KindKey, share: Share): CatalogueEntry {
  const specs: Record<string, Value> = {}
  for (const [key, value] of Object.entries(row.specs)) {
    const backing = row.provenance[key]
    specs[key] = share(value, backing?.source ?? 'estimate', backing?.plusMinus)
  }
  const { id, slug, brand, model, status } = row
  const gear = { slug, brand, model }
  return { id, kind, piece: { kind, specs, gear }, gear, status, updatedAt: row.updatedAt.getTime() }
}

/** Takes rows as they come, in the order of their ids. */
export function createSnapshotBuilder() {
  const byKind = Object.fromEntries(kindKeys.map((key) => [key, [] as Piece[]])) as Record<KindKey, Piece[]>
  const bySlug = new Map<string, Piece>()
  const entries: CatalogueEntry[] = []
  const share = createSharer()
  return {
    add(rows: readonly PieceRow[]): void {
      for (const row of rows) {
        if (!isKindKey(row.kind)) continue
        const entry = toEntry(row, row.kind, share)
        entries.push(entry)
        byKind[row.kind].push(entry.piece)
        bySlug.set(row.slug, entry.piece)
      }
    },
    finish: (version: number): Snapshot => ({ version, byKind, bySlug, entries }),
  }
}
