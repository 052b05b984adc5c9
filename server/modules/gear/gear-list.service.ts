import { z } from 'zod'
import type { KindKey } from '#shared/kinds/index'
import type { GearList } from '#shared/schemas/gear'
import type { Database } from '../../db/database'
import { createCursor, readCursor } from '../../lib/cursor'
import type { CatalogueEntry, Snapshot } from '../catalogue/build-snapshot'
import type { Catalogue } from '../catalogue/catalogue.service'
import { siftEntries, type Facets } from './gear-facets'
import { toTest } from './gear-filters'
import { describeEmpty, describePassedOver } from './gear-hints'
import { getOrders, sortEntries } from './gear-order'
import type { GearListQuery } from './gear-query'
import { presentGearItem } from './gear.presenter'
import { countGear, listGear, listGearById, type GearPlace, type GearRow } from './gear.queries'
import { searchCatalogue, type SearchResult } from './gear-search.service'

const idSchema = z.int().min(1).max(2_147_483_647)

const placeSchema = z.discriminatedUnion('sort', [
  z.strictObject({ sort: z.literal('name'), brand: z.string(), model: z.string(), id: idSchema }),
  z.strictObject({ sort: z.literal('-updated'), updatedAt: z.iso.datetime(), id: idSchema }),
])

const rankSchema = z.strictObject({ offset: z.int().min(1).max(10_000_000), id: idSchema })

function toPlace(sort: GearPlace['sort'], row: GearRow): GearPlace {
  if (sort === 'name') return { sort, brand: row.brand, model: row.model, id: row.id }
  return { sort, updatedAt: row.updatedAt.toISOString(), id: row.id }
}

const wholeFacets = new WeakMap<Snapshot, Map<KindKey | undefined, Facets>>()

function listEntries({ entries }: Snapshot, kind: KindKey | undefined): readonly CatalogueEntry[] {
  return kind === undefined ? entries : entries.filter((entry) => entry.kind === kind)
}

/** Those of a whole kind are asked for again and again, and stay true as long as the snapshot. */
function findWholeFacets(snapshot: Snapshot, kind: KindKey | undefined): Facets {
  const known = wholeFacets.get(snapshot) ?? new Map<KindKey | undefined, Facets>()
  wholeFacets.set(snapshot, known)
  const facets = known.get(kind) ?? siftEntries(kind, listEntries(snapshot, kind), []).facets
  known.set(kind, facets)
  return facets
}

/** The list in an order that the database keeps, straight from it. */
async function listPlain(
  db: Database,
  snapshot: Snapshot,
  { kind, limit, cursor }: GearListQuery,
  sort: GearPlace['sort'],
): Promise<GearList> {
  const question = JSON.stringify(['gear', kind, sort])
  const after = cursor === undefined ? null : readCursor(cursor, question, placeSchema)
  const [rows, total] = await Promise.all([listGear(db, kind, sort, after, limit + 1), countGear(db, kind)])
  const items = rows.slice(0, limit)
  const last = items.at(-1)
  const next = rows.length > limit && last !== undefined ? createCursor(toPlace(sort, last), question) : null
  const facets = findWholeFacets(snapshot, kind)
  return { items: items.map(presentGearItem), total, facets, hint: null, loosen: [], next }
}

/** Search results as entries. A piece newer than the snapshot has none yet; without filters it is listed all the same. */
function toEntries(snapshot: Snapshot, { search, ids, rest }: SearchResult) {
  const { byId, nameRank } = getOrders(snapshot)
  const meant = new Set(search.spans.filter(({ isExact }) => isExact).flatMap(({ kinds }) => [...kinds]))
  const isMeant = (id: number) => {
    const entry = byId.get(id)
    return entry !== undefined && meant.has(entry.kind)
  }
  const ordered = rest.toSorted(
    (a, b) =>
      Number(isMeant(b)) - Number(isMeant(a)) || (nameRank.get(a) ?? Infinity) - (nameRank.get(b) ?? Infinity) || a - b,
  )
  const all = [...ids, ...ordered]
  return {
    entries: all.flatMap((id) => byId.get(id) ?? []),
    newer: new Set(all.filter((id) => !byId.has(id))),
    all,
  }
}

function orderIds(
  snapshot: Snapshot,
  query: GearListQuery,
  found: ReturnType<typeof toEntries> | null,
  passed: readonly CatalogueEntry[],
) {
  const sorted = sortEntries(snapshot, passed, query.sort).map(({ id }) => id)
  if (found === null || found.newer.size === 0 || query.filters.length > 0) return sorted
  return query.sort === 'relevance' ? found.all : [...sorted, ...found.newer]
}

/** A cursor says how far, and after which piece: where others came or went in between, the piece decides. */
function findStart(ids: readonly number[], cursor: string | undefined, question: string): number {
  if (cursor === undefined) return 0
  const { offset, id } = readCursor(cursor, question, rankSchema)
  const index = ids.indexOf(id)
  return index === -1 ? Math.min(offset, ids.length) : index + 1
}

/** The list narrowed by a text and by filters, in any of its orders. */
async function listSelected(db: Database, snapshot: Snapshot, query: GearListQuery): Promise<GearList> {
  const { kind, q, filters, sort, limit, cursor } = query
  const question = JSON.stringify(['gear', kind, q, filters, sort])
  const result = q === undefined ? null : await searchCatalogue(db, q, kind)
  const found = result === null ? null : toEntries(snapshot, result)
  const { passed, facets, without } = siftEntries(
    kind,
    found?.entries ?? listEntries(snapshot, kind),
    filters.map(toTest),
  )
  const ids = orderIds(snapshot, query, found, passed)
  const start = findStart(ids, cursor, question)
  const page = ids.slice(start, start + limit)
  const rows = await listGearById(db, page)
  const last = page.at(-1)
  const end = start + page.length
  const next = last !== undefined && end < ids.length ? createCursor({ offset: end, id: last }, question) : null
  const loosen =
    ids.length > 0 ? [] : [...without].map(([key, total]) => ({ key, total })).toSorted((a, b) => b.total - a.total)
  const hint = ids.length === 0 ? describeEmpty(query, result, loosen) : describePassedOver(result)
  return { items: rows.map(presentGearItem), total: ids.length, facets, hint, loosen, next }
}

export async function searchGear(db: Database, catalogue: Catalogue, query: GearListQuery): Promise<GearList> {
  const snapshot = await catalogue.snapshot()
  const { q, filters, sort } = query
  const isPlain = q === undefined && filters.length === 0 && (sort === 'name' || sort === '-updated')
  return isPlain ? listPlain(db, snapshot, query, sort) : listSelected(db, snapshot, query)
}
