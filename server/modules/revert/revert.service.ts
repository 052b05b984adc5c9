import { z } from 'zod'
import type { LongJob } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { enqueueJob } from '../../db/job-queue'
import { runTransaction } from '../../db/retry'
import { isAdmin, type Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError } from '../../lib/errors'
import { findPersonId } from '../people/people.service'
import { requireContributor } from '../proposals/proposals.policy'
import { revertPiece } from './revert-piece.service'
import { countTouched, findJob, insertJob, listTouched, lockJob, updateJob, type JobRow } from './revert.queries'

const revertKind = 'revert-person'
const piecesPerStep = 50

function requireAdmin(actor: Actor): void {
  requireContributor(actor)
  if (!isAdmin(actor)) throw new AppError('forbidden', 'Only admins do this.')
}

const subjectSchema = z.object({ personId: z.int(), name: z.string(), words: z.string() })
const outcomeSchema = z.object({ changed: z.int(), skipped: z.array(z.int()), after: z.int() })
const begin = { changed: 0, skipped: [], after: 0 }

function presentJob({ id, kind, status, done, total, outcome, createdAt, endedAt }: JobRow): LongJob {
  const { changed, skipped } = outcomeSchema.catch(begin).parse(outcome)
  return {
    id,
    kind,
    status,
    done,
    total,
    outcome: { changed, skipped: skipped.length },
    createdAt: createdAt.toISOString(),
    endedAt: endedAt?.toISOString() ?? null,
  }
}

export async function getJob(db: Database, actor: Actor, id: string): Promise<LongJob> {
  requireAdmin(actor)
  const row = await findJob(db, id)
  if (row === null) throw new AppError('not-found', 'There is no such job.')
  return presentJob(row)
}

interface Start {
  readonly name: string
  readonly words: string
  readonly requestId: string
}

/** Begins to take all of a person's changes back; the work itself is done by a worker, step by step. */
export async function startRevert(db: Database, actor: Actor, { name, words, requestId }: Start): Promise<LongJob> {
  requireAdmin(actor)
  const personId = await findPersonId(db, name)
  if (personId === null) throw new AppError('not-found', `There is nobody called "${name}".`)
  const id = await runTransaction(db, async (tx) => {
    const total = await countTouched(tx, personId)
    const jobId = await insertJob(tx, {
      kind: revertKind,
      startedBy: actor.id,
      subject: { personId, name, words },
      total,
      outcome: begin,
    })
    const event = { action: 'person.revert', subjectType: 'person', subjectId: personId }
    await recordAudit(tx, { actorId: actor.id, ...event, detail: { jobId, words, total }, requestId })
    await enqueueJob(tx, 'long-work', { id: jobId })
    return jobId
  })
  return getJob(db, actor, id)
}

/** At most fifty pieces in one transaction; answers whether there is more to do. */
async function takeStep(db: Database, jobId: string): Promise<boolean> {
  return runTransaction(db, async (tx) => {
    const job = await lockJob(tx, jobId)
    if (job === null || job.kind !== revertKind || job.status === 'done') return false
    const { personId, words } = subjectSchema.parse(job.subject)
    let { changed, after } = outcomeSchema.parse(job.outcome)
    const skipped = [...outcomeSchema.parse(job.outcome).skipped]
    const ids = await listTouched(tx, personId, after, piecesPerStep)
    for (const gearId of ids) {
      try {
        const reverting = { jobId, personId, adminId: job.startedBy, words }
        if (await tx.transaction((step) => revertPiece(step, gearId, reverting))) changed += 1
      } catch (error) {
        if (!(error instanceof AppError)) throw error
        skipped.push(gearId)
      }
      after = gearId
    }
    const isDone = ids.length < piecesPerStep
    await updateJob(tx, jobId, {
      status: isDone ? 'done' : 'running',
      done: job.done + ids.length,
      outcome: { changed, skipped, after },
      ...(isDone && { endedAt: new Date() }),
    })
    return !isDone
  })
}

const jobDataSchema = z.object({ id: z.uuid() })

/** Does long work to its end. Killed half way, it goes on from the last finished step. */
export async function runLongWork(db: Database, data: unknown): Promise<void> {
  const { id } = jobDataSchema.parse(data)
  let hasMore = true
  while (hasMore) hasMore = await takeStep(db, id)
}
