import { eq, inArray } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { gearRevisions, people } from '../../db/schema/index'

export async function listNames(db: Database, ids: readonly number[]) {
  if (ids.length === 0) return []
  return db
    .select({ id: people.id, name: people.name })
    .from(people)
    .where(inArray(people.id, [...ids]))
}

/** Revisions of theirs that were approved. */
export async function countRevisionsOf(db: Database, personId: number): Promise<number> {
  return db.$count(gearRevisions, eq(gearRevisions.authorId, personId))
}
