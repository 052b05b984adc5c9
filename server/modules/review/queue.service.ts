import { z } from 'zod'
import type { Queue, QueueQuery, WaitingTimes } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { createCursor, readCursor } from '../../lib/cursor'
import { findNames } from '../people/people.service'
import { requireModerator } from '../proposals/proposals.policy'
import { findRecords } from '../proposals/read-proposal.service'
import { presentQueueItem } from './queue.presenter'
import { countKinds, countQueue, listQueue, readWaited, readWaiting } from './queue.queries'

const pageSize = 25
const placeSchema = z.strictObject({ offset: z.int().min(1).max(1_000_000) })

/** What waits for a decision. */
export async function getQueue(db: Database, actor: Actor, query: QueueQuery): Promise<Queue> {
  requireModerator(actor)
  const { kind, age, flagged, sort, cursor } = query
  const question = JSON.stringify(['review', kind, age, flagged, sort])
  const offset = cursor === undefined ? 0 : readCursor(cursor, question, placeSchema).offset
  const rows = await listQueue(db, query, offset, pageSize + 1)
  const page = rows.slice(0, pageSize)
  const findRecord = await findRecords(
    db,
    page.map(({ authorId }) => authorId),
  )
  const nameAuthor = await findNames(
    db,
    page.flatMap(({ authorId, leasedBy }) => [authorId, leasedBy]),
  )
  return {
    items: page.map((row) => presentQueueItem(row, actor, findRecord(row.authorId), nameAuthor)),
    total: await countQueue(db, query),
    kinds: await countKinds(db),
    next: rows.length > pageSize ? createCursor({ offset: offset + pageSize }, question) : null,
  }
}

const days = 90

const round = (hours: number) => Math.round(hours * 10) / 10

/** How long people wait, for everybody to see. */
export async function getWaitingTimes(db: Database): Promise<WaitingTimes> {
  const { decided, p50, p75, p95 } = await readWaited(db, days)
  const { waiting, oldestAt } = await readWaiting(db)
  const isKnown = p50 !== null && p75 !== null && p95 !== null
  return {
    days,
    decided,
    hours: isKnown ? { p50: round(p50), p75: round(p75), p95: round(p95) } : null,
    waiting,
    oldestAt: oldestAt === null ? null : new Date(oldestAt).toISOString(),
  }
}
