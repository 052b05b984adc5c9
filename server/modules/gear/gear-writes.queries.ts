import { eq, inArray } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { gear, gearRevisions, gearValues } from '../../db/schema/index'
import type { PreparedPiece, PreparedRevision } from './gear.types'
import { toSearchColumns } from './search-columns'

/** PostgreSQL takes at most 65 535 parameters in one statement. */
const rowsPerInsert = 4000

async function insertInChunks<Row>(rows: readonly Row[], insert: (chunk: Row[]) => Promise<unknown>): Promise<void> {
  for (let start = 0; start < rows.length; start += rowsPerInsert)
    await insert(rows.slice(start, start + rowsPerInsert))
}

export async function insertRevisions(
  db: Database,
  entries: readonly { readonly gearId: number; readonly revision: PreparedRevision; readonly createdAt: Date }[],
): Promise<void> {
  const revisions = entries.map(({ gearId, revision: { state, input }, createdAt }) => {
    return { gearId, number: state.number, specs: state.specs, summary: input.summary, author: input.author, createdAt }
  })
  const values = entries.flatMap(({ gearId, revision: { state, input } }) => {
    const common = { gearId, revision: state.number, dated: input.date, author: input.author }
    return Object.entries(input.values).map(([key, value]) => ({ ...common, key, ...value }))
  })
  await insertInChunks(revisions, (chunk) => db.insert(gearRevisions).values(chunk))
  await insertInChunks(values, (chunk) => db.insert(gearValues).values(chunk))
}

/** Adds whole pieces; answers their ids by slug. */
export async function insertGear(
  db: Database,
  entries: readonly { readonly piece: PreparedPiece; readonly createdAt: Date; readonly updatedAt: Date }[],
): Promise<Map<string, number>> {
  const ids = new Map<string, number>()
  const rows = entries.map(({ piece: { identity, head }, createdAt, updatedAt }) => {
    const { number, specs, provenance } = head.state
    return {
      ...identity,
      ...toSearchColumns({ ...identity, specs }),
      headRevision: number,
      specs,
      provenance,
      createdAt,
      updatedAt,
    }
  })
  await insertInChunks(rows, async (chunk) => {
    const inserted = await db.insert(gear).values(chunk).returning({ id: gear.id, slug: gear.slug })
    for (const { id, slug } of inserted) ids.set(slug, id)
  })
  return ids
}

const headColumns = {
  id: gear.id,
  slug: gear.slug,
  kind: gear.kind,
  brand: gear.brand,
  model: gear.model,
  status: gear.status,
  gtin: gear.gtin,
  notes: gear.notes,
  mergedInto: gear.mergedInto,
  retiredAt: gear.retiredAt,
  number: gear.headRevision,
  specs: gear.specs,
  provenance: gear.provenance,
}

/** Takes the row's lock, so that two revisions cannot both build on the same head. */
export async function lockHead(db: Database, slug: string) {
  const [row] = await db.select(headColumns).from(gear).where(eq(gear.slug, slug)).for('update')
  return row ?? null
}

export async function lockHeadById(db: Database, id: number) {
  const [row] = await db.select(headColumns).from(gear).where(eq(gear.id, id)).for('update')
  return row ?? null
}

export async function lockHeads(db: Database, slugs: readonly string[]) {
  if (slugs.length === 0) return []
  return db
    .select(headColumns)
    .from(gear)
    .where(inArray(gear.slug, [...slugs]))
    .orderBy(gear.id)
    .for('update')
}

export async function updateHead(
  db: Database,
  head: { readonly id: number; readonly kind: string; readonly brand: string; readonly model: string },
  { number, specs, provenance }: PreparedRevision['state'],
  updatedAt: Date,
): Promise<void> {
  const searched = toSearchColumns({ ...head, specs })
  await db
    .update(gear)
    .set({ ...searched, headRevision: number, specs, provenance, updatedAt })
    .where(eq(gear.id, head.id))
}
