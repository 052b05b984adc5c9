import { queryOptions } from '@tanstack/react-query'
import type { AdminPeople, Person } from '#shared/schemas/people'
import type { ApiClient } from '../../../lib/api-client'

async function fetchPerson(api: ApiClient, name: string, signal: AbortSignal): Promise<Person> {
  const [answer, { personSchema }] = await Promise.all([
    api.get(`/people/${encodeURIComponent(name)}`, signal),
    import('#shared/schemas/people'),
  ])
  return personSchema.parse(answer)
}

async function fetchPeople(api: ApiClient, search: string, signal: AbortSignal): Promise<AdminPeople> {
  const [answer, { adminPeopleSchema }] = await Promise.all([
    api.get(`/admin/people${search === '' ? '' : `?${search}`}`, signal),
    import('#shared/schemas/people'),
  ])
  return adminPeopleSchema.parse(answer)
}

export const personQuery = (api: ApiClient, name: string) =>
  queryOptions({ queryKey: ['person', name], queryFn: ({ signal }) => fetchPerson(api, name, signal) })

/** `search` is the query of the page and of the API alike. */
export const peopleQuery = (api: ApiClient, search: string) =>
  queryOptions({ queryKey: ['admin', 'people', search], queryFn: ({ signal }) => fetchPeople(api, search, signal) })
