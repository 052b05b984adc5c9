import { queryOptions } from '@tanstack/react-query'
import type { Report } from '#shared/engine/types'
import type { SetupRequest } from '#shared/schemas/setup'
import type { ApiClient } from '../../lib/api-client'
import { takeRefusal, type Refused } from '../../lib/problem'

async function fetchReport(api: ApiClient, setup: SetupRequest, signal: AbortSignal): Promise<Report | Refused> {
  try {
    const [answer, { reportSchema }] = await Promise.all([
      api.post('/setups/report', { setup }, signal),
      import('#shared/schemas/answer'),
    ])
    return reportSchema.parse(answer) as Report
  } catch (error) {
    return takeRefusal(error)
  }
}

/** Every check of every piece of a setup, what it needs, uses and lacks. */
export const reportQuery = (api: ApiClient, setup: SetupRequest) =>
  queryOptions({ queryKey: ['report', setup], queryFn: ({ signal }) => fetchReport(api, setup, signal) })
