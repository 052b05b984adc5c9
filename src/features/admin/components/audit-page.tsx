import { useQuery } from '@tanstack/react-query'
import { Link, useSearchParams } from 'react-router-dom'
import type { AuditList } from '#shared/schemas/admin'
import { AdminTabs } from '../../../components/admin/admin-tabs'
import { buttonClass } from '../../../components/ui/button-class'
import { EmptyState } from '../../../components/ui/empty-state'
import { ErrorState } from '../../../components/ui/error-state'
import { ErrorSummary } from '../../../components/ui/error-summary'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { isRefused, toApiError } from '../../../lib/problem'
import { auditQuery, readAuditFilters, type AuditFilters } from '../api/audit-query'
import { AuditEvent } from './audit-event'
import { AuditFilterForm } from './audit-filters'

function AuditResults({ list, filters }: { readonly list: AuditList; readonly filters: AuditFilters }) {
  if (list.items.length === 0) {
    return Object.keys(filters).length === 0 ? (
      <EmptyState title="Nothing has happened yet">Whatever anybody changes is written here.</EmptyState>
    ) : (
      <EmptyState title="Nothing in the trail matches">Take a filter away, or widen the days.</EmptyState>
    )
  }
  return (
    <>
      <ol className="border-b border-rule">
        {list.items.map((event) => (
          <AuditEvent key={event.id} event={event} />
        ))}
      </ol>
      {list.next !== null && (
        <Link
          to={`${paths.adminAudit}?${new URLSearchParams({ ...filters, cursor: list.next }).toString()}`}
          className={`mt-4 ${buttonClass()}`}
        >
          Show older events
        </Link>
      )}
    </>
  )
}

export function AuditPage() {
  const { api } = useApp()
  const [search] = useSearchParams()
  const filters = readAuditFilters(search)
  const { data, error, refetch } = useQuery(auditQuery(api, filters))
  const refused = data !== undefined && isRefused(data) ? data.refused : []
  const errors = Object.fromEntries(refused.map(({ pointer, detail }) => [pointer.replace('#/', ''), detail]))
  return (
    <div className="space-y-6">
      <h1>Audit trail</h1>
      <AdminTabs />
      <ErrorSummary
        errors={Object.entries(errors).map(([key, message]) => ({
          fieldId: `audit-${key}`,
          message: `${key} ${message}`,
        }))}
      />
      {/* A field shows what the address says, also after a press on "back". */}
      <AuditFilterForm key={search.toString()} filters={filters} errors={errors} />
      <section aria-label="Events">
        {error !== null ? (
          <ErrorState title={toApiError(error).title} onRetry={() => void refetch()}>
            {toApiError(error).message}
          </ErrorState>
        ) : data === undefined ? (
          <LoadingBlock label="Loading the trail">
            <Skeleton className="h-64 w-full" />
          </LoadingBlock>
        ) : (
          !isRefused(data) && <AuditResults list={data} filters={filters} />
        )}
      </section>
    </div>
  )
}
