import type { Me, OwnSessions, SessionAnswer } from '#shared/schemas/accounts'
import type { Actor } from '../../lib/actor'
import { listPermissions } from './accounts.policy'

export function presentSession(actor: Actor | null): SessionAnswer {
  if (actor === null) return { person: null }
  const { name, role, email, isConfirmed } = actor
  return { person: { name, role, email, isConfirmed, can: listPermissions(actor) } }
}

interface OwnRow {
  readonly name: string
  readonly email: string
  readonly role: Actor['role']
  readonly createdAt: Date
  readonly wantsNotices: boolean
}

export function presentMe({ name, email, role, createdAt, wantsNotices }: OwnRow): Me {
  return { name, email, role, since: createdAt.toISOString(), wantsNotices }
}

interface OwnSession {
  readonly publicId: string
  readonly createdAt: Date
  readonly seenAt: Date
  readonly expiresAt: Date
  readonly agent: string | null
}

export function presentSessions(sessions: readonly OwnSession[], present: string): OwnSessions {
  return {
    items: sessions.map(({ publicId, createdAt, seenAt, expiresAt, agent }) => ({
      id: publicId,
      startedAt: createdAt.toISOString(),
      seenAt: seenAt.toISOString(),
      endsAt: expiresAt.toISOString(),
      agent,
      isThis: publicId === present,
    })),
  }
}
