import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError, createInvalidError } from '../../lib/errors'
import { lockPiece, type Head } from '../gear/gear-revise.service'
import { requireGear } from '../gear/gear.service'
import { requireModerator } from '../proposals/proposals.policy'
import { nameState } from './gear-care.policy'
import { setMerged, setRetired } from './gear-care.queries'

interface Care {
  readonly slug: string
  readonly words: string
  readonly requestId: string
}

const states = { live: 'in the catalogue', merged: 'merged into another piece', retired: 'retired' } as const

function requireState(head: Head, wanted: keyof typeof states): void {
  const state = nameState(head)
  if (state === wanted) return
  throw new AppError('conflict', `"${head.slug}" is ${states[state]}; this is for a piece that is ${states[wanted]}.`)
}

type Step = 'merge' | 'unmerge' | 'retire' | 'unretire'

async function audit(tx: Database, actor: Actor, head: Head, step: Step, care: Care, more: object = {}): Promise<void> {
  const { slug, words, requestId } = care
  const event = { action: `gear.${step}`, subjectType: 'gear', subjectId: slug }
  await recordAudit(tx, { actorId: actor.id, ...event, detail: { gearId: head.id, words, ...more }, requestId })
}

/** Locks in the order of ids, so that two merges of the same two pieces wait for each other rather than lock up. */
async function lockBoth(tx: Database, id: number, intoId: number): Promise<readonly [Head, Head]> {
  if (id < intoId) {
    const first = await lockPiece(tx, id)
    return [first, await lockPiece(tx, intoId)]
  }
  const into = await lockPiece(tx, intoId)
  return [await lockPiece(tx, id), into]
}

/** Leads every address of a duplicate to the other piece. Both keep their revisions, so that it can be undone. */
export async function mergePiece(db: Database, actor: Actor, care: Care & { readonly into: string }): Promise<void> {
  requireModerator(actor)
  const piece = await requireGear(db, care.slug)
  const into = await requireGear(db, care.into).catch(() => null)
  const issue = (detail: string) => createInvalidError([{ pointer: '#/into', detail }])
  if (into === null) throw issue('is no piece of gear that there is')
  if (into.id === piece.id) throw issue('must be another piece')
  if (into.kind !== piece.kind) throw issue(`must be of the same kind, ${piece.kind}`)
  await runTransaction(db, async (tx) => {
    const [head, other] = await lockBoth(tx, piece.id, into.id)
    requireState(head, 'live')
    requireState(other, 'live')
    await setMerged(tx, head.id, other.id)
    await audit(tx, actor, head, 'merge', care, { into: care.into })
  })
}

export async function unmergePiece(db: Database, actor: Actor, care: Care): Promise<void> {
  requireModerator(actor)
  const { id } = await requireGear(db, care.slug)
  await runTransaction(db, async (tx) => {
    const head = await lockPiece(tx, id)
    requireState(head, 'merged')
    await setMerged(tx, id, null)
    await audit(tx, actor, head, 'unmerge', care)
  })
}

/** Takes a piece out of the catalogue; its address says so, with the reason. */
export async function retirePiece(db: Database, actor: Actor, care: Care): Promise<void> {
  requireModerator(actor)
  const { id } = await requireGear(db, care.slug)
  await runTransaction(db, async (tx) => {
    const head = await lockPiece(tx, id)
    requireState(head, 'live')
    await setRetired(tx, id, care.words)
    await audit(tx, actor, head, 'retire', care)
  })
}

export async function unretirePiece(db: Database, actor: Actor, care: Care): Promise<void> {
  requireModerator(actor)
  const { id } = await requireGear(db, care.slug)
  await runTransaction(db, async (tx) => {
    const head = await lockPiece(tx, id)
    requireState(head, 'retired')
    await setRetired(tx, id, null)
    await audit(tx, actor, head, 'unretire', care)
  })
}

interface Retiring {
  readonly head: Head
  readonly actorId: number
  readonly words: string
  readonly jobId: string
}

/** Retires a piece whose lock is held, as one step of longer work. */
export async function retireLocked(tx: Database, { head, actorId, words, jobId }: Retiring): Promise<void> {
  if (nameState(head) !== 'live') return
  await setRetired(tx, head.id, words)
  const event = { action: 'gear.retire', subjectType: 'gear', subjectId: head.slug }
  await recordAudit(tx, { actorId, ...event, detail: { gearId: head.id, words, jobId } })
}
