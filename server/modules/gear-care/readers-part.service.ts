import type { GearCare } from '#shared/schemas/review'
import { getAttribute, isKindKey } from '#shared/kinds/index'
import type { Database } from '../../db/database'
import { runTransaction } from '../../db/retry'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError, createInvalidError } from '../../lib/errors'
import { findSlugOf, requireGear, requireLivePiece } from '../gear/gear.service'
import { requireContributor } from '../proposals/proposals.policy'
import { listOpenProposals } from '../proposals/read-proposal.service'
import { listCareRights, nameState } from './gear-care.policy'
import { countConfirmationsOf, insertConfirmation, insertReport, listConfirmedKeys } from './gear-care.queries'

/** How a piece stands, and what the reader did and may do with it. */
export async function getCare(db: Database, actor: Actor, slug: string): Promise<GearCare> {
  const row = await requireGear(db, slug)
  const { kind, brand, model, headRevision: revision, mergedInto, retiredReason } = row
  const own = Object.entries(row.provenance).filter(([, { authorId }]) => authorId === actor.id)
  return {
    slug,
    kind,
    brand,
    model,
    revision,
    state: nameState(row),
    mergedInto: mergedInto === null ? null : await findSlugOf(db, mergedInto),
    retiredReason,
    confirmed: await listConfirmedKeys(db, row.id, actor.id),
    own: own.map(([key]) => key),
    proposals: await listOpenProposals(db, actor, row.id),
    can: listCareRights(actor, row),
  }
}

interface Confirming {
  readonly slug: string
  readonly key: string
  readonly measured?: number | undefined
  readonly requestId: string
}

/** Notes that somebody else measured a value too: once a person and value, and never one's own. */
export async function confirmValue(db: Database, actor: Actor, { slug, key, measured, requestId }: Confirming) {
  requireContributor(actor)
  const piece = await requireLivePiece(db, slug)
  if (piece.specs[key] === undefined)
    throw createInvalidError([{ pointer: '#/key', detail: 'is not known of the piece' }])
  const attribute = isKindKey(piece.kind) ? getAttribute(piece.kind, key) : undefined
  if (measured !== undefined && attribute?.type !== 'measure') {
    throw createInvalidError([{ pointer: '#/measured', detail: 'must be left out: this is no measure' }])
  }
  if (piece.provenance[key]?.authorId === actor.id) {
    throw new AppError('forbidden', 'This number is your own; somebody else confirms it.')
  }
  return runTransaction(db, async (tx) => {
    const value = piece.specs[key]
    const row = { gearId: piece.id, key, personId: actor.id, value, ...(measured !== undefined && { measured }) }
    const isNew = await insertConfirmation(tx, row)
    if (isNew) {
      const event = { action: 'gear.confirm', subjectType: 'gear', subjectId: slug }
      await recordAudit(tx, { actorId: actor.id, ...event, detail: { key, measured: measured ?? null }, requestId })
    }
    return { isNew, confirmation: { key, count: await countConfirmationsOf(tx, piece.id, key) } }
  })
}

interface Reporting {
  readonly slug: string
  readonly key?: string | undefined
  readonly words: string
  readonly requestId: string
}

/** Keeps what a reader found wrong; they need no account. */
export async function reportError(db: Database, actor: Actor | null, reporting: Reporting): Promise<void> {
  const { slug, key, words, requestId } = reporting
  const piece = await requireLivePiece(db, slug)
  if (key !== undefined && isKindKey(piece.kind) && getAttribute(piece.kind, key) === undefined) {
    throw createInvalidError([{ pointer: '#/key', detail: 'is nothing that is kept of the kind' }])
  }
  await runTransaction(db, async (tx) => {
    const personId = actor?.id ?? null
    const id = await insertReport(tx, { gearId: piece.id, key: key ?? null, words, personId })
    const event = { action: 'report.create', subjectType: 'report', subjectId: id }
    await recordAudit(tx, { actorId: personId, ...event, detail: { gear: slug, key: key ?? null }, requestId })
  })
}
