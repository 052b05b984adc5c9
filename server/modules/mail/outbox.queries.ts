import { and, desc, eq, inArray, lt, notExists, or, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { enqueueJob, jobSchema } from '../../db/job-queue'
import { outbox } from '../../db/schema/index'

export type NewLetter = Pick<
  typeof outbox.$inferInsert,
  'personId' | 'recipient' | 'kind' | 'subject' | 'textBody' | 'htmlBody' | 'unsubscribeUrl'
>

export type Letter = typeof outbox.$inferSelect
export type LetterStatus = Letter['status']

export async function insertLetter(db: Database, letter: NewLetter): Promise<void> {
  const [row] = await db.insert(outbox).values(letter).returning({ id: outbox.id })
  if (row !== undefined) await enqueueJob(db, 'letters', { id: row.id })
}

/** Counts the try before it is made, so that one that ends its process counts too. */
export async function claimLetter(db: Database, id: string): Promise<Letter | undefined> {
  const [letter] = await db
    .update(outbox)
    .set({ attempts: sql`${outbox.attempts} + 1` })
    .where(and(eq(outbox.id, id), eq(outbox.status, 'waiting')))
    .returning()
  return letter
}

export async function markSent(db: Database, id: string): Promise<void> {
  await db
    .update(outbox)
    .set({ status: 'sent', sentAt: sql`now()`, lastError: null })
    .where(eq(outbox.id, id))
}

export async function markFailed(db: Database, id: string, lastError: string, isLast: boolean): Promise<void> {
  await db
    .update(outbox)
    .set({ lastError, ...(isLast && { status: 'dead' as const }) })
    .where(and(eq(outbox.id, id), eq(outbox.status, 'waiting')))
}

/** Gives a dead letter its tries again; null where it is not dead. */
export async function reviveLetter(db: Database, id: string): Promise<Letter | undefined> {
  const [letter] = await db
    .update(outbox)
    .set({ status: 'waiting', attempts: 0 })
    .where(and(eq(outbox.id, id), eq(outbox.status, 'dead')))
    .returning()
  if (letter !== undefined) await enqueueJob(db, 'letters', { id })
  return letter
}

export async function findLetter(db: Database, id: string): Promise<Letter | undefined> {
  const [letter] = await db.select().from(outbox).where(eq(outbox.id, id))
  return letter
}

export interface LetterPlace {
  readonly createdAt: string
  readonly id: string
}

export async function listLetters(db: Database, status: LetterStatus, after: LetterPlace | null, limit: number) {
  const { createdAt, id } = outbox
  const further =
    after === null
      ? undefined
      : or(lt(createdAt, new Date(after.createdAt)), and(eq(createdAt, new Date(after.createdAt)), lt(id, after.id)))
  return db
    .select()
    .from(outbox)
    .where(and(eq(outbox.status, status), further))
    .orderBy(desc(createdAt), desc(id))
    .limit(limit)
}

export async function countLetters(db: Database) {
  return db
    .select({ status: outbox.status, count: sql<number>`count(*)::int`, oldest: sql<Date | null>`min(created_at)` })
    .from(outbox)
    .groupBy(outbox.status)
}

/** Letters that wait although no job will take them up: their job ran out of tries while the database was away. */
export async function requeueStranded(db: Database): Promise<number> {
  const jobs = sql`${sql.identifier(jobSchema)}.job`
  const underWay = db
    .select({ one: sql`1` })
    .from(sql`${jobs} as job`)
    .where(sql`job.name = 'letters' and job.state < 'completed' and job.data->>'id' = ${outbox.id}::text`)
  const stranded = await db
    .select({ id: outbox.id })
    .from(outbox)
    .where(
      and(
        inArray(outbox.status, ['waiting']),
        lt(outbox.createdAt, sql`now() - interval '10 minutes'`),
        notExists(underWay),
      ),
    )
    .limit(500)
  for (const { id } of stranded) await enqueueJob(db, 'letters', { id })
  return stranded.length
}

/** Takes away every letter to somebody, sent or not. */
export async function deleteLettersTo(db: Database, personId: number, email: string): Promise<void> {
  await db.delete(outbox).where(or(eq(outbox.personId, personId), sql`lower(${outbox.recipient}) = lower(${email})`))
}

/** Letters are kept as long as somebody may ask what became of them. */
export async function deleteOldLetters(db: Database): Promise<void> {
  await db
    .delete(outbox)
    .where(
      or(
        and(eq(outbox.status, 'sent'), lt(outbox.sentAt, sql`now() - interval '30 days'`)),
        and(eq(outbox.status, 'dead'), lt(outbox.createdAt, sql`now() - interval '90 days'`)),
      ),
    )
}
