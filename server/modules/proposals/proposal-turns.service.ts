import type { Proposal } from '#shared/schemas/proposals'
import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { ProposalStatus } from '../../db/schema/index'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError, createInvalidError } from '../../lib/errors'
import { checkComplete, findFileIssues } from './check-proposal'
import { requireUndisputed } from './disputes.service'
import { insertMessage, listFiles } from './proposal-talk.queries'
import { listRights, requireContributor } from './proposals.policy'
import { changeProposal } from './proposals.queries'
import { tellAuthor } from './notices'
import { getProposal, refuseStale, requireReadable } from './read-proposal.service'
import { requireAmendable, toHead, type Trace } from './write-proposal.service'

interface Seen {
  readonly id: string
  readonly version: number
}

interface Turn extends Seen {
  readonly statuses: readonly ProposalStatus[]
  readonly to: 'pending' | 'withdrawn'
}

async function takeTurn(db: Database, actor: Actor, turn: Turn, { requestId }: Trace): Promise<Proposal> {
  const { id, version, statuses, to } = turn
  const isDone = await runTransaction(db, async (tx) => {
    const change = to === 'pending' ? { submittedAt: new Date() } : { leasedBy: null, leasedUntil: null }
    if (!(await changeProposal(tx, { id, version, statuses }, { status: to, ...change }))) return false
    const kind = to === 'pending' ? 'submitted' : 'withdrawn'
    await insertMessage(tx, { proposalId: id, personId: actor.id, kind })
    const action = to === 'pending' ? 'proposal.submit' : 'proposal.withdraw'
    await recordAudit(tx, { actorId: actor.id, action, subjectType: 'proposal', subjectId: id, requestId })
    return true
  })
  return isDone ? getProposal(db, actor, id) : refuseStale(db, actor, id)
}

/** Sends a draft in, or one that was sent back again. */
export async function submitProposal(db: Database, actor: Actor, seen: Seen, trace: Trace): Promise<Proposal> {
  const row = await requireAmendable(db, actor, seen.id, seen.version, 'submit')
  if (row.mergedInto !== null || row.retiredAt !== null) {
    throw new AppError('conflict', 'The piece was taken out of the catalogue meanwhile. Your proposal is kept.')
  }
  const { kind, gearId, identity, values } = row
  checkComplete({ kind, authorId: actor.id, isNew: gearId === null, head: toHead(row), identity, values })
  const fileIssues = findFileIssues(values, await listFiles(db, row.id), actor.id)
  if (fileIssues.length > 0) throw createInvalidError(fileIssues)
  await requireUndisputed(db, { gearId, values, proposalId: row.id })
  return takeTurn(db, actor, { ...seen, statuses: ['draft', 'sent-back'], to: 'pending' }, trace)
}

export async function withdrawProposal(db: Database, actor: Actor, seen: Seen, trace: Trace): Promise<Proposal> {
  await requireAmendable(db, actor, seen.id, seen.version, 'withdraw')
  return takeTurn(db, actor, { ...seen, statuses: ['draft', 'pending', 'sent-back'], to: 'withdrawn' }, trace)
}

/** Says something about a proposal, which changes nothing of it. Its author is told of what others say. */
export async function addMessage(
  db: Database,
  actor: Actor,
  id: string,
  words: string,
  { requestId, origin }: Trace,
): Promise<Proposal> {
  const row = await requireReadable(db, actor, id)
  requireContributor(actor)
  if (!listRights(actor, row, null).say) throw new AppError('conflict', 'A draft is talked about once it is sent in.')
  await runTransaction(db, async (tx) => {
    await insertMessage(tx, { proposalId: id, personId: actor.id, kind: 'message', words })
    const event = { action: 'proposal.say', subjectType: 'proposal', subjectId: id }
    await recordAudit(tx, { actorId: actor.id, ...event, requestId })
    if (row.authorId !== actor.id) await tellAuthor(tx, row, { type: 'message', words, by: actor.name, origin })
  })
  return getProposal(db, actor, id)
}
