import { and, asc, eq, sql, type SQL } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { disputes, errorReports, gear } from '../../db/schema/index'

/** The last row of a page. */
export interface DeskPlace {
  readonly createdAt: string
  readonly id: string
}

const piece = { slug: gear.slug, kind: gear.kind, brand: gear.brand, model: gear.model }

const startAfter = (table: typeof disputes | typeof errorReports, after: DeskPlace | null): SQL | undefined =>
  after === null
    ? undefined
    : sql`(${table.createdAt}, ${table.id}) > (${after.createdAt}::timestamptz, ${after.id}::uuid)`

export async function listDisputes(db: Database, after: DeskPlace | null, limit: number) {
  return db
    .select({
      id: disputes.id,
      gearId: disputes.gearId,
      key: disputes.key,
      status: disputes.status,
      proposalId: disputes.proposalId,
      words: disputes.words,
      createdAt: disputes.createdAt,
      piece,
    })
    .from(disputes)
    .innerJoin(gear, eq(gear.id, disputes.gearId))
    .where(and(eq(disputes.status, 'open'), startAfter(disputes, after)))
    .orderBy(asc(disputes.createdAt), asc(disputes.id))
    .limit(limit)
}

export type DisputeRow = Awaited<ReturnType<typeof listDisputes>>[number]

export async function findDispute(db: Database, id: string) {
  const [row] = await db.select().from(disputes).where(eq(disputes.id, id))
  return row ?? null
}

interface Settlement {
  readonly personId: number
  readonly words: string
}

/** Of several that settle it at once, one does. */
export async function closeDispute(db: Database, id: string, { personId, words }: Settlement): Promise<boolean> {
  const closed = await db
    .update(disputes)
    .set({ status: 'settled', words, settledBy: personId, settledAt: new Date() })
    .where(and(eq(disputes.id, id), eq(disputes.status, 'open')))
    .returning({ id: disputes.id })
  return closed.length > 0
}

export async function listReports(db: Database, after: DeskPlace | null, limit: number) {
  return db
    .select({
      id: errorReports.id,
      key: errorReports.key,
      words: errorReports.words,
      personId: errorReports.personId,
      status: errorReports.status,
      createdAt: errorReports.createdAt,
      piece,
    })
    .from(errorReports)
    .innerJoin(gear, eq(gear.id, errorReports.gearId))
    .where(and(eq(errorReports.status, 'open'), startAfter(errorReports, after)))
    .orderBy(asc(errorReports.createdAt), asc(errorReports.id))
    .limit(limit)
}

export async function findReport(db: Database, id: string) {
  const [row] = await db.select().from(errorReports).where(eq(errorReports.id, id))
  return row ?? null
}

export async function closeReport(db: Database, id: string, personId: number): Promise<boolean> {
  const closed = await db
    .update(errorReports)
    .set({ status: 'settled', settledBy: personId, settledAt: new Date() })
    .where(and(eq(errorReports.id, id), eq(errorReports.status, 'open')))
    .returning({ id: errorReports.id })
  return closed.length > 0
}
