import { and, eq, isNull, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { people } from '../../db/schema/index'

export type PersonRow = typeof people.$inferSelect

export async function getPersonByEmail(db: Database, email: string): Promise<PersonRow | null> {
  const [row] = await db
    .select()
    .from(people)
    .where(and(sql`lower(${people.email}) = lower(${email})`, isNull(people.deletedAt)))
  return row ?? null
}

export async function updatePasswordHash(db: Database, personId: number, passwordHash: string): Promise<void> {
  await db.update(people).set({ passwordHash }).where(eq(people.id, personId))
}

/** Adds people that are not there yet; answers how many were. */
export async function insertPeople(db: Database, rows: readonly (typeof people.$inferInsert)[]): Promise<number> {
  const added = await db
    .insert(people)
    .values([...rows])
    .onConflictDoNothing()
    .returning({ id: people.id })
  return added.length
}
