import { queryOptions } from '@tanstack/react-query'
import type { KindKey } from '#shared/kinds/index'
import type { GearItem, GearList } from '#shared/schemas/gear'
import type { ApiClient } from '../../lib/api-client'
import type { Brand } from './find-suggestions'

const mostPieces = 5

async function fetchList(api: ApiClient, query: Record<string, string>, signal: AbortSignal): Promise<GearList> {
  const [answer, { gearListSchema }] = await Promise.all([
    api.get(`/gear?${new URLSearchParams(query).toString()}`, signal),
    import('#shared/schemas/gear'),
  ])
  return gearListSchema.parse(answer)
}

async function fetchBrands(api: ApiClient, signal: AbortSignal): Promise<readonly Brand[]> {
  const { facets } = await fetchList(api, { limit: '1' }, signal)
  const facet = facets.brand
  return facet?.type === 'options' ? facet.counts.map(({ value, count }) => ({ name: String(value), count })) : []
}

/** The brands that the catalogue has most of. */
export const brandsQuery = (api: ApiClient) =>
  queryOptions({
    queryKey: ['suggest', 'brands'],
    queryFn: ({ signal }) => fetchBrands(api, signal),
    staleTime: Infinity,
  })

async function fetchPieces(
  api: ApiClient,
  text: string,
  kind: KindKey | null,
  signal: AbortSignal,
): Promise<readonly GearItem[]> {
  const query = { ...(kind && { kind }), q: text, limit: String(mostPieces) }
  return (await fetchList(api, query, signal)).items
}

/** The pieces that a text most likely names. */
export const namedPiecesQuery = (api: ApiClient, text: string, kind: KindKey | null) =>
  queryOptions({
    queryKey: ['suggest', 'pieces', { text, kind }],
    queryFn: ({ signal }) => fetchPieces(api, text, kind, signal),
  })
