import type { Gear, GearItem, Revision, RevisionSummary } from '#shared/schemas/gear'
import type { NameAuthor } from '../people/people.service'
import type { GearRow, RevisionRow, RevisionSummaryRow } from './gear.queries'
import type { HistoricValue } from './gear-revise.queries'
import { groupByKey, presentSources, presentUsed, type FilesById } from './value.presenter'

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

export interface GearExtras {
  readonly history: readonly HistoricValue[]
  readonly published: FilesById
  readonly confirmations: readonly { readonly key: string; readonly count: number }[]
  readonly disputed: readonly string[]
}

export function presentGear(row: GearRow, extras: GearExtras, nameAuthor: NameAuthor): Gear {
  const { history, published, confirmations, disputed } = extras
  const sources = [...groupByKey(history)].map(([key, rows]) => {
    return [key, presentSources(rows, nameAuthor, published)] as const
  })
  return {
    ...presentGearItem(row),
    notes: row.notes,
    createdAt: row.createdAt.toISOString(),
    provenance: presentUsed(history, nameAuthor, published),
    confirmations: Object.fromEntries(confirmations.map(({ key, count }) => [key, count])),
    sources: Object.fromEntries(sources.filter(([, items]) => items.length > 1)),
    disputed: [...disputed],
  }
}

export function presentRevisionSummary(row: RevisionSummaryRow, nameAuthor: NameAuthor): RevisionSummary {
  const { number, summary, createdAt, changed } = row
  return { number, author: nameAuthor(row), summary, createdAt: createdAt.toISOString(), changed }
}

export function presentRevision(
  gear: GearRow,
  revision: RevisionRow,
  history: readonly HistoricValue[],
  nameAuthor: NameAuthor,
): Revision {
  return {
    slug: gear.slug,
    kind: gear.kind,
    ...presentRevisionSummary(revision, nameAuthor),
    specs: revision.specs,
    provenance: presentUsed(history, nameAuthor),
  }
}
