import { queryOptions } from '@tanstack/react-query'
import type { Gear } from '#shared/schemas/gear'
import type { ApiClient } from '../../lib/api-client'

async function fetchEntry(api: ApiClient, slug: string, signal: AbortSignal): Promise<Gear> {
  const [answer, { gearSchema }] = await Promise.all([
    api.get(`/gear/${encodeURIComponent(slug)}`, signal),
    import('#shared/schemas/gear'),
  ])
  return gearSchema.parse(answer)
}

/** A piece of the catalogue that a setup names, to name and draw it. */
export const gearEntryQuery = (api: ApiClient, slug: string) =>
  queryOptions({
    queryKey: ['gear', slug],
    queryFn: ({ signal }) => fetchEntry(api, slug, signal),
  })
