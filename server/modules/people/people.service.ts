import type { Person } from '#shared/schemas/people'
import type { Database } from '../../db/database'
import type { Actor } from '../../lib/actor'
import { AppError } from '../../lib/errors'
import { presentPerson } from './people.presenter'
import { countAcceptedOf, countRevisionsOf, getPersonByName, listMeasurementsOf, listNames } from './people.queries'

/** Stands for somebody whose account is gone: what they contributed stays. */
export const formerMember = 'a former member'

/** What an imported author or a person is called. */
export type NameAuthor = (authored: { readonly author?: string | null; readonly authorId?: number | null }) => string

/** Names of people by their ids, as they are called today. */
export async function findNames(db: Database, ids: Iterable<number | null | undefined>): Promise<NameAuthor> {
  const wanted = [...new Set(ids)].filter((id) => typeof id === 'number')
  const rows = await listNames(db, wanted)
  const names = new Map(rows.map(({ id, name }) => [id, name]))
  return ({ author, authorId }) => author ?? (typeof authorId === 'number' ? names.get(authorId) : null) ?? formerMember
}

/** How many revisions by this person were accepted: a person's standing. */
export const countAccepted = countRevisionsOf

const recentMeasurements = 10

/** What everybody may see of somebody. */
export async function getPerson(db: Database, name: string, actor: Actor | null): Promise<Person> {
  const row = await getPersonByName(db, name)
  if (row === null) throw new AppError('not-found', `Nobody is called ${name.slice(0, 80)}.`)
  const accepted = await countAcceptedOf(db, row.id)
  return presentPerson(row, accepted, await listMeasurementsOf(db, row.id, recentMeasurements), actor)
}

/** The id of somebody by name, as far as they are still here. */
export async function findPersonId(db: Database, name: string): Promise<number | null> {
  return (await getPersonByName(db, name))?.id ?? null
}
