import { and, eq, isNull, lt, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { idempotencyKeys } from '../../db/schema/index'

export interface KeyOfPerson {
  readonly personId: number
  readonly key: string
}

export interface StoredAnswer {
  readonly status: number
  readonly headers: Record<string, string>
  readonly body: string
}

const isKey = ({ personId, key }: KeyOfPerson) =>
  and(eq(idempotencyKeys.personId, personId), eq(idempotencyKeys.key, key))

/** Answers whether the key was free. */
export async function insertKey(db: Database, of: KeyOfPerson, requestHash: string): Promise<boolean> {
  const added = await db
    .insert(idempotencyKeys)
    .values({ ...of, requestHash })
    .onConflictDoNothing()
    .returning({ key: idempotencyKeys.key })
  return added.length > 0
}

export async function getKey(db: Database, of: KeyOfPerson) {
  const [row] = await db.select().from(idempotencyKeys).where(isKey(of))
  return row ?? null
}

/** Takes over a key whose first request never came to an end; of several who try, one does. */
export async function takeAbandonedKey(db: Database, of: KeyOfPerson, startedBefore: Date): Promise<boolean> {
  const taken = await db
    .update(idempotencyKeys)
    .set({ createdAt: sql`now()` })
    .where(and(isKey(of), isNull(idempotencyKeys.status), lt(idempotencyKeys.createdAt, startedBefore)))
    .returning({ key: idempotencyKeys.key })
  return taken.length > 0
}

export async function updateAnswer(db: Database, of: KeyOfPerson, answer: StoredAnswer): Promise<void> {
  await db.update(idempotencyKeys).set(answer).where(isKey(of))
}

export async function deleteUnansweredKey(db: Database, of: KeyOfPerson): Promise<void> {
  await db.delete(idempotencyKeys).where(and(isKey(of), isNull(idempotencyKeys.status)))
}

export async function deleteOldKeys(db: Database, personId: number, before: Date): Promise<void> {
  await db
    .delete(idempotencyKeys)
    .where(and(eq(idempotencyKeys.personId, personId), lt(idempotencyKeys.createdAt, before)))
}

export async function deleteKeysOf(db: Database, personId: number): Promise<void> {
  await db.delete(idempotencyKeys).where(eq(idempotencyKeys.personId, personId))
}
