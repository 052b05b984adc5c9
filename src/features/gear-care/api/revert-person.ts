import { queryOptions, useMutation } from '@tanstack/react-query'
import type { LongJob } from '#shared/schemas/review'
import type { ApiClient } from '../../../lib/api-client'
import { useApp } from '../../../lib/app-context'
import { createKey } from '../../../lib/create-key'
import { recheckWhileAway } from '../../../lib/query-client'

const recheckMs = 1_000

async function readJob(answer: unknown): Promise<LongJob> {
  const { longJobSchema } = await import('#shared/schemas/review')
  return longJobSchema.parse(answer)
}

export const isOver = ({ status }: LongJob): boolean => status === 'done' || status === 'failed'

/** Long work as far as it has come; asked again until it is over. */
export const jobQuery = (api: ApiClient, id: string) =>
  queryOptions({
    queryKey: ['jobs', id],
    queryFn: async ({ signal }) => readJob(await api.get(`/admin/jobs/${encodeURIComponent(id)}`, signal)),
    staleTime: 0,
    refetchInterval: (query) =>
      recheckWhileAway(query) || (query.state.data && isOver(query.state.data) ? false : recheckMs),
  })

/** Begins to take back everything that one person changed. The same press sent twice begins it once. */
export function useRevert(name: string) {
  const { api } = useApp()
  return useMutation({
    mutationFn: async (words: string) => {
      const path = `/admin/people/${encodeURIComponent(name)}/revert`
      return readJob((await api.send('POST', path, { words }, { idempotencyKey: createKey() })).body)
    },
  })
}
