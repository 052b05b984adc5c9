import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError, createInvalidError } from '../../lib/errors'
import { readHistory, toNewValue, type HistoricValue, type NewValue } from '../gear/gear-history.service'
import { lockPiece, readIdentityAt, revisePiece } from '../gear/gear-revise.service'
import { getGear, requireGear, requireLivePiece } from '../gear/gear.service'
import { isSameValue, readSources } from '../gear/value-history'
import { requireModerator } from '../proposals/proposals.policy'

/** Rows that make a value's used one what it was; nothing where it is that already. */
export function resetTo(
  key: string,
  target: HistoricValue | null,
  used: HistoricValue | null,
  personId: number,
): readonly NewValue[] {
  if (target?.revision === used?.revision) return []
  if (target === null) {
    const dated = new Date().toISOString().slice(0, 10)
    return [{ key, value: null, source: null, dated, authorId: personId, standing: 'reset' }]
  }
  const isAlike = used !== null && isSameValue(target.value, used.value) && target.source === used.source
  return isAlike ? [] : [{ ...toNewValue(target), standing: 'reset' }]
}

export interface Restoring {
  readonly slug: string
  readonly revision: number
  readonly words: string
  /** The revision that the moderator saw as the newest. */
  readonly seen: number
  readonly requestId: string
}

/** Makes an earlier revision the present state again, as a new revision. */
export async function restoreRevision(db: Database, actor: Actor, restoring: Restoring): Promise<void> {
  requireModerator(actor)
  const { slug, revision, words, seen, requestId } = restoring
  const piece = await requireLivePiece(db, slug)
  if (revision > piece.headRevision) {
    throw createInvalidError([{ pointer: '#/revision', detail: `must be at most ${piece.headRevision}` }])
  }
  const isDone = await runTransaction(db, async (tx) => {
    const head = await lockPiece(tx, piece.id)
    if (head.number !== seen) return false
    const history = await readHistory(tx, head.id)
    const values = [...new Set(history.map(({ key }) => key))].flatMap((key) => {
      const rows = history.filter((row) => row.key === key)
      const then = readSources(rows.filter((row) => row.revision <= revision)).used
      return resetTo(key, then, readSources(rows).used, actor.id)
    })
    const identity = await readIdentityAt(tx, head, revision)
    if (values.length === 0 && Object.keys(identity).length === 0) {
      throw new AppError('conflict', `Revision ${revision} says what the piece says now: there is nothing to restore.`)
    }
    const change = { authorId: actor.id, reviewerId: actor.id, proposalId: null, summary: words, identity, values }
    const number = await revisePiece(tx, head, change)
    const event = { action: 'gear.restore', subjectType: 'gear', subjectId: slug }
    await recordAudit(tx, { actorId: actor.id, ...event, detail: { from: revision, number, words }, requestId })
    return true
  })
  if (isDone) return
  const current = await getGear(db, await requireGear(db, slug))
  const detail = 'The piece was changed since you read it. Nothing was restored; look at what is new first.'
  throw new AppError('stale', detail, [], { extra: { current } })
}
