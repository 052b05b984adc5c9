import { waitingTimesQuery } from '../../features/review/api/get-waiting-times'
import { queueQuery } from '../../features/review/api/get-queue'
import { QueuePage } from '../../features/review/components/queue-page'
import { readQueueFilters } from '../../features/review/model/queue-filters'
import { requireData } from '../../lib/loading'
import { requirePerson } from '../../lib/require-person'
import type { Page } from '../page-route'

export const page: Page = {
  Component: QueuePage,
  load: async (app, { request }) => {
    const { api, queryClient, isServer } = app
    const queue = queueQuery(api, readQueueFilters(new URL(request.url).searchParams))
    await requirePerson(app, 'review', 'Only moderators work at the review desk.')
    const times = queryClient.prefetchQuery(waitingTimesQuery(api))
    if (isServer) await Promise.all([requireData(app, queue), times])
    else void queryClient.prefetchQuery(queue)
  },
  head: () => ({ title: 'Review desk', description: 'Proposals that wait to be decided.', isUnlisted: true }),
}
