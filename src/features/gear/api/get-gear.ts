import { queryOptions } from '@tanstack/react-query'
import type { Gear } from '#shared/schemas/gear'
import type { ApiClient } from '../../../lib/api-client'

async function fetchGear(api: ApiClient, slug: string, signal: AbortSignal): Promise<Gear> {
  const [answer, { gearSchema }] = await Promise.all([
    api.get(`/gear/${encodeURIComponent(slug)}`, signal),
    import('#shared/schemas/gear'),
  ])
  return gearSchema.parse(answer)
}

/** One piece with where each of its numbers is from. */
export const gearQuery = (api: ApiClient, slug: string) =>
  queryOptions({ queryKey: ['gear', slug], queryFn: ({ signal }) => fetchGear(api, slug, signal) })
