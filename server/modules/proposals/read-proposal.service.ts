import type { Proposal, ProposalList, ProposalStatus } from '#shared/schemas/proposals'
import { z } from 'zod'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { createCursor, readCursor } from '../../lib/cursor'
import { AppError } from '../../lib/errors'
import { listNamed, readHistory } from '../gear/gear-history.service'
import { findNames } from '../people/people.service'
import { compareWithRecord } from './compare-with-record'
import { listFiles, listMessages } from './proposal-talk.queries'
import { canRead } from './proposals.policy'
import { findHolder, presentProposal, presentProposalItem, readDecision } from './proposals.presenter'
import { countMine, findProposal, listMine, listOpenAbout, listRecords, type ProposalRow } from './proposals.queries'

/** The row, for whoever may read it; for everybody else it does not exist. */
export async function requireReadable(db: Database, actor: Actor, id: string): Promise<ProposalRow> {
  const row = await findProposal(db, id)
  if (row === null || !canRead(actor, row)) throw new AppError('not-found', 'There is no such proposal.')
  return row
}

export interface AuthorRecord {
  readonly accepted: number
  readonly declined: number
}

/** What became of people's earlier proposals. */
export async function findRecords(db: Database, authorIds: readonly number[]): Promise<(id: number) => AuthorRecord> {
  const rows = await listRecords(db, authorIds)
  const records = new Map(rows.map(({ authorId, accepted, declined }) => [authorId, { accepted, declined }]))
  return (id) => records.get(id) ?? { accepted: 0, declined: 0 }
}

async function describe(db: Database, actor: Actor, row: ProposalRow): Promise<Proposal> {
  const history = await readHistory(db, row.gearId)
  const messages = await listMessages(db, row.id)
  const files = await listFiles(db, row.id)
  const findRecord = await findRecords(db, [row.authorId])
  const nameAuthor = await findNames(db, [
    row.authorId,
    row.decidedBy,
    findHolder(row),
    readDecision(row)?.by,
    ...messages.map(({ personId }) => personId),
    ...listNamed(history),
  ])
  const compared = compareWithRecord(history, row.baseRevision, row.values)
  return presentProposal(actor, { row, compared, messages, files, record: findRecord(row.authorId) }, nameAuthor)
}

export async function getProposal(db: Database, actor: Actor, id: string): Promise<Proposal> {
  return describe(db, actor, await requireReadable(db, actor, id))
}

/** Refuses a change of something that has moved on, and says how it stands now. */
export async function refuseStale(db: Database, actor: Actor, id: string): Promise<never> {
  const current = await getProposal(db, actor, id)
  const detail = 'This proposal was changed since you read it. Nothing of yours was saved; look at what is new first.'
  throw new AppError('stale', detail, [], { extra: { current } })
}

const placeSchema = z.strictObject({ updatedAt: z.iso.datetime(), id: z.uuid() })
const pageSize = 20

export async function getMine(
  db: Database,
  actor: Actor,
  { status, cursor }: { readonly status?: ProposalStatus | undefined; readonly cursor?: string | undefined },
): Promise<ProposalList> {
  const question = JSON.stringify(['proposals', actor.id, status])
  const after = cursor === undefined ? null : readCursor(cursor, question, placeSchema)
  const rows = await listMine(db, actor.id, status, after, pageSize + 1)
  const items = rows.slice(0, pageSize)
  const last = items.at(-1)
  const hasMore = rows.length > pageSize && last !== undefined
  return {
    items: items.map(presentProposalItem),
    total: await countMine(db, actor.id, status),
    next: hasMore ? createCursor({ updatedAt: last.updatedAt.toISOString(), id: last.id }, question) : null,
  }
}

/** A person's own proposals about a piece that are still open. */
export const listOpenProposals = (db: Database, actor: Actor, gearId: number) => listOpenAbout(db, actor.id, gearId)
