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

/** A piece that is compared, whichever page of the list it stands on. */
export const comparedPieceQuery = (api: ApiClient, slug: string) =>
  queryOptions({ queryKey: ['gear', slug], queryFn: ({ signal }) => fetchPiece(api, slug, signal) })
