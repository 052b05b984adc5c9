import type { Database } from '../../db/database'
import type { ProposedValues } from '../../db/schema/index'
import { recordAudit } from '../../lib/audit'
import { AppError } from '../../lib/errors'
import { toPointer } from '../../lib/to-issues'
import { readHistory } from '../gear/gear-history.service'
import { isThirdTurn } from '../gear/value-history'
import { insertDispute, listOpenDisputes } from './disputes.queries'

interface Turning {
  /** Null: a new piece, of which nothing can be in dispute. */
  readonly gearId: number | null
  readonly values: ProposedValues
  readonly proposalId: string
}

async function findTurned(db: Database, gearId: number, values: ProposedValues): Promise<string[]> {
  const history = await readHistory(db, gearId)
  return Object.entries(values).flatMap(([key, proposed]) => {
    const rows = history.filter((row) => row.key === key)
    return proposed !== null && isThirdTurn(rows, proposed.value) ? [key] : []
  })
}

async function openDisputes(db: Database, gearId: number, keys: readonly string[], proposalId: string): Promise<void> {
  await db.transaction(async (tx) => {
    for (const key of keys) {
      const id = await insertDispute(tx, { gearId, key, proposalId })
      if (id === null) continue
      const event = { action: 'dispute.open', subjectType: 'dispute', subjectId: id }
      await recordAudit(tx, { actorId: null, ...event, detail: { gearId, key, proposalId } })
    }
  })
}

/** Keys in dispute, among them those that these values would turn once more; the disputes are opened. */
export async function findDisputed(db: Database, { gearId, values, proposalId }: Turning): Promise<string[]> {
  if (gearId === null || Object.keys(values).length === 0) return []
  const turned = await findTurned(db, gearId, values)
  if (turned.length > 0) await openDisputes(db, gearId, turned, proposalId)
  return (await listOpenDisputes(db, gearId, Object.keys(values))).map(({ key }) => key)
}

export function refuseDisputed(keys: readonly string[]): void {
  if (keys.length === 0) return
  const detail =
    'Two sources disagree about this and it went to and fro: a moderator settles it first. What you wrote is kept.'
  const issues = keys.map((key) => ({ pointer: toPointer(['values', key]), detail: 'is in dispute' }))
  throw new AppError('conflict', detail, issues)
}

/** Refuses to send in what is in dispute. */
export async function requireUndisputed(db: Database, turning: Turning): Promise<void> {
  refuseDisputed(await findDisputed(db, turning))
}
