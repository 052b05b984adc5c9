import { and, asc, eq, gt, inArray, isNull, or, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { gear, gearRevisions, gearValues, longJobs } from '../../db/schema/index'

export async function insertJob(db: Database, row: typeof longJobs.$inferInsert): Promise<string> {
  const [inserted] = await db.insert(longJobs).values(row).returning({ id: longJobs.id })
  if (inserted === undefined) throw new Error('The job was not inserted')
  return inserted.id
}

export async function findJob(db: Database, id: string) {
  const [row] = await db.select().from(longJobs).where(eq(longJobs.id, id))
  return row ?? null
}

/** Takes the job's lock: a second process that takes it up waits, and goes on from where the first came to. */
export async function lockJob(db: Database, id: string) {
  const [row] = await db.select().from(longJobs).where(eq(longJobs.id, id)).for('update')
  return row ?? null
}

export type JobRow = NonNullable<Awaited<ReturnType<typeof findJob>>>

export async function updateJob(
  db: Database,
  id: string,
  change: Partial<Pick<JobRow, 'status' | 'done' | 'total' | 'outcome' | 'endedAt'>>,
): Promise<void> {
  await db.update(longJobs).set(change).where(eq(longJobs.id, id))
}

/** Pieces that a person had a part in. A piece that was merged or retired already is left alone. */
function isTouchedBy(db: Database, personId: number) {
  const valued = db.select({ id: gearValues.gearId }).from(gearValues).where(eq(gearValues.authorId, personId))
  const revised = db
    .select({ id: gearRevisions.gearId })
    .from(gearRevisions)
    .where(eq(gearRevisions.authorId, personId))
  return and(or(inArray(gear.id, valued), inArray(gear.id, revised)), isNull(gear.mergedInto), isNull(gear.retiredAt))
}

export async function countTouched(db: Database, personId: number): Promise<number> {
  return db.$count(gear, isTouchedBy(db, personId))
}

export async function listTouched(db: Database, personId: number, after: number, limit: number): Promise<number[]> {
  const rows = await db
    .select({ id: gear.id })
    .from(gear)
    .where(and(isTouchedBy(db, personId), gt(gear.id, after)))
    .orderBy(asc(gear.id))
    .limit(limit)
  return rows.map(({ id }) => id)
}

/** Names of a piece that this person changed and that still stand as they left them, with what they were. */
export async function listIdentityBy(db: Database, gearId: number, personId: number) {
  return db
    .select({ number: gearRevisions.number, identity: gearRevisions.identity })
    .from(gearRevisions)
    .where(
      and(
        eq(gearRevisions.gearId, gearId),
        eq(gearRevisions.authorId, personId),
        sql`${gearRevisions.identity} is not null`,
      ),
    )
    .orderBy(asc(gearRevisions.number))
}
