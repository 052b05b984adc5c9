import { queryOptions } from '@tanstack/react-query'
import type { Gear } from '#shared/schemas/gear'
import type { ApiClient } from '../../../lib/api-client'

async function fetchPiece(api: ApiClient, slug: string, signal: AbortSignal): Promise<Gear> {
  const [answer, { gearSchema }] = await Promise.all([
    api.get(`/gear/${encodeURIComponent(slug)}`, signal),
    import('#shared/schemas/gear'),
  ])
  return gearSchema.parse(answer)
}

/** The piece as it is public now, with every source of its values. `revision`: the newest that was heard of. */
export const pieceQuery = (api: ApiClient, slug: string, revision: number) =>
  queryOptions({
    queryKey: ['review', 'piece', slug, revision],
    queryFn: ({ signal }) => fetchPiece(api, slug, signal),
  })
