import { useQuery } from '@tanstack/react-query'
import { Link, useLocation } from 'react-router-dom'
import type { Queue } from '#shared/schemas/review'
import { buttonClass } from '../../../components/ui/button-class'
import { EmptyState } from '../../../components/ui/empty-state'
import { ErrorState } from '../../../components/ui/error-state'
import { LiveStatus } from '../../../components/ui/live-status'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { queueQuery } from '../api/get-queue'
import { waitingTimesQuery } from '../api/get-waiting-times'
import { useKeysChoice } from '../hooks/use-keys-choice'
import { useQueueKeys } from '../hooks/use-queue-keys'
import { useShortcuts } from '../hooks/use-shortcuts'
import { isNarrowed, readQueueFilters, writeQueueQuery, type QueueFilters } from '../model/queue-filters'
import { DeskTabs } from './desk-tabs'
import { KeyLegend } from './key-legend'
import { QueueForm } from './queue-form'
import { QueueSkeleton } from './queue-skeleton'
import { QueueTable } from './queue-table'
import { WaitingTimesLine } from './waiting-times-line'

const shownKeys = [
  { key: 'j', label: 'next' },
  { key: 'k', label: 'previous' },
  { key: 'Enter', label: 'open' },
]

const sayCount = ({ total }: Queue): string => `${total} ${total === 1 ? 'proposal waits' : 'proposals wait'}.`

function NothingWaits({ filters }: { readonly filters: QueueFilters }) {
  if (isNarrowed(filters) || filters.cursor !== null)
    return (
      <EmptyState
        title="Nothing waits that is like this"
        action={
          <Link to={paths.review} className={buttonClass()}>
            Show everything that waits
          </Link>
        }
      >
        What you are looking for may have been decided meanwhile.
      </EmptyState>
    )
  return (
    <EmptyState title="Nothing waits">
      Every proposal is decided. New ones appear here by themselves while this page is open.
    </EmptyState>
  )
}

function Pages({ filters, next }: { readonly filters: QueueFilters; readonly next: string | null }) {
  const to = (cursor: string | null) => `${paths.review}${writeQueueQuery({ ...filters, cursor })}`
  return (
    <p className="mt-4 flex flex-wrap gap-3 print:hidden">
      {filters.cursor !== null && (
        <Link to={to(null)} className={buttonClass()}>
          First page
        </Link>
      )}
      {next !== null && (
        <Link to={to(next)} className={buttonClass()}>
          Next page
        </Link>
      )}
    </p>
  )
}

/** What waits to be decided, walked through by pointer or keyboard. */
export function QueuePage() {
  const { api } = useApp()
  const { search } = useLocation()
  const filters = readQueueFilters(new URLSearchParams(search))
  const { data, error, dataUpdatedAt, refetch } = useQuery(queueQuery(api, filters))
  const times = useQuery(waitingTimesQuery(api))
  const { list, shortcuts } = useQueueKeys()
  const [isOn] = useKeysChoice()
  useShortcuts(shortcuts, isOn)
  return (
    <>
      <h1>Review desk</h1>
      <DeskTabs />
      {times.data && <WaitingTimesLine times={times.data} now={times.dataUpdatedAt} />}
      <QueueForm filters={filters} kinds={data?.kinds ?? []} />
      <div className="mt-5 flex flex-wrap items-center justify-between gap-x-6">
        <p>{data ? sayCount(data) : 'Looking for what waits.'}</p>
        <KeyLegend shortcuts={shownKeys} />
      </div>
      <LiveStatus message={data ? sayCount(data) : ''} />
      <div ref={list}>
        {data ? (
          data.items.length > 0 ? (
            <QueueTable items={data.items} now={dataUpdatedAt} search={search} />
          ) : (
            <NothingWaits filters={filters} />
          )
        ) : error ? (
          <ErrorState title={toApiError(error).title} onRetry={() => void refetch()}>
            {toApiError(error).message}
          </ErrorState>
        ) : (
          <QueueSkeleton />
        )}
      </div>
      {data && <Pages filters={filters} next={data.next} />}
    </>
  )
}
