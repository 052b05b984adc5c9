import type { Gear, GearItem, Provenance, Revision, RevisionSummary } from '#shared/schemas/gear'
import type { GearRow, RevisionRow, RevisionSummaryRow, ValueRow } from './gear.queries'

export function presentGearItem(row: GearRow): GearItem {
  return {
    slug: row.slug,
    kind: row.kind,
    brand: row.brand,
    model: row.model,
    gtin: row.gtin,
    status: row.status,
    revision: row.headRevision,
    updatedAt: row.updatedAt.toISOString(),
    specs: row.specs,
  }
}

export function presentGear(row: GearRow): Gear {
  return {
    ...presentGearItem(row),
    notes: row.notes,
    createdAt: row.createdAt.toISOString(),
    provenance: row.provenance,
  }
}

export function presentRevisionSummary(row: RevisionSummaryRow): RevisionSummary {
  const { number, author, summary, createdAt, changed } = row
  return { number, author, summary, createdAt: createdAt.toISOString(), changed }
}

function presentProvenance(row: ValueRow): Provenance | null {
  if (row.source === null) return null
  return {
    source: row.source,
    ...(row.plusMinus !== null && { plusMinus: row.plusMinus }),
    ...(row.evidence !== null && { evidence: row.evidence }),
    date: row.dated,
    author: row.author,
    revision: row.revision,
  }
}

export function presentRevision(gear: GearRow, revision: RevisionRow, values: readonly ValueRow[]): Revision {
  const provenance: Record<string, Provenance> = {}
  for (const row of values) {
    const presented = presentProvenance(row)
    if (presented !== null) provenance[row.key] = presented
  }
  return {
    slug: gear.slug,
    kind: gear.kind,
    ...presentRevisionSummary(revision),
    specs: revision.specs,
    provenance,
  }
}
