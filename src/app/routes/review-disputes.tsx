import { disputesQuery } from '../../features/review/api/get-disputes'
import { DisputesPage } from '../../features/review/components/disputes-page'
import { requireData } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: DisputesPage,
  load: (app, { request }) => requireData(app, disputesQuery(app.api, new URL(request.url).searchParams.get('cursor'))),
  head: () => ({ title: 'Disputes', description: 'Values that went to and fro.', isUnlisted: true }),
}
