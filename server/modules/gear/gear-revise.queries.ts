import { and, asc, eq, lte } from 'drizzle-orm'
import type { Database } from '../../db/database'
import {
  gear,
  gearRevisions,
  gearValues,
  type IdentityChange,
  type StoredIdentity,
  type StoredProvenances,
  type StoredSpecs,
} from '../../db/schema/index'
import { toSearchColumns } from './search-columns'

const valueColumns = {
  revision: gearValues.revision,
  key: gearValues.key,
  value: gearValues.value,
  source: gearValues.source,
  plusMinus: gearValues.plusMinus,
  evidence: gearValues.evidence,
  dated: gearValues.dated,
  author: gearValues.author,
  authorId: gearValues.authorId,
  files: gearValues.files,
  raw: gearValues.raw,
  standing: gearValues.standing,
  reviewerId: gearRevisions.reviewerId,
}

const inRevision = and(eq(gearValues.gearId, gearRevisions.gearId), eq(gearValues.revision, gearRevisions.number))

/** Every value that the piece ever had up to a revision, oldest first. */
export async function listValueRows(db: Database, gearId: number, until?: number) {
  const isUntil = until === undefined ? undefined : lte(gearValues.revision, until)
  return db
    .select(valueColumns)
    .from(gearValues)
    .innerJoin(gearRevisions, inRevision)
    .where(and(eq(gearValues.gearId, gearId), isUntil))
    .orderBy(asc(gearValues.revision), asc(gearValues.key))
}

export type HistoricValue = Awaited<ReturnType<typeof listValueRows>>[number]

export async function listIdentityChanges(db: Database, gearId: number) {
  return db
    .select({ number: gearRevisions.number, identity: gearRevisions.identity })
    .from(gearRevisions)
    .where(eq(gearRevisions.gearId, gearId))
    .orderBy(asc(gearRevisions.number))
}

export type NewValue = Omit<typeof gearValues.$inferInsert, 'gearId' | 'revision'>

export interface NewRevision {
  readonly gearId: number
  readonly number: number
  readonly specs: StoredSpecs
  readonly summary: string | null
  readonly authorId: number
  readonly reviewerId: number | null
  readonly proposalId: string | null
  readonly identity: IdentityChange | null
  readonly values: readonly NewValue[]
}

export async function insertRevision(db: Database, { values, ...revision }: NewRevision): Promise<void> {
  await db.insert(gearRevisions).values(revision)
  const { gearId, number } = revision
  if (values.length > 0) await db.insert(gearValues).values(values.map((row) => ({ ...row, gearId, revision: number })))
}

export interface NewHead {
  readonly kind: string
  readonly identity: StoredIdentity
  readonly number: number
  readonly specs: StoredSpecs
  readonly provenance: StoredProvenances
}

export async function insertPiece(db: Database, slug: string, head: NewHead): Promise<number> {
  const { kind, identity, number, specs, provenance } = head
  const [row] = await db
    .insert(gear)
    .values({
      ...identity,
      ...toSearchColumns({ ...identity, kind, specs }),
      slug,
      kind,
      headRevision: number,
      specs,
      provenance,
    })
    .returning({ id: gear.id })
  if (row === undefined) throw new Error(`${slug} was not inserted`)
  return row.id
}

export async function updatePiece(db: Database, id: number, head: NewHead): Promise<void> {
  const { kind, identity, number, specs, provenance } = head
  await db
    .update(gear)
    .set({
      ...identity,
      ...toSearchColumns({ ...identity, kind, specs }),
      headRevision: number,
      specs,
      provenance,
      updatedAt: new Date(),
    })
    .where(eq(gear.id, id))
}
