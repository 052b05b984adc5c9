import { queryOptions } from '@tanstack/react-query'
import type { DisputeList } from '#shared/schemas/review'
import type { ApiClient } from '../../../lib/api-client'

async function fetchDisputes(api: ApiClient, cursor: string | null, signal: AbortSignal): Promise<DisputeList> {
  const query = cursor === null ? '' : `?${new URLSearchParams({ cursor }).toString()}`
  const [answer, { disputeListSchema }] = await Promise.all([
    api.get(`/review/disputes${query}`, signal),
    import('#shared/schemas/review'),
  ])
  return disputeListSchema.parse(answer)
}

/** Values that went to and fro, until somebody settles them. */
export const disputesQuery = (api: ApiClient, cursor: string | null) =>
  queryOptions({
    queryKey: ['review', 'disputes', cursor],
    queryFn: ({ signal }) => fetchDisputes(api, cursor, signal),
    staleTime: 5_000,
  })
