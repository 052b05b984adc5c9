import { useParams } from 'react-router-dom'
import { proposalQuery } from '../../features/proposals/api/proposal-query'
import { ProposalPage } from '../../features/proposals/components/proposal-page'
import { requireFresh } from '../../lib/loading'
import type { Page } from '../page-route'

function ProposalRoute() {
  const { id = '' } = useParams()
  return <ProposalPage key={id} id={id} />
}

export const page: Page = {
  Component: ProposalRoute,
  load: (app, { params }) => requireFresh(app, proposalQuery(app.api, params.id ?? '')).then(() => null),
  head: () => ({
    title: 'A proposal',
    description: 'What was proposed, where it stands, and what was said of it.',
    isUnlisted: true,
  }),
}
