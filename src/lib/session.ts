import { queryOptions, useQuery } from '@tanstack/react-query'
import type { SessionAnswer, SignedIn } from '#shared/schemas/accounts'
import type { ApiClient } from './api-client'
import { useApp } from './app-context'

async function fetchSession(api: ApiClient, signal: AbortSignal): Promise<SessionAnswer> {
  const [answer, { sessionSchema }] = await Promise.all([
    api.get('/session', signal),
    import('#shared/schemas/accounts'),
  ])
  return sessionSchema.parse(answer)
}

/** Who is signed in. Public pages ask in the browser alone, or they could not be shared by caches. */
export const sessionQuery = (api: ApiClient) =>
  queryOptions({
    queryKey: ['session'],
    queryFn: ({ signal }) => fetchSession(api, signal),
  })

/** Who looks at the page: null is a visitor, undefined not known yet. */
export function useSignedIn(): SignedIn | null | undefined {
  const { api } = useApp()
  return useQuery(sessionQuery(api)).data?.person
}
