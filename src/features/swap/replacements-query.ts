import { queryOptions } from '@tanstack/react-query'
import type { ReplacementsAnswer, ReplacementsRequest } from '#shared/schemas/replacements'
import type { ApiClient } from '../../lib/api-client'
import { ApiError } from '../../lib/problem'

/** There is no such piece in the setup, or the setup cannot be judged. */
export interface Unanswered {
  readonly refused: ApiError['errors']
}

export const isUnanswered = (answer: object): answer is Unanswered => 'refused' in answer

async function fetchReplacements(
  api: ApiClient,
  request: ReplacementsRequest,
  signal: AbortSignal,
): Promise<ReplacementsAnswer | Unanswered> {
  try {
    const [answer, { replacementsSchema }] = await Promise.all([
      api.post('/replacements', request, signal),
      import('#shared/schemas/replacements'),
    ])
    return replacementsSchema.parse(answer) as ReplacementsAnswer
  } catch (error) {
    if (error instanceof ApiError && error.status === 422) return { refused: error.errors }
    throw error
  }
}

/** What can take the place of a piece of a setup, the best first. */
export const replacementsQuery = (api: ApiClient, request: ReplacementsRequest) =>
  queryOptions({
    queryKey: ['replacements', request],
    queryFn: ({ signal }) => fetchReplacements(api, request, signal),
  })
