import type { Gear, GearItem, Provenance, Revision, RevisionSummary } from '#shared/schemas/gear'
import type { NameAuthor } from '../people/people.service'
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

function presentProvenances(stored: GearRow['provenance'], nameAuthor: NameAuthor): Gear['provenance'] {
  const entries = Object.entries(stored).map(([key, { authorId, ...backing }]) => {
    return [key, { ...backing, author: nameAuthor({ ...backing, authorId: authorId ?? null }) }] as const
  })
  return Object.fromEntries(entries)
}

export function presentGear(row: GearRow, nameAuthor: NameAuthor): Gear {
  return {
    ...presentGearItem(row),
    notes: row.notes,
    createdAt: row.createdAt.toISOString(),
    provenance: presentProvenances(row.provenance, nameAuthor),
    confirmations: {},
    sources: {},
    disputed: [],
  }
}

export function presentRevisionSummary(row: RevisionSummaryRow, nameAuthor: NameAuthor): RevisionSummary {
  const { number, summary, createdAt, changed } = row
  return { number, author: nameAuthor(row), summary, createdAt: createdAt.toISOString(), changed }
}

function presentProvenance(row: ValueRow, nameAuthor: NameAuthor): Provenance | null {
  if (row.source === null) return null
  return {
    source: row.source,
    ...(row.plusMinus !== null && { plusMinus: row.plusMinus }),
    ...(row.evidence !== null && { evidence: row.evidence }),
    date: row.dated,
    author: nameAuthor(row),
    revision: row.revision,
  }
}

export function presentRevision(
  gear: GearRow,
  revision: RevisionRow,
  values: readonly ValueRow[],
  nameAuthor: NameAuthor,
): Revision {
  const provenance: Record<string, Provenance> = {}
  for (const row of values) {
    const presented = presentProvenance(row, nameAuthor)
    if (presented !== null) provenance[row.key] = presented
  }
  return {
    slug: gear.slug,
    kind: gear.kind,
    ...presentRevisionSummary(revision, nameAuthor),
    specs: revision.specs,
    provenance,
  }
}
