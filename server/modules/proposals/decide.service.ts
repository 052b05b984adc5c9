import type { Proposal } from '#shared/schemas/proposals'
import type { DecisionRequest } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError } from '../../lib/errors'
import { applyProposal } from './apply-proposal.service'
import { claimDecision } from './decide.queries'
import { findDisputed, refuseDisputed } from './disputes.service'
import { tellAuthor } from './notices'
import { insertMessage } from './proposal-talk.queries'
import { requireModerator } from './proposals.policy'
import type { StoredDecision } from './proposals.presenter'
import { findProposal, type ProposalRow } from './proposals.queries'
import { getProposal, refuseStale, requireReadable } from './read-proposal.service'
import type { Trace } from './write-proposal.service'

const statuses = { approve: 'approved', 'send-back': 'sent-back', decline: 'declined' } as const

function toStored(actor: Actor, request: DecisionRequest): StoredDecision {
  const { decision, reasonCode = null, words = null, fields = {} } = request
  const stored = Object.entries(fields).map(([key, one]) => {
    return [key, { decision: one.decision, words: one.words ?? null }] as const
  })
  const at = new Date().toISOString()
  return { decision, reasonCode, words, fields: Object.fromEntries(stored), by: actor.id, at }
}

/** Why nothing could be decided, in the order in which it matters to whoever tried. */
async function refuse(db: Database, actor: Actor, id: string): Promise<never> {
  const { status, decision, lease } = await getProposal(db, actor, id)
  if (status !== 'pending') {
    const by = decision === null ? '' : ` by ${decision.by}`
    const detail = `This was already ${status.replace('-', ' ')}${by}. Your words were not sent.`
    throw new AppError('conflict', detail)
  }
  if (lease !== null && !lease.isMine) {
    throw new AppError('conflict', `${lease.holder} is reviewing this until ${lease.until}. Your words were not sent.`)
  }
  return refuseStale(db, actor, id)
}

const listDeclined = (fields: DecisionRequest['fields'] = {}): ReadonlySet<string> =>
  new Set(Object.keys(fields).filter((key) => fields[key]?.decision === 'decline'))

/** Opens a dispute rather than turn a value once more; what is declined turns nothing. */
async function requireSettled(db: Database, row: ProposalRow, fields: DecisionRequest['fields']): Promise<void> {
  const declined = listDeclined(fields)
  const values = Object.fromEntries(Object.entries(row.values).filter(([key]) => !declined.has(key)))
  refuseDisputed(await findDisputed(db, { gearId: row.gearId, values, proposalId: row.id }))
}

export async function decideProposal(
  db: Database,
  actor: Actor,
  seen: { readonly id: string; readonly version: number },
  request: DecisionRequest,
  { requestId, origin }: Trace,
): Promise<Proposal> {
  requireModerator(actor)
  const row = await requireReadable(db, actor, seen.id)
  if (row.authorId === actor.id) throw new AppError('forbidden', 'Nobody decides what is their own.')
  if (row.status !== 'pending') await refuse(db, actor, seen.id)
  const { decision, reasonCode, words, fields } = request
  if (decision === 'approve' && row.version === seen.version) await requireSettled(db, row, fields)
  const status = statuses[decision]
  const isDone = await runTransaction(db, async (tx) => {
    const outcome = { status, decision: { ...toStored(actor, request) } }
    if (!(await claimDecision(tx, seen, actor.id, outcome))) return false
    const claimed = await findProposal(tx, seen.id)
    if (claimed === null) throw new Error('The proposal went missing while it was decided')
    const revision = decision === 'approve' ? await applyProposal(tx, actor, claimed, fields) : null
    await insertMessage(tx, { proposalId: seen.id, personId: actor.id, kind: status, words: words ?? null })
    await recordAudit(tx, {
      actorId: actor.id,
      action: `proposal.${decision}`,
      subjectType: 'proposal',
      subjectId: seen.id,
      detail: { reasonCode: reasonCode ?? null, declined: [...listDeclined(fields)], ...revision },
      requestId,
    })
    await tellAuthor(tx, claimed, { type: status, words, reasonCode, by: actor.name, origin })
    return true
  })
  return isDone ? getProposal(db, actor, seen.id) : refuse(db, actor, seen.id)
}
