import { and, asc, count, desc, eq, getTableColumns, inArray, isNull, sql, type SQL } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { gear, gearRevisions, gearValues } from '../../db/schema/index'

type SearchColumn = 'searchName' | 'searchCode' | 'searchFullCode' | 'searchTerms' | 'searchVersion'

/** What a piece is found by is nobody's reading. */
const rowColumns = Object.fromEntries(
  Object.entries(getTableColumns(gear)).filter(([name]) => !name.startsWith('search')),
) as Omit<ReturnType<typeof getTableColumns<typeof gear>>, SearchColumn>

export type GearRow = Omit<typeof gear.$inferSelect, SearchColumn>

/** The last row of a page, as far as the order needs it. */
export type GearPlace =
  | { readonly sort: 'name'; readonly brand: string; readonly model: string; readonly id: number }
  | { readonly sort: '-updated'; readonly updatedAt: string; readonly id: number }

const lowerBrand = sql`lower(${gear.brand})`
const lowerModel = sql`lower(${gear.model})`

/** In the catalogue: neither merged into another piece nor retired. */
const isLive = and(isNull(gear.mergedInto), isNull(gear.retiredAt))

function ofKind(kind: string | undefined): SQL | undefined {
  return and(isLive, kind === undefined ? undefined : eq(gear.kind, kind))
}

function startAfter(place: GearPlace | null): SQL | undefined {
  if (place === null) return undefined
  if (place.sort === 'name') {
    return sql`(${lowerBrand}, ${lowerModel}, ${gear.id}) > (lower(${place.brand}), lower(${place.model}), ${place.id}::int)`
  }
  return sql`(${gear.updatedAt}, ${gear.id}) < (${place.updatedAt}::timestamptz, ${place.id}::int)`
}

export async function listGear(
  db: Database,
  kind: string | undefined,
  sort: GearPlace['sort'],
  after: GearPlace | null,
  limit: number,
): Promise<GearRow[]> {
  const order = sort === 'name' ? [lowerBrand, lowerModel, asc(gear.id)] : [desc(gear.updatedAt), desc(gear.id)]
  return db
    .select(rowColumns)
    .from(gear)
    .where(and(ofKind(kind), startAfter(after)))
    .orderBy(...order)
    .limit(limit)
}

/** The rows of a page whose order was settled elsewhere. */
export async function listGearById(db: Database, ids: readonly number[]): Promise<GearRow[]> {
  if (ids.length === 0) return []
  const rows = await db
    .select(rowColumns)
    .from(gear)
    .where(inArray(gear.id, [...ids]))
  const rowById = new Map(rows.map((row) => [row.id, row]))
  return ids.flatMap((id) => rowById.get(id) ?? [])
}

export async function countGear(db: Database, kind: string | undefined): Promise<number> {
  const [row] = await db.select({ total: count() }).from(gear).where(ofKind(kind))
  return row?.total ?? 0
}

export async function findGear(db: Database, slug: string): Promise<GearRow | null> {
  const [row] = await db.select(rowColumns).from(gear).where(eq(gear.slug, slug))
  return row ?? null
}

export async function findSlug(db: Database, id: number): Promise<string | null> {
  const [row] = await db.select({ slug: gear.slug }).from(gear).where(eq(gear.id, id))
  return row?.slug ?? null
}

const revisionColumns = {
  number: gearRevisions.number,
  author: gearRevisions.author,
  authorId: gearRevisions.authorId,
  summary: gearRevisions.summary,
  createdAt: gearRevisions.createdAt,
  changed: sql<
    string[]
  >`coalesce(array_agg(${gearValues.key} order by ${gearValues.key}) filter (where ${gearValues.key} is not null), '{}')`,
}

const setValues = and(eq(gearValues.gearId, gearRevisions.gearId), eq(gearValues.revision, gearRevisions.number))
const oneRevision = [gearRevisions.gearId, gearRevisions.number] as const

export async function listRevisions(db: Database, gearId: number) {
  return db
    .select(revisionColumns)
    .from(gearRevisions)
    .leftJoin(gearValues, setValues)
    .where(eq(gearRevisions.gearId, gearId))
    .groupBy(...oneRevision)
    .orderBy(desc(gearRevisions.number))
}

export async function findRevision(db: Database, gearId: number, number: number) {
  const [row] = await db
    .select({ ...revisionColumns, specs: gearRevisions.specs })
    .from(gearRevisions)
    .leftJoin(gearValues, setValues)
    .where(and(eq(gearRevisions.gearId, gearId), eq(gearRevisions.number, number)))
    .groupBy(...oneRevision)
  return row ?? null
}

export type RevisionRow = NonNullable<Awaited<ReturnType<typeof findRevision>>>
export type RevisionSummaryRow = Awaited<ReturnType<typeof listRevisions>>[number]
