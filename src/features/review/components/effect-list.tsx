import { useQuery } from '@tanstack/react-query'
import type { Effects } from '#shared/schemas/proposals'
import { ErrorState } from '../../../components/ui/error-state'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { VerdictBadge } from '../../../components/ui/verdict-badge'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { effectsQuery } from '../api/get-effects'

export interface EffectListProps {
  readonly id: string
  readonly version: number
}

const countAnswers = (judged: number): string => (judged === 1 ? 'One question was' : `${judged} questions were`)

function Effect({ effect: { origin, question, before, after } }: { readonly effect: Effects['items'][number] }) {
  return (
    <li className="border-t border-rule py-2">
      <p>{question}</p>
      <p className="flex flex-wrap items-center gap-x-2 text-sm">
        {before === null ? (
          <span className="text-ink-soft">not in the answers</span>
        ) : (
          <VerdictBadge verdict={before} />
        )}
        <span aria-hidden="true">→</span>
        <span className="sr-only">would become</span>
        <VerdictBadge verdict={after} />
        {origin === 'demo' && <span className="text-ink-soft">demo question</span>}
      </p>
    </li>
  )
}

/** Whose answers would change verdict if the proposal were approved. */
export function EffectList({ id, version }: EffectListProps) {
  const { api } = useApp()
  const { data, error, refetch } = useQuery(effectsQuery(api, id, version))
  return (
    <section className="mt-10" aria-labelledby="effects">
      <h2 id="effects">Whose answers would change</h2>
      {data ? (
        <>
          <p className="mt-1 max-w-prose text-ink-soft">
            {countAnswers(data.judged)} asked again with the proposed values:{' '}
            {data.items.length === 0 ? 'no verdict would change.' : `${data.items.length} would change verdict.`}
          </p>
          <ul className="mt-2">
            {data.items.map((effect) => (
              <Effect key={`${effect.origin} ${effect.question}`} effect={effect} />
            ))}
          </ul>
        </>
      ) : error ? (
        <ErrorState title={toApiError(error).title} onRetry={() => void refetch()}>
          {toApiError(error).message} The rest of this page does not need it.
        </ErrorState>
      ) : (
        <LoadingBlock label="Asking the questions again">
          <Skeleton className="mt-2 h-16 w-full" />
        </LoadingBlock>
      )}
    </section>
  )
}
