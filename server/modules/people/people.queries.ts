import { and, desc, eq, inArray, isNotNull, isNull, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { gear, gearRevisions, gearValues, people } from '../../db/schema/index'

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

export type PersonRow = typeof people.$inferSelect

const isHere = and(isNull(people.deletedAt), isNotNull(people.emailConfirmedAt))

/** Somebody by name, who has confirmed an address and is still here. */
export async function getPersonByName(db: Database, name: string): Promise<PersonRow | null> {
  const [row] = await db
    .select()
    .from(people)
    .where(and(sql`lower(${people.name}) = lower(${name})`, isHere))
  return row ?? null
}

export async function countAcceptedOf(db: Database, personId: number) {
  const [revisions] = await db
    .select({
      revisions: sql<number>`count(*)::int`,
      pieces: sql<number>`count(distinct ${gearRevisions.gearId})::int`,
    })
    .from(gearRevisions)
    .where(eq(gearRevisions.authorId, personId))
  const measured = await db.$count(
    gearValues,
    and(eq(gearValues.authorId, personId), eq(gearValues.source, 'measured')),
  )
  return { revisions: revisions?.revisions ?? 0, pieces: revisions?.pieces ?? 0, measured }
}

export async function listMeasurementsOf(db: Database, personId: number, limit: number) {
  const { slug, kind, brand, model } = gear
  return db
    .select({
      gear: { slug, kind, brand, model },
      key: gearValues.key,
      value: gearValues.value,
      plusMinus: gearValues.plusMinus,
      revision: gearValues.revision,
      at: gearRevisions.createdAt,
    })
    .from(gearValues)
    .innerJoin(gear, eq(gear.id, gearValues.gearId))
    .innerJoin(
      gearRevisions,
      and(eq(gearRevisions.gearId, gearValues.gearId), eq(gearRevisions.number, gearValues.revision)),
    )
    .where(and(eq(gearValues.authorId, personId), eq(gearValues.source, 'measured')))
    .orderBy(desc(gearRevisions.createdAt), gearValues.gearId, gearValues.key)
    .limit(limit)
}
