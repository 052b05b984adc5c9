import { queryOptions } from '@tanstack/react-query'
import type { ErrorReportList } from '#shared/schemas/review'
import type { ApiClient } from '../../../lib/api-client'

async function fetchReports(api: ApiClient, cursor: string | null, signal: AbortSignal): Promise<ErrorReportList> {
  const query = cursor === null ? '' : `?${new URLSearchParams({ cursor }).toString()}`
  const [answer, { errorReportListSchema }] = await Promise.all([
    api.get(`/review/reports${query}`, signal),
    import('#shared/schemas/review'),
  ])
  return errorReportListSchema.parse(answer)
}

/** "Something wrong here?", as readers told it. */
export const reportsQuery = (api: ApiClient, cursor: string | null) =>
  queryOptions({
    queryKey: ['review', 'reports', cursor],
    queryFn: ({ signal }) => fetchReports(api, cursor, signal),
    staleTime: 5_000,
  })
