import { isModerator, type Actor } from '../../lib/actor'
import { AppError } from '../../lib/errors'

interface Proposed {
  readonly authorId: number
  readonly status: string
}

/** Refuses whoever may write nothing at all. */
export function requireContributor(actor: Actor): void {
  if (actor.isSuspended) throw new AppError('forbidden', 'Your account is suspended: you can read, and change nothing.')
  if (!actor.isConfirmed) {
    throw new AppError('forbidden', 'Confirm your e-mail address first: we sent you a link when you signed up.')
  }
}

export function requireModerator(actor: Actor): void {
  requireContributor(actor)
  if (!isModerator(actor)) throw new AppError('forbidden', 'Only moderators do this.')
}

const isAuthor = (actor: Actor, { authorId }: Proposed): boolean => actor.id === authorId

/** A draft is its author's own business. */
export function canRead(actor: Actor, proposal: Proposed): boolean {
  return isAuthor(actor, proposal) || (isModerator(actor) && proposal.status !== 'draft')
}

const openStatuses = ['draft', 'pending', 'sent-back'] as const
const isOpen = ({ status }: Proposed): boolean => openStatuses.some((open) => open === status)

export interface Rights {
  readonly amend: boolean
  readonly submit: boolean
  readonly withdraw: boolean
  readonly say: boolean
  readonly lease: boolean
  readonly decide: boolean
}

/** What a reader may do with a proposal. `holderId`: who holds a lease on it that has not run out. */
export function listRights(actor: Actor, proposal: Proposed, holderId: number | null): Rights {
  const isActive = actor.isConfirmed && !actor.isSuspended
  const isOwn = isActive && isAuthor(actor, proposal)
  const isReviewer = isActive && isModerator(actor) && !isAuthor(actor, proposal)
  const isFree = holderId === null || holderId === actor.id
  return {
    amend: isOwn && isOpen(proposal),
    submit: isOwn && (proposal.status === 'draft' || proposal.status === 'sent-back'),
    withdraw: isOwn && isOpen(proposal),
    say: (isOwn || isReviewer) && proposal.status !== 'draft' && canRead(actor, proposal),
    lease: isReviewer && isFree && proposal.status === 'pending',
    decide: isReviewer && isFree && proposal.status === 'pending',
  }
}
