import { queryOptions } from '@tanstack/react-query'
import type { Revision } from '#shared/schemas/gear'
import type { ApiClient } from '../../../lib/api-client'

async function fetchRevision(api: ApiClient, slug: string, number: number, signal: AbortSignal): Promise<Revision> {
  const [answer, { revisionSchema }] = await Promise.all([
    api.get(`/gear/${encodeURIComponent(slug)}/revisions/${number}`, signal),
    import('#shared/schemas/gear'),
  ])
  return revisionSchema.parse(answer)
}

/** One approved state with all its values. It never changes. */
export const revisionQuery = (api: ApiClient, slug: string, number: number) =>
  queryOptions({
    queryKey: ['gear', slug, 'revisions', number],
    queryFn: ({ signal }) => fetchRevision(api, slug, number, signal),
    staleTime: Infinity,
  })
