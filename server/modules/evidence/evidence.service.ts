import { createHash, randomUUID } from 'node:crypto'
import { evidenceLimits, type Evidence, type EvidenceList } from '#shared/schemas/evidence'
import type { Database } from '../../db/database'
import { isModerator, type Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError } from '../../lib/errors'
import type { FileStore } from '../../services/files/file-store'
import { detectType, type EvidenceType } from './detect-type'
import { canRemove, canSee, canUpload, isOpen } from './evidence.policy'
import { presentEvidence } from './evidence.presenter'
import * as queries from './evidence.queries'
import type { NewEvidence } from './evidence.queries'
import { preparePhoto } from './prepare-photo'

const notThere = () => new AppError('not-found', 'There is no file by that name, or it is not public yet.')

export interface Upload {
  readonly content: Buffer
  readonly name: string
  readonly caption: string | undefined
}

type OpenProposal = NonNullable<Awaited<ReturnType<typeof queries.findProposal>>>

/** Asked before the file is read, and again when it is kept: much can happen while a large photo comes in. */
export async function requireOpenProposal(db: Database, id: string, actor: Actor, options = {}): Promise<OpenProposal> {
  const proposal = await queries.findProposal(db, id, options)
  const isSeen = proposal !== undefined && (proposal.authorId === actor.id || isModerator(actor))
  if (!isSeen) throw new AppError('not-found', 'There is no proposal by that name.')
  if (proposal.authorId !== actor.id) throw new AppError('forbidden', 'Only its author adds evidence to a proposal.')
  if (!canUpload(actor))
    throw new AppError('forbidden', 'Confirm your e-mail address first; then you can add evidence.')
  if (!isOpen(proposal.status)) {
    throw new AppError('conflict', `The proposal is ${proposal.status}: evidence can no longer be added to it.`)
  }
  if ((await queries.countEvidence(db, id)) >= evidenceLimits.perProposal) {
    throw new AppError('conflict', `A proposal holds ${evidenceLimits.perProposal} files at most. Remove one first.`)
  }
  return proposal
}

interface Prepared {
  readonly type: EvidenceType
  readonly content: Buffer
  readonly width: number | null
  readonly height: number | null
  readonly thumbnail: Buffer | null
}

async function prepare({ content, name }: Upload): Promise<Prepared> {
  const type = await detectType(content, name)
  if (type === 'application/pdf') return { type, content, width: null, height: null, thumbnail: null }
  return { type, ...(await preparePhoto(content, type.slice('image/'.length) as 'jpeg' | 'png' | 'webp')) }
}

export interface Deed {
  readonly actor: Actor
  readonly requestId: string
}

export interface Stores {
  readonly db: Database
  readonly files: FileStore
}

const listKeys = (file: { readonly storageKey: string; readonly thumbnailKey: string | null }): string[] =>
  file.thumbnailKey === null ? [file.storageKey] : [file.storageKey, file.thumbnailKey]

/** The row and its audit event, or the row that an earlier sending of the same file left. */
async function keepRow(
  db: Database,
  row: NewEvidence & { id: string; proposalId: string },
  { actor, requestId }: Deed,
) {
  return db.transaction(async (tx) => {
    const { status } = await requireOpenProposal(tx, row.proposalId, actor, { isLocked: true })
    const same = await queries.findSame(tx, row)
    if (same !== undefined) return { file: same, status }
    const file = await queries.insertEvidence(tx, row)
    const detail = { proposalId: row.proposalId, sha256: row.sha256, bytes: row.bytes }
    const event = { action: 'evidence.add', subjectType: 'evidence', subjectId: row.id, detail, requestId }
    await recordAudit(tx, { actorId: actor.id, ...event })
    return { file, status }
  })
}

/**
 * Bytes first, then the row: a process that ends in between leaves bytes without a row, which the sweep finds. The same
 * file sent again is kept once.
 */
export async function addEvidence(
  { db, files }: Stores,
  proposalId: string,
  upload: Upload,
  by: Deed,
): Promise<Evidence> {
  const { type, content, width, height, thumbnail } = await prepare(upload)
  const id = randomUUID()
  const row = {
    id,
    proposalId,
    uploaderId: by.actor.id,
    kind: type === 'application/pdf' ? ('document' as const) : ('photo' as const),
    contentType: type,
    bytes: content.length,
    width,
    height,
    sha256: createHash('sha256').update(content).digest('hex'),
    storageKey: `evidence/${id}`,
    thumbnailKey: thumbnail === null ? null : `evidence/${id}-thumbnail`,
    caption: upload.caption || null,
  }
  const dropBytes = () => files.remove(listKeys(row)).catch(() => undefined)
  try {
    await files.put(row.storageKey, content, type)
    if (thumbnail !== null && row.thumbnailKey !== null) await files.put(row.thumbnailKey, thumbnail, 'image/webp')
    const { file, status } = await keepRow(db, row, by)
    if (file.id !== id) await dropBytes()
    return presentEvidence(file, status, by.actor)
  } catch (error) {
    await dropBytes()
    throw error
  }
}

export async function listEvidence(db: Database, proposalId: string, actor: Actor): Promise<EvidenceList> {
  const proposal = await queries.findProposal(db, proposalId)
  const isSeen = proposal !== undefined && (proposal.authorId === actor.id || isModerator(actor))
  if (!isSeen) throw new AppError('not-found', 'There is no proposal by that name.')
  const rows = await queries.listEvidence(db, proposalId)
  return { items: rows.map((row) => presentEvidence(row, proposal.status, actor)) }
}

export interface OpenedFile {
  readonly key: string
  readonly contentType: string
  readonly isPublished: boolean
  readonly etag: string
}

export async function findFile(
  db: Database,
  id: string,
  actor: Actor | null,
  size: 'whole' | 'thumbnail',
): Promise<OpenedFile> {
  const found = await queries.findEvidence(db, id)
  if (found === undefined || !canSee(actor, found.file)) throw notThere()
  const { storageKey, thumbnailKey, contentType, publishedAt, sha256 } = found.file
  const isPublished = publishedAt !== null
  if (size === 'whole') return { key: storageKey, contentType, isPublished, etag: `"${sha256}"` }
  if (thumbnailKey === null) throw notThere()
  return { key: thumbnailKey, contentType: 'image/webp', isPublished, etag: `"${sha256}-small"` }
}

export async function removeEvidence({ db, files }: Stores, id: string, { actor, requestId }: Deed): Promise<void> {
  const removed = await db.transaction(async (tx) => {
    const found = await queries.findEvidence(tx, id)
    if (found === undefined || !canSee(actor, found.file)) throw notThere()
    const { file } = found
    if (file.uploaderId !== actor.id) throw new AppError('forbidden', 'Only whoever added a file removes it.')
    if (file.proposalId !== null) await queries.findProposal(tx, file.proposalId, { isLocked: true })
    const row = canRemove(actor, file, found.status) ? await queries.deleteEvidence(tx, id) : undefined
    if (row === undefined) throw new AppError('conflict', 'The proposal is decided: what backs it stays.')
    const detail = { proposalId: file.proposalId, sha256: file.sha256 }
    const event = { action: 'evidence.remove', subjectType: 'evidence', subjectId: id, detail, requestId }
    await recordAudit(tx, { actorId: actor.id, ...event })
    return row
  })
  // Without the row nobody reaches them; when the store is away, the sweep clears up.
  await files.remove(listKeys(removed)).catch(() => undefined)
}
