import { isAdmin, type Actor } from '../../lib/actor'

export const canAdminister = (actor: Actor | null): boolean => isAdmin(actor)

/** Nobody changes their own role or suspends themselves: there is always another admin who sees it. */
export function canChangeStanding(actor: Actor, personId: number): boolean {
  return isAdmin(actor) && actor.id !== personId
}
