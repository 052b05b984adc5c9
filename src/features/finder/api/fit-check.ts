import { queryOptions } from '@tanstack/react-query'
import type { Answer } from '#shared/engine/types'
import type { FitCheckRequest } from '#shared/schemas/fit'
import type { ApiClient } from '../../../lib/api-client'
import { ApiError } from '../../../lib/problem'

/** Null where there is no such piece, or the setup cannot be judged. */
async function fetchFitCheck(api: ApiClient, request: FitCheckRequest, signal: AbortSignal): Promise<Answer | null> {
  try {
    const [answer, { answerSchema }] = await Promise.all([
      api.post('/fit/check', request, signal),
      import('#shared/schemas/answer'),
    ])
    return answerSchema.parse(answer) as Answer
  } catch (error) {
    if (error instanceof ApiError && error.status === 422) return null
    throw error
  }
}

/** One piece of the catalogue judged in a setup. */
export const fitCheckQuery = (api: ApiClient, setup: FitCheckRequest['setup'], slug: string) =>
  queryOptions({
    queryKey: ['fit', 'check', setup, slug],
    queryFn: ({ signal }) => fetchFitCheck(api, { setup, piece: { gear: slug } }, signal),
  })
