import { auditQuery, readAuditFilters } from '../../features/admin/api/audit-query'
import { AuditPage } from '../../features/admin/components/audit-page'
import { loadFresh } from '../../lib/loading'
import type { Page } from '../page-route'

export const page: Page = {
  Component: AuditPage,
  load: async (app, { request }) => {
    await loadFresh(app, auditQuery(app.api, readAuditFilters(new URL(request.url).searchParams)))
  },
  head: () => ({ title: 'Audit trail', description: 'Who did what, and when.', isUnlisted: true }),
}
