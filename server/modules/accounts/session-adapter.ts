import { createHash } from 'node:crypto'
import type { Adapter, DatabaseSession, DatabaseUser } from 'lucia'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { sessionLimits } from './session-limits'
import {
  deleteEndedSessions,
  deleteSession,
  deleteSessionsOf,
  getSessionWithPerson,
  insertSession,
  listSessions,
  updateSessionUse,
  type SessionRow,
} from './sessions.queries'

export interface SessionAttributes {
  readonly publicId: string
  readonly createdAt: Date
  readonly seenAt: Date
  readonly agent: string | null
}

export type Clock = () => Date

export const hashSessionId = (id: string): string => createHash('sha256').update(id).digest('hex')

/** Idleness may move a session's end, never past the absolute one. */
export function findEnd(createdAt: Date, usedAt: Date): Date {
  return new Date(Math.min(usedAt.getTime() + sessionLimits.idleMs, createdAt.getTime() + sessionLimits.absoluteMs))
}

type Found = NonNullable<Awaited<ReturnType<typeof getSessionWithPerson>>>

function toUser({ id, name, email, role, emailConfirmedAt }: Found['person']): DatabaseUser {
  if (name === null || email === null) throw new Error(`Person ${id} has a session but no name`)
  const attributes = { name, email, role, isConfirmed: emailConfirmedAt !== null, isSuspended: false }
  return { id, attributes }
}

/** Keeps only the SHA-256 of a session's id. Lucia reads the machine's clock, so moments are moved into it and back. */
export function createSessionAdapter(db: Database, now: Clock): Adapter {
  const offset = () => Date.now() - now().getTime()
  const toLucia = (moment: Date) => new Date(moment.getTime() + offset())
  const toSession = (row: SessionRow, id: string): DatabaseSession => {
    const { personId, publicId, createdAt, expiresAt, seenAt, agent } = row
    const attributes = { publicId, createdAt, seenAt, agent }
    const end = Math.min(expiresAt.getTime(), createdAt.getTime() + sessionLimits.absoluteMs)
    return { id, userId: personId, expiresAt: toLucia(new Date(end)), attributes }
  }

  async function extend(id: string): Promise<void> {
    const found = await getSessionWithPerson(db, hashSessionId(id))
    if (found !== null) {
      await updateSessionUse(db, hashSessionId(id), now(), findEnd(found.session.createdAt, now()))
    }
  }

  return {
    async getSessionAndUser(id) {
      const found = await getSessionWithPerson(db, hashSessionId(id))
      return found === null ? [null, null] : [toSession(found.session, id), toUser(found.person)]
    },
    getUserSessions: async (personId) =>
      (await listSessions(db, personId, now())).map((row) => toSession(row, row.idHash)),
    setSession: ({ id, userId, attributes: { createdAt, seenAt, agent } }) =>
      insertSession(db, {
        idHash: hashSessionId(id),
        personId: userId,
        createdAt,
        seenAt,
        agent,
        expiresAt: findEnd(createdAt, seenAt),
      }),
    updateSessionExpiration: extend,
    deleteSession: (id) => deleteSession(db, hashSessionId(id)),
    deleteUserSessions: (personId) => deleteSessionsOf(db, personId),
    deleteExpiredSessions: () => deleteEndedSessions(db, now(), new Date(now().getTime() - sessionLimits.absoluteMs)),
  }
}

export type UserAttributes = Omit<Actor, 'id'>
