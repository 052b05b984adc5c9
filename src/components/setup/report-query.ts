import { queryOptions } from '@tanstack/react-query'
import type { Report } from '#shared/engine/types'
import type { SetupRequest } from '#shared/schemas/setup'
import type { ApiClient } from '../../lib/api-client'
import { ApiError } from '../../lib/problem'

/** The setup contradicts itself or names what is not there: as much an answer as any other, every part of it named. */
export interface Refused {
  readonly refused: ApiError['errors']
}

export const isRefused = (answer: object): answer is Refused => 'refused' in answer

async function fetchReport(api: ApiClient, setup: SetupRequest, signal: AbortSignal): Promise<Report | Refused> {
  try {
    const [answer, { reportSchema }] = await Promise.all([
      api.post('/setups/report', { setup }, signal),
      import('#shared/schemas/answer'),
    ])
    return reportSchema.parse(answer) as Report
  } catch (error) {
    if (error instanceof ApiError && error.status === 422) return { refused: error.errors }
    throw error
  }
}

/** Every check of every piece of a setup, what it needs, uses and lacks. */
export const reportQuery = (api: ApiClient, setup: SetupRequest) =>
  queryOptions({ queryKey: ['report', setup], queryFn: ({ signal }) => fetchReport(api, setup, signal) })
