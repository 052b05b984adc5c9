import { useInfiniteQuery } from '@tanstack/react-query'
import type { Answer, Verdict } from '#shared/engine/types'
import type { FitAnswer } from '#shared/schemas/answer'
import { useApp } from '../../../lib/app-context'
import { isRefused, type Refused } from '../../../lib/problem'
import type { FitPage } from '../api/fit'
import { answersQuery, canAsk } from '../api/requests'
import type { Visit } from '../link/read-visit'

export interface Answers {
  readonly answers: readonly Answer[]
  /** Counts, reasons and scales come with the first page. */
  readonly first: FitAnswer | undefined
  readonly refusal: Refused | undefined
  readonly isPending: boolean
  /** What is shown belongs to the setup before the last change. */
  readonly isStale: boolean
  readonly error: Error | null
  readonly next: string | null
  readonly isFetchingMore: boolean
  readonly fetchMore: () => void
  readonly retry: () => void
}

const isFit = (page: FitPage): page is FitAnswer => !isRefused(page)

/** The answers of one verdict. While a change is being answered the earlier ones of the same kind stay. */
export function useAnswers(visit: Visit, verdict: Verdict, isWanted = true): Answers {
  const { api } = useApp()
  const { kind } = visit.state
  const query = useInfiniteQuery({
    ...answersQuery(api, visit, verdict),
    enabled: isWanted && canAsk(visit),
    placeholderData: (earlier, earlierQuery) => {
      const request = earlierQuery?.queryKey[1]
      return request?.kind === kind && request.verdict === verdict ? earlier : undefined
    },
  })
  const pages = query.data?.pages ?? []
  const fitPages = pages.filter(isFit)
  return {
    answers: fitPages.flatMap(({ answers }) => answers),
    first: fitPages[0],
    refusal: pages.find(isRefused),
    isPending: query.isPending,
    isStale: query.isPlaceholderData,
    error: query.error,
    next: fitPages.at(-1)?.next ?? null,
    isFetchingMore: query.isFetchingNextPage,
    fetchMore: () => void query.fetchNextPage(),
    retry: () => void query.refetch(),
  }
}
