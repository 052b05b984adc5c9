import type { ProposalStatus } from '../../db/schema/proposals'
import { isModerator, type Actor } from '../../lib/actor'

const openStatuses: ReadonlySet<string> = new Set<ProposalStatus>(['draft', 'pending', 'sent-back'])

export const isOpen = (status: ProposalStatus | null): boolean => status === null || openStatuses.has(status)

interface Uploaded {
  readonly uploaderId: number
  readonly publishedAt: Date | null
}

/** Nothing is public before it was approved: until then its uploader and those who review see it. */
export function canSee(actor: Actor | null, { uploaderId, publishedAt }: Uploaded): boolean {
  return publishedAt !== null || (actor !== null && (actor.id === uploaderId || isModerator(actor)))
}

export function canRemove(actor: Actor | null, file: Uploaded, status: ProposalStatus | null): boolean {
  return (
    actor !== null && actor.id === file.uploaderId && !actor.isSuspended && file.publishedAt === null && isOpen(status)
  )
}

/** An author, whose address is known to be theirs. */
export function canUpload(actor: Actor): boolean {
  return actor.isConfirmed && !actor.isSuspended
}
