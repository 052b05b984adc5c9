import { and, eq, isNull, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { people } from '../../db/schema/index'

export type PersonRow = typeof people.$inferSelect

const hasEmail = (email: string) => sql`lower(${people.email}) = lower(${email})`
const hasName = (name: string) => sql`lower(${people.name}) = lower(${name})`

export async function getPersonByEmail(db: Database, email: string): Promise<PersonRow | null> {
  const [row] = await db.select().from(people).where(hasEmail(email))
  return row ?? null
}

export async function getPersonByName(db: Database, name: string): Promise<PersonRow | null> {
  const [row] = await db.select().from(people).where(hasName(name))
  return row ?? null
}

export async function getPerson(db: Database, id: number): Promise<PersonRow | null> {
  const [row] = await db.select().from(people).where(eq(people.id, id))
  return row ?? null
}

/** As `getPerson`, and nobody else changes the row until the transaction ends. */
export async function lockPerson(db: Database, id: number): Promise<PersonRow | null> {
  const [row] = await db.select().from(people).where(eq(people.id, id)).for('update')
  return row ?? null
}

export type NewPerson = Pick<PersonRow, 'name' | 'email' | 'passwordHash' | 'createdAt'>

export async function insertPerson(db: Database, person: NewPerson): Promise<number> {
  const [row] = await db.insert(people).values(person).returning({ id: people.id })
  if (row === undefined) throw new Error('Nobody was inserted')
  return row.id
}

export type PersonChange = Partial<
  Pick<PersonRow, 'name' | 'email' | 'passwordHash' | 'emailConfirmedAt' | 'wantsNotices' | 'createdAt'>
>

export async function updatePerson(db: Database, id: number, change: PersonChange): Promise<void> {
  await db.update(people).set(change).where(eq(people.id, id))
}

/** Leaves the number alone: what was contributed keeps an author without a name. */
export async function erasePerson(db: Database, id: number, deletedAt: Date): Promise<void> {
  await db
    .update(people)
    .set({
      name: null,
      email: null,
      passwordHash: null,
      emailConfirmedAt: null,
      suspendedAt: null,
      suspendedReason: null,
      role: 'member',
      wantsNotices: false,
      deletedAt,
    })
    .where(eq(people.id, id))
}

/** Locks every admin, so that two cannot both be the last but one to go. */
export async function countOtherAdmins(db: Database, id: number): Promise<number> {
  const admins = await db
    .select({ id: people.id })
    .from(people)
    .where(and(eq(people.role, 'admin'), isNull(people.deletedAt), isNull(people.suspendedAt)))
    .orderBy(people.id)
    .for('update')
  return admins.filter((admin) => admin.id !== id).length
}

/** Adds people that are not there yet; answers how many were. */
export async function insertDemoPeople(db: Database, rows: readonly (typeof people.$inferInsert)[]): Promise<number> {
  const added = await db
    .insert(people)
    .values([...rows])
    .onConflictDoNothing()
    .returning({ id: people.id })
  return added.length
}
