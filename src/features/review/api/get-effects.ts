import { queryOptions } from '@tanstack/react-query'
import type { Effects } from '#shared/schemas/proposals'
import type { ApiClient } from '../../../lib/api-client'
import { proposalPath } from './get-proposal'

async function fetchEffects(api: ApiClient, id: string, signal: AbortSignal): Promise<Effects> {
  const [answer, { effectsSchema }] = await Promise.all([
    api.get(`${proposalPath(id)}/effects`, signal),
    import('#shared/schemas/proposals'),
  ])
  return effectsSchema.parse(answer)
}

/** Whose answers would change verdict. `version`: of the proposal that was judged. */
export const effectsQuery = (api: ApiClient, id: string, version: number) =>
  queryOptions({
    queryKey: ['review', 'effects', id, version],
    queryFn: ({ signal }) => fetchEffects(api, id, signal),
  })
