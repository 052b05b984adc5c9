import { infiniteQueryOptions } from '@tanstack/react-query'
import type { FitAnswer } from '#shared/schemas/answer'
import type { FitRequest } from '#shared/schemas/fit'
import type { ApiClient } from '../../../lib/api-client'
import { isRefused, takeRefusal, type Refused } from '../../../lib/problem'

export type FitPage = FitAnswer | Refused

/** The schema is fetched beside the answer, so that it does not weigh on the first page. */
async function fetchFit(api: ApiClient, request: FitRequest, signal: AbortSignal): Promise<FitPage> {
  try {
    const [answer, { fitResultSchema }] = await Promise.all([
      api.post('/fit', request, signal),
      import('#shared/schemas/answer'),
    ])
    return fitResultSchema.parse(answer) as FitAnswer
  } catch (error) {
    return takeRefusal(error)
  }
}

/** One group of answers, page by page; the first page has the scales if asked. `from`: where a link makes it start. */
export const fitPagesQuery = (api: ApiClient, request: FitRequest, from: string | null = null) =>
  infiniteQueryOptions({
    queryKey: ['fit', request, from] as const,
    queryFn: ({ signal, pageParam }) => {
      const isFirst = pageParam === from
      const place = pageParam === null ? {} : { cursor: pageParam }
      return fetchFit(api, { ...request, ...place, scales: isFirst && request.scales === true }, signal)
    },
    initialPageParam: from,
    getNextPageParam: (page) => (isRefused(page) ? null : page.next),
  })
