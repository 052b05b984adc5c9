import { queryOptions } from '@tanstack/react-query'
import type { Gear } from '#shared/schemas/gear'
import type { ApiClient } from '../../lib/api-client'

async function fetchTank(api: ApiClient, slug: string, signal: AbortSignal): Promise<Gear> {
  const [answer, { gearSchema }] = await Promise.all([
    api.get(`/gear/${encodeURIComponent(slug)}`, signal),
    import('#shared/schemas/gear'),
  ])
  return gearSchema.parse(answer)
}

/** The catalogue's tank that a setup names, to draw it. */
export const tankEntryQuery = (api: ApiClient, slug: string) =>
  queryOptions({
    queryKey: ['gear', slug],
    queryFn: ({ signal }) => fetchTank(api, slug, signal),
  })
