import { infiniteQueryOptions } from '@tanstack/react-query'
import type { FitAnswer } from '#shared/schemas/answer'
import type { FitRequest } from '#shared/schemas/fit'
import type { ApiClient } from '../../../lib/api-client'
import { ApiError } from '../../../lib/problem'

/** The setup contradicts itself: as much an answer as any other, with every part of it named. */
export interface Refusal {
  readonly refused: readonly { readonly pointer: string; readonly detail: string }[]
}

export type FitPage = FitAnswer | Refusal

export const isRefusal = (page: FitPage): page is Refusal => 'refused' in page

/** The schema is fetched beside the answer, so that it does not weigh on the first page. */
async function fetchFit(api: ApiClient, request: FitRequest, signal: AbortSignal): Promise<FitPage> {
  try {
    const [answer, { fitResultSchema }] = await Promise.all([
      api.post('/fit', request, signal),
      import('#shared/schemas/answer'),
    ])
    return fitResultSchema.parse(answer) as FitAnswer
  } catch (error) {
    if (error instanceof ApiError && error.status === 422) return { refused: error.errors }
    throw error
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
    getNextPageParam: (page) => (isRefusal(page) ? null : page.next),
  })
