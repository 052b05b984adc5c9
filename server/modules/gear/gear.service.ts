import { z } from 'zod'
import type { Gear, GearList, Revision, RevisionList } from '#shared/schemas/gear'
import type { GearQuery } from '#shared/schemas/gear-requests'
import type { Database } from '../../db/database'
import { createCursor, readCursor } from '../../lib/cursor'
import { AppError } from '../../lib/errors'
import { presentGear, presentGearItem, presentRevision, presentRevisionSummary } from './gear.presenter'
import { countGear, findGear, findRevision, listGear, listRevisions, listValues } from './gear.queries'
import type { GearPlace, GearRow } from './gear.queries'

const idSchema = z.int().min(1).max(2_147_483_647)

const placeSchema = z.discriminatedUnion('sort', [
  z.strictObject({ sort: z.literal('name'), brand: z.string(), model: z.string(), id: idSchema }),
  z.strictObject({ sort: z.literal('-updated'), updatedAt: z.iso.datetime(), id: idSchema }),
])

function toPlace(sort: GearPlace['sort'], row: GearRow): GearPlace {
  if (sort === 'name') return { sort, brand: row.brand, model: row.model, id: row.id }
  return { sort, updatedAt: row.updatedAt.toISOString(), id: row.id }
}

export async function searchGear(db: Database, query: GearQuery): Promise<GearList> {
  const { kind, q, sort, limit, cursor } = query
  const filter = { ...(kind !== undefined && { kind }), words: q === undefined ? [] : q.split(/\s+/) }
  const question = JSON.stringify(['gear', filter, sort])
  const after = cursor === undefined ? null : readCursor(cursor, question, placeSchema)
  const [rows, total] = await Promise.all([listGear(db, filter, sort, after, limit + 1), countGear(db, filter)])
  const items = rows.slice(0, limit)
  const last = items.at(-1)
  const hasMore = rows.length > limit && last !== undefined
  return {
    items: items.map(presentGearItem),
    total,
    next: hasMore ? createCursor(toPlace(sort, last), question) : null,
  }
}

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
