import { useQuery } from '@tanstack/react-query'
import { Link, useSearchParams } from 'react-router-dom'
import { letterStatuses, type LetterList } from '#shared/schemas/admin'
import { AdminTabs } from '../../../components/admin/admin-tabs'
import { buttonClass } from '../../../components/ui/button-class'
import { EmptyState } from '../../../components/ui/empty-state'
import { ErrorState } from '../../../components/ui/error-state'
import { LiveStatus } from '../../../components/ui/live-status'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { lettersQuery, readLetterFilters, type LetterFilters, type LetterStatus } from '../api/letters-query'
import { printMoment } from '../print-moment'
import { LetterRow } from './letter-row'

const labels: Readonly<Record<LetterStatus, string>> = { waiting: 'Waiting', sent: 'Sent', dead: 'Given up' }

const empty: Readonly<Record<LetterStatus, string>> = {
  waiting: 'No letter waits: all mail has gone out.',
  sent: 'No letter was sent in the last 30 days.',
  dead: 'No letter was given up.',
}

const hrefOf = (filters: LetterFilters) => `${paths.adminLetters}?${new URLSearchParams({ ...filters }).toString()}`

function Letters({ list, filters }: { readonly list: LetterList; readonly filters: LetterFilters }) {
  const { items, next, counts, oldestWaiting } = list
  return (
    <>
      <LiveStatus message={`${counts.waiting} waiting, ${counts.sent} sent, ${counts.dead} given up`} />
      <ul className="flex flex-wrap gap-3" aria-label="Letters by what became of them">
        {letterStatuses.map((status) => (
          <li key={status}>
            <Link
              to={hrefOf({ status })}
              aria-current={status === filters.status ? 'page' : undefined}
              className={buttonClass({ variant: status === filters.status ? 'primary' : 'plain', size: 'sm' })}
            >
              {labels[status]}: {counts[status]}
            </Link>
          </li>
        ))}
      </ul>
      {oldestWaiting !== null && (
        <p className="text-sm text-ink-soft">The oldest waits since {printMoment(oldestWaiting)}.</p>
      )}
      {items.length === 0 ? (
        <EmptyState title={empty[filters.status]} />
      ) : (
        <ul className="border-b border-rule">
          {items.map((letter) => (
            <LetterRow key={letter.id} letter={letter} />
          ))}
        </ul>
      )}
      {next !== null && (
        <Link to={hrefOf({ ...filters, cursor: next })} className={buttonClass()}>
          Show older letters
        </Link>
      )}
    </>
  )
}

/** What became of the mail; a letter's words are shown to nobody, since they may sign somebody in. */
export function LettersPage() {
  const { api } = useApp()
  const [search] = useSearchParams()
  const filters = readLetterFilters(search)
  const { data, error, refetch } = useQuery(lettersQuery(api, filters))
  return (
    <div className="space-y-6">
      <h1>Letters</h1>
      <AdminTabs />
      {error !== null ? (
        <ErrorState title={toApiError(error).title} onRetry={() => void refetch()}>
          {toApiError(error).message}
        </ErrorState>
      ) : data === undefined ? (
        <LoadingBlock label="Loading letters">
          <Skeleton className="h-64 w-full" />
        </LoadingBlock>
      ) : (
        <Letters list={data} filters={filters} />
      )}
    </div>
  )
}
