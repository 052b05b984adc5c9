import { ProposalsPage } from '../../features/proposals/components/proposals-page'
import { proposalsQuery } from '../../features/proposals/api/proposals-query'
import { readStatus } from '../../features/proposals/read-status'
import { throwFailure } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: ProposalsPage,
  load: async ({ api, queryClient }, { request }) => {
    const status = readStatus(new URL(request.url).searchParams)
    await queryClient.fetchInfiniteQuery({ ...proposalsQuery(api, status) }).catch(throwFailure)
  },
  head: () => ({
    title: 'My proposals',
    description: 'What you proposed, where it stands, and what was said of it.',
    isUnlisted: true,
  }),
}
