import { Link } from 'react-router-dom'
import type { Verdict } from '#shared/engine/types'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'
import { ErrorState } from '../../../components/ui/error-state'
import { Skeleton } from '../../../components/ui/skeleton'
import { isAway, toApiError } from '../../../lib/problem'
import type { Answers } from '../hooks/use-answers'
import type { Finder } from '../hooks/use-finder'
import { AnswerCard } from './answer-card'

export interface AnswerListProps {
  readonly verdict: Verdict
  readonly list: Answers
  readonly finder: Finder
  readonly lit: string | null
  readonly saidAbove: readonly string[]
  readonly onPoint: (slug: string | null) => void
}

function CardSkeleton() {
  return (
    <li className="grid grid-cols-[1.75rem_minmax(0,1fr)] gap-x-3 border-b border-rule py-4 pl-3">
      <Skeleton className="size-7" />
      <div className="space-y-2">
        <Skeleton className="h-6 w-3/5" />
        <Skeleton className="h-5 w-4/5" />
        <Skeleton className="h-6 w-full" />
      </div>
    </li>
  )
}

/** A failure in place: what could be shown stays, and it asks again by itself while the server is away. */
export function AnswersFailed({ list }: { readonly list: Answers }) {
  const { title, message, requestId } = toApiError(list.error)
  return (
    <ErrorState
      title={isAway(list.error) ? 'The catalogue cannot be reached just now' : title}
      onRetry={list.retry}
      {...(requestId !== undefined && { requestId })}
    >
      {isAway(list.error)
        ? 'Your setup is kept in the address of this page. The answers come by themselves as soon as it is back.'
        : message}
    </ErrorState>
  )
}

/** Ranked answers, page by page. */
export function AnswerList({ verdict, list, finder, lit, saidAbove, onPoint }: AnswerListProps) {
  const { answers, isPending, isStale, next, isFetchingMore, fetchMore, error } = list
  const { hrefOf, state } = finder
  if (error && answers.length === 0) return <AnswersFailed list={list} />
  return (
    <>
      <ol aria-busy={isPending || isStale} className={isStale ? 'opacity-60' : undefined}>
        {isPending && (
          <>
            <CardSkeleton />
            <CardSkeleton />
          </>
        )}
        {answers.map((answer) => {
          const slug = answer.gear?.slug ?? null
          return (
            <AnswerCard
              key={slug ?? answer.summary}
              answer={answer}
              finder={finder}
              isLit={slug !== null && slug === lit}
              isPicked={slug !== null && slug === state.picked}
              saidAbove={saidAbove}
              onPoint={onPoint}
            />
          )
        })}
      </ol>
      {next !== null && (
        <p className="mt-3 print:hidden">
          {isFetchingMore ? (
            <Button isBusy>Loading more</Button>
          ) : (
            <Link
              to={hrefOf({ from: { verdict, cursor: next } })}
              className={buttonClass()}
              onClick={(event) => {
                event.preventDefault()
                fetchMore()
              }}
            >
              More
            </Link>
          )}
        </p>
      )}
    </>
  )
}
