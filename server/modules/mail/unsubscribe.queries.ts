import { and, eq, isNull, sql } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { emailTokens, people } from '../../db/schema/index'

/** Whom a notice may reach: an account that is there, with a confirmed address, and that wants notices. */
export async function findNoticeAddress(db: Database, personId: number): Promise<string | null> {
  const [row] = await db
    .select({ email: people.email })
    .from(people)
    .where(
      and(
        eq(people.id, personId),
        eq(people.wantsNotices, true),
        isNull(people.deletedAt),
        sql`${people.emailConfirmedAt} is not null`,
      ),
    )
  return row?.email ?? null
}

export async function insertUnsubscribeToken(db: Database, personId: number, email: string, tokenHash: string) {
  await db.insert(emailTokens).values({
    tokenHash,
    personId,
    email,
    purpose: 'unsubscribe',
    expiresAt: sql`now() + interval '1 year'`,
  })
}

/** The person that the token belongs to, however often it is used; null for one that nobody was sent. */
export async function stopNotices(db: Database, tokenHash: string): Promise<number | null> {
  const token = and(
    eq(emailTokens.tokenHash, tokenHash),
    eq(emailTokens.purpose, 'unsubscribe'),
    sql`${emailTokens.expiresAt} > now()`,
  )
  const [used] = await db
    .update(emailTokens)
    .set({ usedAt: sql`coalesce(${emailTokens.usedAt}, now())` })
    .where(token)
    .returning({ personId: emailTokens.personId })
  if (used === undefined) return null
  await db.update(people).set({ wantsNotices: false }).where(eq(people.id, used.personId))
  return used.personId
}
