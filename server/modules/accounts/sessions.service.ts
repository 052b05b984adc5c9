import { Lucia, TimeSpan } from 'lucia'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { createSessionAdapter, type Clock, type SessionAttributes, type UserAttributes } from './session-adapter'
import { sessionLimits } from './session-limits'
import { deleteOwnSession, deleteSessionsOf, listSessions, type SessionRow } from './sessions.queries'

declare module 'lucia' {
  interface Register {
    Lucia: Lucia<SessionAttributes, UserAttributes>
    UserId: number
    DatabaseSessionAttributes: Omit<SessionAttributes, 'publicId'> & { readonly publicId?: string }
    DatabaseUserAttributes: UserAttributes
  }
}

export interface FoundSession {
  readonly actor: Actor
  readonly publicId: string
}

export interface Sessions {
  /** Answers the new session's id, which only the visitor's cookie keeps. */
  readonly start: (personId: number, agent: string | null) => Promise<string>
  readonly find: (id: string) => Promise<FoundSession | null>
  readonly end: (id: string) => Promise<void>
  readonly list: (personId: number) => Promise<OwnSession[]>
  /** Ends one of a person's own sessions; answers whether there was such a one. */
  readonly endOwn: (personId: number, publicId: string) => Promise<boolean>
}

export type OwnSession = Omit<SessionRow, 'idHash' | 'personId'>

const agentLength = 200

/** The one door to the session library: nothing else knows it. */
export function createSessions(db: Database, now: Clock = () => new Date()): Sessions {
  const adapter = createSessionAdapter(db, now)
  const lucia = new Lucia<SessionAttributes, UserAttributes>(adapter, {
    sessionExpiresIn: new TimeSpan(sessionLimits.idleMs, 'ms'),
    getSessionAttributes: ({ publicId = '', createdAt, seenAt, agent }) => ({ publicId, createdAt, seenAt, agent }),
    getUserAttributes: (attributes) => attributes,
  })

  return {
    async start(personId, agent) {
      await lucia.deleteExpiredSessions()
      const attributes = { createdAt: now(), seenAt: now(), agent: agent?.slice(0, agentLength) ?? null }
      return (await lucia.createSession(personId, attributes)).id
    },
    async find(id) {
      const { session, user } = await lucia.validateSession(id)
      if (session === null) return null
      if (now().getTime() - session.seenAt.getTime() > sessionLimits.touchMs) {
        await adapter.updateSessionExpiration(id, session.expiresAt)
      }
      return { actor: user, publicId: session.publicId }
    },
    end: (id) => lucia.invalidateSession(id),
    list: (personId) => listSessions(db, personId, now()),
    endOwn: (personId, publicId) => deleteOwnSession(db, personId, publicId),
  }
}

/** Ends every session of somebody, in the transaction of why. */
export const endSessionsOf = (db: Database, personId: number): Promise<void> => deleteSessionsOf(db, personId)
