import { queryOptions } from '@tanstack/react-query'
import type { WaitingTimes } from '#shared/schemas/review'
import type { ApiClient } from '../../../lib/api-client'

async function fetchTimes(api: ApiClient, signal: AbortSignal): Promise<WaitingTimes> {
  const [answer, { waitingTimesSchema }] = await Promise.all([
    api.get('/review/times', signal),
    import('#shared/schemas/review'),
  ])
  return waitingTimesSchema.parse(answer)
}

/** How long proposals wait: published for everybody. */
export const waitingTimesQuery = (api: ApiClient) =>
  queryOptions({ queryKey: ['review', 'times'], queryFn: ({ signal }) => fetchTimes(api, signal) })
