import type { Dispute, DisputeList } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError, createInvalidError } from '../../lib/errors'
import { listNamed, readHistory, toNewValue } from '../gear/gear-history.service'
import { lockPiece, revisePiece } from '../gear/gear-revise.service'
import { presentBacking } from '../gear/value.presenter'
import { readSources } from '../gear/value-history'
import { findNames } from '../people/people.service'
import { requireModerator } from '../proposals/proposals.policy'
import { readPage } from './desk-pages'
import { closeDispute, findDispute, listDisputes, type DisputeRow } from './disputes.queries'

async function describe(db: Database, row: DisputeRow): Promise<Dispute> {
  const { id, gearId, key, status, proposalId, words, createdAt, piece } = row
  const history = (await readHistory(db, gearId)).filter((value) => value.key === key)
  const nameAuthor = await findNames(db, listNamed(history))
  const { used } = readSources(history)
  const values = history.flatMap((value) => {
    const backing = presentBacking(value, nameAuthor)
    return backing === null ? [] : [{ ...backing, value: value.value, isUsed: value === used }]
  })
  return { id, gear: piece, key, status, proposalId, words, createdAt: createdAt.toISOString(), values }
}

export async function getDisputes(db: Database, actor: Actor, cursor: string | undefined): Promise<DisputeList> {
  requireModerator(actor)
  const page = await readPage('disputes', cursor, (after, limit) => listDisputes(db, after, limit))
  const items: Dispute[] = []
  for (const row of page.rows) items.push(await describe(db, row))
  return { items, next: page.next }
}

interface Settling {
  readonly id: string
  readonly revision: number
  readonly words: string
  readonly requestId: string
}

/** Says which revision's value is used from now on: a revision of its own, and the other sources stay on record. */
export async function settleDispute(db: Database, actor: Actor, settling: Settling): Promise<void> {
  requireModerator(actor)
  const { id, revision, words, requestId } = settling
  const dispute = await findDispute(db, id)
  if (dispute === null) throw new AppError('not-found', 'There is no such dispute.')
  const { gearId, key } = dispute
  await runTransaction(db, async (tx) => {
    if (!(await closeDispute(tx, id, { personId: actor.id, words }))) {
      throw new AppError('conflict', 'Somebody settled this dispute already. Nothing was changed.')
    }
    const head = await lockPiece(tx, gearId)
    const chosen = (await readHistory(tx, gearId)).find((row) => row.key === key && row.revision === revision)
    if (chosen === undefined || chosen.source === null) {
      throw createInvalidError([{ pointer: '#/revision', detail: 'is no revision that set this value' }])
    }
    if (chosen.authorId === actor.id) throw new AppError('forbidden', 'Nobody settles a dispute for their own number.')
    const values = [{ ...toNewValue(chosen), standing: 'chosen' as const }]
    const change = { authorId: actor.id, reviewerId: actor.id, proposalId: null, summary: null, identity: {}, values }
    const number = await revisePiece(tx, head, change)
    const event = { action: 'dispute.settle', subjectType: 'dispute', subjectId: id }
    await recordAudit(tx, { actorId: actor.id, ...event, detail: { gearId, key, revision, number, words }, requestId })
  })
}
