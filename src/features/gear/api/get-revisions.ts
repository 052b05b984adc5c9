import { queryOptions } from '@tanstack/react-query'
import type { RevisionList } from '#shared/schemas/gear'
import type { ApiClient } from '../../../lib/api-client'

async function fetchRevisions(api: ApiClient, slug: string, signal: AbortSignal): Promise<RevisionList> {
  const [answer, { revisionListSchema }] = await Promise.all([
    api.get(`/gear/${encodeURIComponent(slug)}/revisions`, signal),
    import('#shared/schemas/gear'),
  ])
  return revisionListSchema.parse(answer)
}

/** Every approved state of a piece, newest first. */
export const revisionsQuery = (api: ApiClient, slug: string) =>
  queryOptions({ queryKey: ['gear', slug, 'revisions'], queryFn: ({ signal }) => fetchRevisions(api, slug, signal) })
