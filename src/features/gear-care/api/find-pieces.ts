import { queryOptions } from '@tanstack/react-query'
import type { Gear, GearList } from '#shared/schemas/gear'
import type { ApiClient } from '../../../lib/api-client'
import { piecePath } from './get-care'

async function fetchFound(api: ApiClient, kind: string, text: string, signal: AbortSignal): Promise<GearList> {
  const [answer, { gearListSchema }] = await Promise.all([
    api.get(`/gear?${new URLSearchParams({ kind, q: text, limit: '8' }).toString()}`, signal),
    import('#shared/schemas/gear'),
  ])
  return gearListSchema.parse(answer)
}

/** Pieces of a kind by their names. */
export const foundPiecesQuery = (api: ApiClient, kind: string, text: string) =>
  queryOptions({
    queryKey: ['gear', 'by-name', kind, text],
    queryFn: ({ signal }) => fetchFound(api, kind, text, signal),
    enabled: text !== '',
  })

async function fetchPiece(api: ApiClient, slug: string, signal: AbortSignal): Promise<Gear> {
  const [answer, { gearSchema }] = await Promise.all([api.get(piecePath(slug), signal), import('#shared/schemas/gear')])
  return gearSchema.parse(answer)
}

export const careGearQuery = (api: ApiClient, slug: string) =>
  queryOptions({ queryKey: ['gear', slug, 'whole'], queryFn: ({ signal }) => fetchPiece(api, slug, signal) })
