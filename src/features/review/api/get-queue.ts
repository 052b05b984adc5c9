import { queryOptions } from '@tanstack/react-query'
import type { Queue } from '#shared/schemas/review'
import type { ApiClient } from '../../../lib/api-client'
import { recheckWhileAway } from '../../../lib/query-client'
import { writeQueueQuery, type QueueFilters } from '../model/queue-filters'

const recheckMs = 30_000

async function fetchQueue(api: ApiClient, filters: QueueFilters, signal: AbortSignal): Promise<Queue> {
  const [answer, { queueSchema }] = await Promise.all([
    api.get(`/review${writeQueueQuery(filters)}`, signal),
    import('#shared/schemas/review'),
  ])
  return queueSchema.parse(answer)
}

export const queueKey = ['review', 'queue'] as const

/** What waits to be decided. Others work on it too, so it is asked for again and again. */
export const queueQuery = (api: ApiClient, filters: QueueFilters) =>
  queryOptions({
    queryKey: [...queueKey, filters],
    queryFn: ({ signal }) => fetchQueue(api, filters, signal),
    staleTime: 5_000,
    refetchOnWindowFocus: true,
    refetchInterval: (query) => recheckWhileAway(query) || recheckMs,
  })
