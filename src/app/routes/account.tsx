import { meQuery, ownSessionsQuery } from '../../features/accounts/api/account-queries'
import { AccountPage } from '../../features/accounts/components/account-page'
import { requireFresh } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: AccountPage,
  load: (app) =>
    Promise.all([
      requireFresh(app, meQuery(app.api)),
      app.queryClient.prefetchQuery({ ...ownSessionsQuery(app.api), staleTime: 0 }),
    ]),
  head: () => ({ title: 'Your account', description: 'Name, password, address and sessions.', isUnlisted: true }),
}
