import { queryOptions } from '@tanstack/react-query'
import type { ApiClient } from '../../../lib/api-client'
import { fetchProposal } from './save-proposal'

/** One's own proposal with its version. A form that begins with it fetches it anew: it changes from there. */
export const savedProposalQuery = (api: ApiClient, id: string) =>
  queryOptions({
    queryKey: ['proposals', 'saved', id],
    queryFn: ({ signal }) => fetchProposal(api, id, signal),
    staleTime: 0,
  })
