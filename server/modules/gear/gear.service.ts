import type { Gear, Revision, RevisionList } from '#shared/schemas/gear'
import type { Database } from '../../db/database'
import { AppError } from '../../lib/errors'
import { findNames } from '../people/people.service'
import { presentGear, presentRevision, presentRevisionSummary } from './gear.presenter'
import { findGear, findRevision, listRevisions, listValues, type GearRow } from './gear.queries'

async function requireGear(db: Database, slug: string): Promise<GearRow> {
  const row = await findGear(db, slug)
  if (row === null) throw new AppError('not-found', `There is no piece of gear called "${slug}".`)
  return row
}

export async function getGear(db: Database, slug: string): Promise<Gear> {
  const row = await requireGear(db, slug)
  const authors = Object.values(row.provenance).map(({ authorId }) => authorId)
  return presentGear(row, await findNames(db, authors))
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
  const values = await listValues(db, gear.id, number)
  const nameAuthor = await findNames(
    db,
    [revision, ...values].map(({ authorId }) => authorId),
  )
  return presentRevision(gear, revision, values, nameAuthor)
}

/** A piece that is in the catalogue; one that was merged or retired cannot be changed any more. */
export async function requireLivePiece(db: Database, slug: string): Promise<GearRow> {
  const row = await requireGear(db, slug)
  if (row.retiredAt !== null) throw new AppError('gone', `"${slug}" was taken out of the catalogue.`)
  if (row.mergedInto !== null) throw new AppError('conflict', `"${slug}" was merged into another piece.`)
  return row
}
