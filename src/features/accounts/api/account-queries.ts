import { queryOptions } from '@tanstack/react-query'
import type { Me, OwnSessions } from '#shared/schemas/accounts'
import type { ApiClient } from '../../../lib/api-client'

async function fetchMe(api: ApiClient, signal: AbortSignal): Promise<Me> {
  const [answer, { meSchema }] = await Promise.all([api.get('/me', signal), import('#shared/schemas/accounts')])
  return meSchema.parse(answer)
}

async function fetchSessions(api: ApiClient, signal: AbortSignal): Promise<OwnSessions> {
  const [answer, { ownSessionsSchema }] = await Promise.all([
    api.get('/me/sessions', signal),
    import('#shared/schemas/accounts'),
  ])
  return ownSessionsSchema.parse(answer)
}

export const meQuery = (api: ApiClient) =>
  queryOptions({ queryKey: ['me'], queryFn: ({ signal }) => fetchMe(api, signal) })

export const ownSessionsQuery = (api: ApiClient) =>
  queryOptions({ queryKey: ['me', 'sessions'], queryFn: ({ signal }) => fetchSessions(api, signal) })
