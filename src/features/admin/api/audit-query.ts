import { queryOptions } from '@tanstack/react-query'
import { auditListSchema, type AuditList } from '#shared/schemas/admin'
import type { ApiClient } from '../../../lib/api-client'
import { takeRefusal, type Refused } from '../../../lib/problem'

export const auditKeys = ['actor', 'action', 'subject', 'from', 'to'] as const

export type AuditFilters = Partial<Record<(typeof auditKeys)[number] | 'cursor', string>>

/** What the address asks for; empty fields of the form ask nothing. */
export function readAuditFilters(search: URLSearchParams): AuditFilters {
  const given = [...auditKeys, 'cursor' as const].map((key) => [key, search.get(key)?.trim() ?? ''] as const)
  return Object.fromEntries(given.filter(([, value]) => value !== ''))
}

/** A wrong day is answered on the page, beside its field. */
export const auditQuery = (api: ApiClient, filters: AuditFilters) =>
  queryOptions({
    queryKey: ['admin', 'audit', filters],
    queryFn: async ({ signal }): Promise<AuditList | Refused> => {
      try {
        return auditListSchema.parse(await api.get(`/admin/audit?${new URLSearchParams(filters).toString()}`, signal))
      } catch (error) {
        return takeRefusal(error)
      }
    },
  })
