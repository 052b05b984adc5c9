import { queryOptions } from '@tanstack/react-query'
import type { ReplacementsAnswer, ReplacementsRequest } from '#shared/schemas/replacements'
import type { ApiClient } from '../../lib/api-client'
import { takeRefusal, type Refused } from '../../lib/problem'

async function fetchReplacements(
  api: ApiClient,
  request: ReplacementsRequest,
  signal: AbortSignal,
): Promise<ReplacementsAnswer | Refused> {
  try {
    const [answer, { replacementsSchema }] = await Promise.all([
      api.post('/replacements', request, signal),
      import('#shared/schemas/replacements'),
    ])
    return replacementsSchema.parse(answer) as ReplacementsAnswer
  } catch (error) {
    return takeRefusal(error)
  }
}

/** What can take the place of a piece of a setup, the best first. */
export const replacementsQuery = (api: ApiClient, request: ReplacementsRequest) =>
  queryOptions({
    queryKey: ['replacements', request],
    queryFn: ({ signal }) => fetchReplacements(api, request, signal),
  })
