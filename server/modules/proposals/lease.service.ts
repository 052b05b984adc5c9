import type { Proposal } from '#shared/schemas/proposals'
import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError } from '../../lib/errors'
import { dropLease, takeLease } from './decide.queries'
import { requireModerator } from './proposals.policy'
import { getProposal } from './read-proposal.service'
import type { Trace } from './write-proposal.service'

function explain({ status, isMine, lease }: Proposal): AppError {
  if (isMine) return new AppError('forbidden', 'Nobody reviews what is their own.')
  if (lease !== null && !lease.isMine) {
    return new AppError('conflict', `${lease.holder} is reviewing this until ${lease.until}.`)
  }
  return new AppError('conflict', `This waits for no review: it is ${status.replace('-', ' ')}.`)
}

/** Says that somebody is at it, for a quarter of an hour; it runs out by itself. */
export async function leaseProposal(db: Database, actor: Actor, id: string, { requestId }: Trace): Promise<Proposal> {
  requireModerator(actor)
  const proposal = await getProposal(db, actor, id)
  if (proposal.isMine) throw explain(proposal)
  const isTaken = await runTransaction(db, async (tx) => {
    if (!(await takeLease(tx, id, actor.id))) return false
    const event = { action: 'proposal.lease', subjectType: 'proposal', subjectId: id }
    await recordAudit(tx, { actorId: actor.id, ...event, requestId })
    return true
  })
  const now = await getProposal(db, actor, id)
  if (!isTaken) throw explain(now)
  return now
}

/** Gives the lease up; where there is none of one's own, nothing happens. */
export async function releaseProposal(db: Database, actor: Actor, id: string, { requestId }: Trace): Promise<Proposal> {
  requireModerator(actor)
  await getProposal(db, actor, id)
  await runTransaction(db, async (tx) => {
    if (!(await dropLease(tx, id, actor.id))) return
    const event = { action: 'proposal.release', subjectType: 'proposal', subjectId: id }
    await recordAudit(tx, { actorId: actor.id, ...event, requestId })
  })
  return getProposal(db, actor, id)
}
