import { proposalSchema, type Proposal, type ProposalPatch, type ProposalRequest } from '#shared/schemas/proposals'
import type { ApiClient, Tagged } from '../../../lib/api-client'

/** A proposal and the version to change it from. */
export interface SavedProposal {
  readonly proposal: Proposal
  readonly etag: string
}

function readSaved({ body, etag }: Tagged): SavedProposal {
  const proposal = proposalSchema.parse(body)
  return { proposal, etag: etag ?? `"v${proposal.version}"` }
}

const pathOf = (id: string): string => `/proposals/${encodeURIComponent(id)}`

export async function createProposal(api: ApiClient, request: ProposalRequest, key: string): Promise<SavedProposal> {
  return readSaved(await api.send('POST', '/proposals', request, { idempotencyKey: key }))
}

export async function amendProposal(
  api: ApiClient,
  { proposal, etag }: SavedProposal,
  patch: ProposalPatch,
): Promise<SavedProposal> {
  return readSaved(await api.send('PATCH', pathOf(proposal.id), patch, { ifMatch: etag }))
}

export async function submitProposal(api: ApiClient, { proposal, etag }: SavedProposal): Promise<SavedProposal> {
  return readSaved(await api.send('POST', `${pathOf(proposal.id)}/submit`, {}, { ifMatch: etag }))
}

export async function fetchProposal(api: ApiClient, id: string, signal?: AbortSignal): Promise<SavedProposal> {
  return readSaved(await api.getTagged(pathOf(id), signal))
}
