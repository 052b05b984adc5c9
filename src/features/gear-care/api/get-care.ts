import { queryOptions } from '@tanstack/react-query'
import type { GearCare } from '#shared/schemas/review'
import type { ApiClient } from '../../../lib/api-client'

export const piecePath = (slug: string): string => `/gear/${encodeURIComponent(slug)}`

async function fetchCare(api: ApiClient, slug: string, signal: AbortSignal): Promise<GearCare> {
  const [answer, { gearCareSchema }] = await Promise.all([
    api.get(`${piecePath(slug)}/care`, signal),
    import('#shared/schemas/review'),
  ])
  return gearCareSchema.parse(answer)
}

/** How a piece stands and what the reader may do with it; merged and retired ones too. */
export const careQuery = (api: ApiClient, slug: string) =>
  queryOptions({ queryKey: ['gear', slug, 'care'], queryFn: ({ signal }) => fetchCare(api, slug, signal) })
