import type { Role } from '../db/schema/people'

/** Somebody who is signed in, as far as deciding what they may do needs it. */
export interface Actor {
  readonly id: number
  readonly name: string
  readonly role: Role
  readonly email: string
  readonly isConfirmed: boolean
  readonly isSuspended: boolean
}

export const isModerator = (actor: Actor | null): boolean => actor?.role === 'moderator' || actor?.role === 'admin'
export const isAdmin = (actor: Actor | null): boolean => actor?.role === 'admin'
