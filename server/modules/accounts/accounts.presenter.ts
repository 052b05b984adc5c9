import type { SessionAnswer } from '#shared/schemas/accounts'
import type { Actor } from '../../lib/actor'
import { listPermissions } from './accounts.policy'

export function presentSession(actor: Actor | null): SessionAnswer {
  if (actor === null) return { person: null }
  const { name, role, email, isConfirmed } = actor
  return { person: { name, role, email, isConfirmed, can: listPermissions(actor) } }
}
