import { mailroomQuery } from '../../features/admin/api/mailroom-query'
import { MailroomPage } from '../../features/admin/components/mailroom-page'
import { loadFresh } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: MailroomPage,
  load: (app) => loadFresh(app, mailroomQuery(app.api)),
  head: () => ({ title: 'Mailroom', description: 'Letters that this demo would have sent.', isUnlisted: true }),
}
