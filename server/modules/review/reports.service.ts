import type { ErrorReportList } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError } from '../../lib/errors'
import { findNames } from '../people/people.service'
import { requireModerator } from '../proposals/proposals.policy'
import { readPage } from './desk-pages'
import { closeReport, findReport, listReports } from './disputes.queries'

/** What readers found wrong and nobody looked into yet. */
export async function getReports(db: Database, actor: Actor, cursor: string | undefined): Promise<ErrorReportList> {
  requireModerator(actor)
  const page = await readPage('reports', cursor, (after, limit) => listReports(db, after, limit))
  const nameAuthor = await findNames(
    db,
    page.rows.map(({ personId }) => personId),
  )
  const items = page.rows.map(({ id, piece, key, words, personId, status, createdAt }) => {
    const author = personId === null ? null : nameAuthor({ authorId: personId })
    return { id, gear: piece, key, words, author, status, createdAt: createdAt.toISOString() }
  })
  return { items, next: page.next }
}

interface Settling {
  readonly id: string
  readonly words: string
  readonly requestId: string
}

export async function settleReport(db: Database, actor: Actor, { id, words, requestId }: Settling): Promise<void> {
  requireModerator(actor)
  if ((await findReport(db, id)) === null) throw new AppError('not-found', 'There is no such report.')
  await runTransaction(db, async (tx) => {
    if (!(await closeReport(tx, id, actor.id))) throw new AppError('conflict', 'Somebody settled this report already.')
    const event = { action: 'report.settle', subjectType: 'report', subjectId: id }
    await recordAudit(tx, { actorId: actor.id, ...event, detail: { words }, requestId })
  })
}
