import { queryOptions } from '@tanstack/react-query'
import type { Proposal } from '#shared/schemas/proposals'
import type { ApiClient } from '../../../lib/api-client'

export interface ReadProposal {
  readonly proposal: Proposal
  /** Names the version that was read: a decision is about that one and no other. */
  readonly etag: string
}

export const proposalPath = (id: string): string => `/proposals/${encodeURIComponent(id)}`

async function fetchProposal(api: ApiClient, id: string, signal: AbortSignal): Promise<ReadProposal> {
  const [{ body, etag }, { proposalSchema }] = await Promise.all([
    api.getTagged(proposalPath(id), signal),
    import('#shared/schemas/proposals'),
  ])
  return { proposal: proposalSchema.parse(body), etag: etag ?? '' }
}

/** A proposal stays as it was read while somebody thinks about it: only what they do asks again. */
export const proposalQuery = (api: ApiClient, id: string) =>
  queryOptions({
    queryKey: ['review', 'proposal', id],
    queryFn: ({ signal }) => fetchProposal(api, id, signal),
    staleTime: 5_000,
  })
