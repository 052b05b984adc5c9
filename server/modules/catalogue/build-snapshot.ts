import { isKindKey, kindKeys, type KindKey } from '#shared/kinds/index'
import type { Piece, Value } from '#shared/engine/types'
import type { PieceRow } from './catalogue.queries'

/** Everything in the catalogue at one version, as the engine reads it. Shared by all requests: nothing in it may be changed. */
export interface Snapshot {
  readonly version: number
  readonly byKind: Readonly<Record<KindKey, readonly Piece[]>>
  readonly bySlug: ReadonlyMap<string, Piece>
}

function toPiece(row: PieceRow, kind: KindKey): Piece {
  const specs: Record<string, Value> = {}
  for (const [key, value] of Object.entries(row.specs)) {
    const backing = row.provenance[key]
    specs[key] = {
      value,
      source: backing?.source ?? 'estimate',
      ...(backing?.plusMinus !== undefined && { plusMinus: backing.plusMinus }),
    }
  }
  return { kind, specs, gear: { slug: row.slug, brand: row.brand, model: row.model } }
}

export function buildSnapshot(version: number, rows: readonly PieceRow[]): Snapshot {
  const byKind = Object.fromEntries(kindKeys.map((key) => [key, [] as Piece[]])) as Record<KindKey, Piece[]>
  const bySlug = new Map<string, Piece>()
  for (const row of rows) {
    if (!isKindKey(row.kind)) continue
    const piece = toPiece(row, row.kind)
    byKind[row.kind].push(piece)
    bySlug.set(row.slug, piece)
  }
  return { version, byKind, bySlug }
}
