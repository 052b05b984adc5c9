import { reportsQuery } from '../../features/review/api/get-reports'
import { ReportsPage } from '../../features/review/components/reports-page'
import { requireData } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: ReportsPage,
  load: (app, { request }) => requireData(app, reportsQuery(app.api, new URL(request.url).searchParams.get('cursor'))),
  head: () => ({ title: 'Error reports', description: 'What readers say is wrong.', isUnlisted: true }),
}
