import type { Gear, Revision, RevisionList } from '#shared/schemas/gear'
import type { Database } from '../../db/database'
import { AppError } from '../../lib/errors'
import { presentGear, presentRevision, presentRevisionSummary } from './gear.presenter'
import { findGear, findRevision, listRevisions, listValues, type GearRow } from './gear.queries'

async function requireGear(db: Database, slug: string): Promise<GearRow> {
  const row = await findGear(db, slug)
  if (row === null) throw new AppError('not-found', `There is no piece of gear called "${slug}".`)
  return row
}

export async function getGear(db: Database, slug: string): Promise<Gear> {
  return presentGear(await requireGear(db, slug))
}

export async function getRevisions(db: Database, slug: string): Promise<RevisionList> {
  const gear = await requireGear(db, slug)
  const rows = await listRevisions(db, gear.id)
  return { slug: gear.slug, items: rows.map(presentRevisionSummary) }
}

export async function getRevision(db: Database, slug: string, number: number): Promise<Revision> {
  const gear = await requireGear(db, slug)
  const revision = await findRevision(db, gear.id, number)
  if (revision === null) throw new AppError('not-found', `"${slug}" has no revision ${number}.`)
  return presentRevision(gear, revision, await listValues(db, gear.id, number))
}
