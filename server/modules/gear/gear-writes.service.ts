import { isKindKey } from '#shared/kinds/index'
import type { Database } from '../../db/database'
import { findUniqueViolation } from '../../db/errors'
import { AppError, createInvalidError, type Issue } from '../../lib/errors'
import { insertGear, insertRevisions, lockHead, lockHeads, updateHead } from './gear-writes.queries'
import { preparePiece, prepareRevision } from './gear.prepare'
import type { PieceInput, PreparedPiece, PreparedRevision, RevisionInput, SpecsState } from './gear.types'

type Head = NonNullable<Awaited<ReturnType<typeof lockHead>>>

function toDate(day: string): Date {
  return new Date(`${day}T00:00:00Z`)
}

async function insertPieces(db: Database, pieces: readonly PreparedPiece[]): Promise<void> {
  const entries = pieces.map((piece) => {
    return { piece, createdAt: toDate(piece.first.input.date), updatedAt: toDate(piece.head.input.date) }
  })
  const ids = await insertGear(db, entries)
  const inserted = pieces.flatMap(({ identity, revisions }) => {
    const gearId = ids.get(identity.slug)
    if (gearId === undefined) throw new Error(`${identity.slug} was not inserted`)
    return revisions.map((revision) => ({ gearId, revision, createdAt: toDate(revision.input.date) }))
  })
  await insertRevisions(db, inserted)
}

async function appendRevision(db: Database, head: Head, input: RevisionInput, createdAt: Date): Promise<SpecsState> {
  if (!isKindKey(head.kind)) throw new Error(`${head.slug} is of a kind that is no longer known: ${head.kind}`)
  const state = prepareRevision(head.kind, head, input)
  await insertRevisions(db, [{ gearId: head.id, revision: { state, input }, createdAt }])
  await updateHead(db, head, state, createdAt)
  return state
}

async function appendRevisions(db: Database, head: Head, revisions: readonly PreparedRevision[]): Promise<void> {
  let newest = head
  for (const { input } of revisions) {
    newest = { ...newest, ...(await appendRevision(db, newest, input, toDate(input.date))) }
  }
}

function explainDuplicate(error: unknown): never {
  const constraint = findUniqueViolation(error)
  if (constraint === null) throw error
  const field = constraint.includes('gtin') ? 'GTIN' : 'slug'
  throw new AppError('conflict', `Another piece of gear has this ${field}.`, [], { cause: error })
}

/** Adds one piece with its revisions, in one transaction. Answers its slug. */
export async function createPiece(db: Database, input: PieceInput): Promise<string> {
  const piece = preparePiece(input)
  await db.transaction((tx) => insertPieces(tx, [piece])).catch(explainDuplicate)
  return piece.identity.slug
}

/** Adds a revision to the newest state of a piece: revision, values and head together or not at all. */
export async function addRevision(db: Database, slug: string, input: RevisionInput): Promise<SpecsState> {
  return db.transaction(async (tx) => {
    const head = await lockHead(tx, slug)
    if (head === null) throw new AppError('not-found', `There is no piece of gear called "${slug}".`)
    return appendRevision(tx, head, input, new Date())
  })
}

export interface ImportCounts {
  readonly created: number
  readonly extended: number
  readonly unchanged: number
}

function prepareAll(inputs: readonly PieceInput[]): PreparedPiece[] {
  const issues: Issue[] = []
  const pieces = inputs.map((input, index) => {
    try {
      return preparePiece(input)
    } catch (error) {
      if (!(error instanceof AppError) || error.code !== 'invalid') throw error
      const name = `#/${index} (${input.brand} ${input.model})`
      issues.push(...error.issues.map((issue) => ({ ...issue, pointer: name + issue.pointer.slice(1) })))
      return null
    }
  })
  if (issues.length > 0) throw createInvalidError(issues)
  return pieces.filter((piece) => piece !== null)
}

/**
 * Brings pieces in, all or none, and may be repeated: a piece that is there keeps what people have made of it, and only
 * gets the revisions that it does not have yet.
 */
export async function importPieces(db: Database, inputs: readonly PieceInput[]): Promise<ImportCounts> {
  const pieces = prepareAll(inputs)
  return db.transaction(async (tx) => {
    const heads = await lockHeads(
      tx,
      pieces.map(({ identity }) => identity.slug),
    )
    const headBySlug = new Map(heads.map((head) => [head.slug, head]))
    const fresh = pieces.filter(({ identity }) => !headBySlug.has(identity.slug))
    await insertPieces(tx, fresh)
    let extended = 0
    for (const { identity, revisions } of pieces) {
      const head = headBySlug.get(identity.slug)
      const later = head === undefined ? [] : revisions.slice(head.number)
      if (head !== undefined) await appendRevisions(tx, head, later)
      if (later.length > 0) extended += 1
    }
    return { created: fresh.length, extended, unchanged: pieces.length - fresh.length - extended }
  })
}
