import { eq, lte, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { rateCounts } from '../../db/schema/index'

export interface RateCount {
  readonly hits: number
  readonly resetsAt: Date
}

/** Counts one more in one statement, so that no two processes count the same. */
export async function addHit(db: Database, key: string, now: Date, windowMs: number): Promise<RateCount> {
  const resetsAt = new Date(now.getTime() + windowMs)
  const isOver = sql`${rateCounts.resetsAt} <= ${now.toISOString()}::timestamptz`
  const [row] = await db
    .insert(rateCounts)
    .values({ key, hits: 1, resetsAt })
    .onConflictDoUpdate({
      target: rateCounts.key,
      set: {
        hits: sql`CASE WHEN ${isOver} THEN 1 ELSE ${rateCounts.hits} + 1 END`,
        resetsAt: sql`CASE WHEN ${isOver} THEN excluded.resets_at ELSE ${rateCounts.resetsAt} END`,
      },
    })
    .returning({ hits: rateCounts.hits, resetsAt: rateCounts.resetsAt })
  if (row === undefined) throw new Error(`Nothing was counted for ${key}`)
  return row
}

export async function getCount(db: Database, key: string): Promise<RateCount | null> {
  const [row] = await db
    .select({ hits: rateCounts.hits, resetsAt: rateCounts.resetsAt })
    .from(rateCounts)
    .where(eq(rateCounts.key, key))
  return row ?? null
}

export async function takeHit(db: Database, key: string): Promise<void> {
  await db
    .update(rateCounts)
    .set({ hits: sql`greatest(${rateCounts.hits} - 1, 0)` })
    .where(eq(rateCounts.key, key))
}

export async function deleteCount(db: Database, key: string): Promise<void> {
  await db.delete(rateCounts).where(eq(rateCounts.key, key))
}

export async function deletePastCounts(db: Database, now: Date): Promise<void> {
  await db.delete(rateCounts).where(lte(rateCounts.resetsAt, now))
}
