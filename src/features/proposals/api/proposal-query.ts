import { queryOptions } from '@tanstack/react-query'
import { proposalSchema, type Proposal } from '#shared/schemas/proposals'
import type { ApiClient, Tagged } from '../../../lib/api-client'

/** A proposal and the version to change it from. */
export interface TaggedProposal {
  readonly proposal: Proposal
  readonly etag: string
}

export function readTagged({ body, etag }: Tagged): TaggedProposal {
  const proposal = proposalSchema.parse(body)
  return { proposal, etag: etag ?? `"v${proposal.version}"` }
}

export const pathOf = (id: string): string => `/proposals/${encodeURIComponent(id)}`

export const proposalQuery = (api: ApiClient, id: string) =>
  queryOptions({
    queryKey: ['proposals', 'one', id],
    queryFn: async ({ signal }) => readTagged(await api.getTagged(pathOf(id), signal)),
    staleTime: 0,
  })
