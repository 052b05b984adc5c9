import { and, desc, eq, gt, isNull, lt, lte, ne, or } from 'drizzle-orm'
import type { Database } from '../../db/database'
import { people, sessions } from '../../db/schema/index'

const columns = {
  idHash: sessions.idHash,
  publicId: sessions.publicId,
  personId: sessions.personId,
  createdAt: sessions.createdAt,
  expiresAt: sessions.expiresAt,
  seenAt: sessions.seenAt,
  agent: sessions.agent,
}

export type SessionRow = typeof sessions.$inferSelect

export async function insertSession(db: Database, row: Omit<SessionRow, 'publicId'>): Promise<void> {
  await db.insert(sessions).values(row)
}

/** A session with whom it belongs to, unless that person may not be here any more. */
export async function getSessionWithPerson(db: Database, idHash: string) {
  const [found] = await db
    .select({
      session: columns,
      person: {
        id: people.id,
        name: people.name,
        email: people.email,
        role: people.role,
        emailConfirmedAt: people.emailConfirmedAt,
      },
    })
    .from(sessions)
    .innerJoin(people, eq(people.id, sessions.personId))
    .where(and(eq(sessions.idHash, idHash), isNull(people.suspendedAt), isNull(people.deletedAt)))
  return found ?? null
}

export async function listSessions(db: Database, personId: number, now: Date): Promise<SessionRow[]> {
  return db
    .select(columns)
    .from(sessions)
    .where(and(eq(sessions.personId, personId), gt(sessions.expiresAt, now)))
    .orderBy(desc(sessions.seenAt))
}

export async function updateSessionUse(db: Database, idHash: string, seenAt: Date, expiresAt: Date): Promise<void> {
  await db.update(sessions).set({ seenAt, expiresAt }).where(eq(sessions.idHash, idHash))
}

export async function deleteSession(db: Database, idHash: string): Promise<void> {
  await db.delete(sessions).where(eq(sessions.idHash, idHash))
}

/** Answers whether there was such a session of this very person. */
export async function deleteOwnSession(db: Database, personId: number, publicId: string): Promise<boolean> {
  const ended = await db
    .delete(sessions)
    .where(and(eq(sessions.personId, personId), eq(sessions.publicId, publicId)))
    .returning({ idHash: sessions.idHash })
  return ended.length > 0
}

export async function deleteSessionsOf(db: Database, personId: number, exceptPublicId?: string): Promise<void> {
  const isTheirs = eq(sessions.personId, personId)
  await db
    .delete(sessions)
    .where(exceptPublicId === undefined ? isTheirs : and(isTheirs, ne(sessions.publicId, exceptPublicId)))
}

export async function deleteEndedSessions(db: Database, now: Date, oldestStart: Date): Promise<void> {
  await db.delete(sessions).where(or(lte(sessions.expiresAt, now), lt(sessions.createdAt, oldestStart)))
}
