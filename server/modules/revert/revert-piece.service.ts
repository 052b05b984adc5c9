import type { Database } from '../../db/database'
import type { ProposedIdentity } from '../../db/schema/index'
import { recordAudit } from '../../lib/audit'
import { resetTo } from '../gear-care/restore.service'
import { retireLocked } from '../gear-care/piece-state.service'
import { readHistory, toNewValue, type HistoricValue, type NewValue } from '../gear/gear-history.service'
import { lockPiece, revisePiece, type Head } from '../gear/gear-revise.service'
import { readSources } from '../gear/value-history'
import { listIdentityBy } from './revert.queries'

export interface Reverting {
  readonly jobId: string
  /** Whose changes are taken back, and who does it. */
  readonly personId: number
  readonly adminId: number
  readonly words: string
}

/** What a value would be, had the person never touched it. */
function undoValue(key: string, rows: readonly HistoricValue[], { personId, adminId }: Reverting): readonly NewValue[] {
  const now = readSources(rows)
  const without = readSources(rows.filter(({ authorId }) => authorId !== personId)).used
  if (without?.revision !== now.used?.revision) return resetTo(key, without, now.used, adminId)
  const isListed = now.live.some(({ authorId }) => authorId === personId)
  return without !== null && isListed ? [{ ...toNewValue(without), standing: 'reset' }] : []
}

async function undoIdentity(tx: Database, head: Head, personId: number): Promise<ProposedIdentity> {
  const changes = await listIdentityBy(tx, head.id, personId)
  const undone: Record<string, unknown> = {}
  for (const { identity } of changes.toReversed()) {
    for (const [key, after] of Object.entries(identity?.after ?? {})) {
      const stands = key in undone ? undone[key] : head[key as keyof Head]
      if (stands === after) undone[key] = identity?.before[key as keyof ProposedIdentity]
    }
  }
  return undone
}

/** Takes one person's changes of one piece back, as a new revision; a piece that nobody else had a part in is retired. */
export async function revertPiece(tx: Database, gearId: number, reverting: Reverting): Promise<boolean> {
  const { personId, adminId, words, jobId } = reverting
  const head = await lockPiece(tx, gearId)
  const history = await readHistory(tx, gearId)
  if (history.every(({ authorId }) => authorId === personId)) {
    await retireLocked(tx, { head, actorId: adminId, words, jobId })
    return true
  }
  const values = [...new Set(history.map(({ key }) => key))].flatMap((key) =>
    undoValue(
      key,
      history.filter((row) => row.key === key),
      reverting,
    ),
  )
  const identity = await undoIdentity(tx, head, personId)
  if (values.length === 0 && Object.keys(identity).length === 0) return false
  const change = { authorId: adminId, reviewerId: adminId, proposalId: null, summary: words, identity, values }
  const number = await revisePiece(tx, head, change)
  const event = { action: 'gear.revert', subjectType: 'gear', subjectId: head.slug }
  await recordAudit(tx, { actorId: adminId, ...event, detail: { personId, number, jobId } })
  return true
}
