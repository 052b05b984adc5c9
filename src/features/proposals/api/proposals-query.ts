import { infiniteQueryOptions } from '@tanstack/react-query'
import { proposalListSchema, type ProposalStatus } from '#shared/schemas/proposals'
import type { ApiClient } from '../../../lib/api-client'

/** One's own proposals, the newest first; null: whatever became of them. */
export const proposalsQuery = (api: ApiClient, status: ProposalStatus | null) =>
  infiniteQueryOptions({
    queryKey: ['proposals', 'mine', status],
    queryFn: async ({ signal, pageParam }) => {
      const query = new URLSearchParams({
        ...(status && { status }),
        ...(pageParam && { cursor: pageParam }),
      }).toString()
      return proposalListSchema.parse(await api.get(query === '' ? '/proposals' : `/proposals?${query}`, signal))
    },
    initialPageParam: '',
    getNextPageParam: ({ next }) => next,
    staleTime: 0,
  })
