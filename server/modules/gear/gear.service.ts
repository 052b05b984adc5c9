import type { Gear, Revision, RevisionList } from '#shared/schemas/gear'
import type { Database } from '../../db/database'
import { AppError } from '../../lib/errors'
import type { ValueSources } from '#shared/schemas/review'
import { findNames } from '../people/people.service'
import { countConfirmations, listDisputedKeys, listPublished } from './gear-extras.queries'
import { listNamed, readHistory } from './gear-history.service'
import { presentGear, presentRevision, presentRevisionSummary } from './gear.presenter'
import { presentSources } from './value.presenter'
import { findGear, findRevision, findSlug, listGearById, listRevisions, type GearRow } from './gear.queries'

export async function requireGear(db: Database, slug: string): Promise<GearRow> {
  const row = await findGear(db, slug)
  if (row === null) throw new AppError('not-found', `There is no piece of gear called "${slug}".`)
  return row
}

/** How many merges one after the other are followed. */
const mostMerges = 20

/**
 * The piece, or the slug of the one that it was merged into. Throws AppError `gone` for a retired one, with the reason
 * that the moderator gave.
 */
export async function resolveGear(db: Database, slug: string): Promise<GearRow | { readonly movedTo: string }> {
  let row = await requireGear(db, slug)
  for (let merges = 0; row.mergedInto !== null && merges < mostMerges; merges += 1) {
    const next = await findSlug(db, row.mergedInto)
    if (next === null) break
    row = await requireGear(db, next)
  }
  if (row.retiredAt !== null) {
    throw new AppError('gone', `"${slug}" was taken out of the catalogue: ${row.retiredReason ?? 'no reason is known'}`)
  }
  return row.slug === slug ? row : { movedTo: row.slug }
}

export async function getGear(db: Database, row: GearRow): Promise<Gear> {
  const history = await readHistory(db, row.id)
  const files = await listPublished(db, [...new Set(history.flatMap((value) => value.files))])
  const extras = {
    history,
    published: new Map(files.map((file) => [file.id, file])),
    confirmations: await countConfirmations(db, row.id),
    disputed: await listDisputedKeys(db, row.id),
  }
  return presentGear(row, extras, await findNames(db, listNamed(history)))
}

/** All sources of one value that still count. */
export async function getSources(db: Database, row: GearRow, key: string): Promise<ValueSources> {
  const history = (await readHistory(db, row.id)).filter((value) => value.key === key)
  if (history.length === 0) throw new AppError('not-found', `Nothing was ever recorded as ${key}.`)
  const files = await listPublished(
    db,
    history.flatMap((value) => value.files),
  )
  const published = new Map(files.map((file) => [file.id, file]))
  const nameAuthor = await findNames(db, listNamed(history))
  return { slug: row.slug, key, items: presentSources(history, nameAuthor, published) }
}

export async function getRevisions(db: Database, slug: string): Promise<RevisionList> {
  const gear = await requireGear(db, slug)
  const rows = await listRevisions(db, gear.id)
  const nameAuthor = await findNames(
    db,
    rows.map(({ authorId }) => authorId),
  )
  return { slug: gear.slug, items: rows.map((row) => presentRevisionSummary(row, nameAuthor)) }
}

export async function getRevision(db: Database, slug: string, number: number): Promise<Revision> {
  const gear = await requireGear(db, slug)
  const revision = await findRevision(db, gear.id, number)
  if (revision === null) throw new AppError('not-found', `"${slug}" has no revision ${number}.`)
  const history = (await readHistory(db, gear.id)).filter((value) => value.revision <= number)
  const nameAuthor = await findNames(db, [revision.authorId, ...listNamed(history)])
  return presentRevision(gear, revision, history, nameAuthor)
}

/** A piece that is in the catalogue; one that was merged or retired cannot be changed any more. */
export async function requireLivePiece(db: Database, slug: string): Promise<GearRow> {
  const row = await requireGear(db, slug)
  if (row.retiredAt !== null) throw new AppError('gone', `"${slug}" was taken out of the catalogue.`)
  if (row.mergedInto !== null) throw new AppError('conflict', `"${slug}" was merged into another piece.`)
  return row
}

export const findSlugOf = findSlug

/** Pieces by their ids, in that order. */
export const listPieces = listGearById
