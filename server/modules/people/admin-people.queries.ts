import { and, eq, gt, isNotNull, isNull, or, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { people } from '../../db/schema/index'

const sortName = sql<string>`lower(${people.name})`

const columns = {
  id: people.id,
  name: people.name,
  email: people.email,
  role: people.role,
  createdAt: people.createdAt,
  emailConfirmedAt: people.emailConfirmedAt,
  isDemo: people.isDemo,
  suspendedAt: people.suspendedAt,
  suspendedReason: people.suspendedReason,
  acceptedRevisions: sql<number>`(select count(*)::int from gear_revisions r where r.author_id = people.id)`,
  sortName,
}

export interface PeopleFilter {
  readonly q?: string | undefined
  readonly role?: 'member' | 'moderator' | 'admin' | undefined
  readonly standing?: 'suspended' | undefined
  /** The lower-case name that the page before ended with. */
  readonly after?: string | undefined
}

const escapePattern = (text: string): string => text.replace(/[\\%_]/g, (character) => `\\${character}`)

function holds(column: typeof people.name | typeof people.email, q: string) {
  return sql`lower(${column}) like lower(${`%${escapePattern(q)}%`})`
}

export async function listPeople(db: Database, { q = '', role, standing, after }: PeopleFilter, limit: number) {
  return db
    .select(columns)
    .from(people)
    .where(
      and(
        isNull(people.deletedAt),
        q === '' ? undefined : or(holds(people.name, q), holds(people.email, q)),
        role === undefined ? undefined : eq(people.role, role),
        standing === undefined ? undefined : isNotNull(people.suspendedAt),
        after === undefined ? undefined : gt(sortName, after),
      ),
    )
    .orderBy(sortName)
    .limit(limit)
}

export type ListedPerson = Awaited<ReturnType<typeof listPeople>>[number]

/** Somebody with an account, by name; nobody else changes the row until the transaction ends. */
export async function lockPersonByName(db: Database, name: string): Promise<ListedPerson | null> {
  const [row] = await db
    .select(columns)
    .from(people)
    .where(and(sql`lower(${people.name}) = lower(${name})`, isNull(people.deletedAt)))
    .for('update')
  return row ?? null
}

export type StandingChange = Partial<Pick<typeof people.$inferSelect, 'role' | 'suspendedAt' | 'suspendedReason'>>

export async function updateStanding(db: Database, id: number, change: StandingChange): Promise<void> {
  await db.update(people).set(change).where(eq(people.id, id))
}
