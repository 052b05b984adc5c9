import { proposalStatuses, type ProposalStatus } from '#shared/schemas/proposals'

/** The status that a list is narrowed to; null: all of them. */
export const readStatus = (params: URLSearchParams): ProposalStatus | null =>
  proposalStatuses.find((status) => status === params.get('status')) ?? null
