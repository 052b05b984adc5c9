import { isAdmin, isModerator, type Actor } from '../../lib/actor'

/** What the interface offers somebody who is signed in; each endpoint asks its own policy again. */
export function listPermissions(actor: Actor) {
  return {
    contribute: actor.isConfirmed && !actor.isSuspended,
    review: isModerator(actor) && !actor.isSuspended,
    administer: isAdmin(actor) && !actor.isSuspended,
  }
}
