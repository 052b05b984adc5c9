import { useParams } from 'react-router-dom'
import { pieceQuery } from '../../features/review/api/get-piece'
import { effectsQuery } from '../../features/review/api/get-effects'
import { proposalQuery } from '../../features/review/api/get-proposal'
import { ProposalPage } from '../../features/review/components/proposal-page'
import { requireData } from '../../lib/loading'
import type { Page } from '../page-route'

function ReviewProposalPage() {
  const { proposalId = '' } = useParams()
  return <ProposalPage key={proposalId} id={proposalId} />
}

export const page: Page = {
  Component: ReviewProposalPage,
  load: async (app, { params }) => {
    const { api, queryClient, isServer } = app
    const id = params.proposalId ?? ''
    const { proposal } = await requireData(app, proposalQuery(api, id))
    const { gear, version } = proposal
    const rest = [
      queryClient.prefetchQuery(effectsQuery(api, id, version)),
      ...(gear === null ? [] : [queryClient.prefetchQuery(pieceQuery(api, gear.slug, gear.revision))]),
    ]
    if (isServer) await Promise.all(rest)
  },
  head: ({ app, params }) => {
    const read = app.queryClient.getQueryData(proposalQuery(app.api, params.proposalId ?? '').queryKey)
    const name = read ? `${read.proposal.brand ?? 'Unnamed'} ${read.proposal.model ?? ''}`.trim() : 'A proposal'
    return { title: `Review: ${name}`, description: 'A proposal on the review desk.', isUnlisted: true }
  },
}
