import { useSuspenseInfiniteQuery } from '@tanstack/react-query'
import { Link, useSearchParams } from 'react-router-dom'
import { getAttribute, isKindKey, kinds } from '#shared/kinds/index'
import { proposalStatuses, type ProposalItem } from '#shared/schemas/proposals'
import { Button } from '../../../components/ui/button'
import { buttonClass } from '../../../components/ui/button-class'
import { EmptyState } from '../../../components/ui/empty-state'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { printDate } from '../../../lib/print-date'
import { proposalsQuery } from '../api/proposals-query'
import { readStatus } from '../read-status'
import { statusTextClasses, statusWords } from '../status-words'

const nameOf = ({ brand, model, kind }: ProposalItem): string =>
  [brand, model].filter(Boolean).join(' ') || `a ${isKindKey(kind) ? kinds[kind].label : kind} without a name yet`

function describeChange({ kind, gear, changed }: ProposalItem): string {
  if (gear === null) return 'a new piece'
  const labels = changed.map((key) => (isKindKey(kind) && getAttribute(kind, key)?.label) || key)
  return labels.length === 0 ? 'what it is called' : labels.join(', ')
}

function StatusFilter({ chosen }: { readonly chosen: string | null }) {
  const choices = [null, ...proposalStatuses]
  return (
    <nav aria-label="Which proposals" className="mt-4">
      <ul className="flex flex-wrap gap-x-4 gap-y-1">
        {choices.map((status) => (
          <li key={status}>
            <Link
              to={status === null ? paths.proposals : `${paths.proposals}?status=${status}`}
              aria-current={status === chosen ? 'page' : undefined}
              className="inline-flex min-h-9 items-center border-b-[3px] border-transparent text-ink-soft hover:text-action aria-[current=page]:border-b-action aria-[current=page]:font-semibold aria-[current=page]:text-ink"
            >
              {status === null ? 'All' : statusWords[status]}
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  )
}

function ProposalRow({ item }: { readonly item: ProposalItem }) {
  const { id, status, words, summary, updatedAt } = item
  return (
    <li className="grid gap-x-6 gap-y-1 border-t border-rule py-3 sm:grid-cols-[10rem_minmax(0,1fr)_auto]">
      <span className={`font-semibold ${statusTextClasses[status]}`}>{statusWords[status]}</span>
      <span className="min-w-0">
        <Link to={paths.proposal(id)} className="link font-semibold">
          {nameOf(item)}
        </Link>
        <span className="block text-sm text-ink-soft">{describeChange(item)}</span>
        {summary !== null && <span className="block text-sm">{summary}</span>}
        {words !== null && (
          <span className="mt-1 block border-l-[3px] border-rule pl-3 text-sm">
            <span className="text-ink-soft">The moderator wrote:</span> {words}
          </span>
        )}
      </span>
      <span className="text-sm text-ink-soft">{printDate(updatedAt)}</span>
    </li>
  )
}

/** What somebody proposed, and what became of it. */
export function ProposalsPage() {
  const { api } = useApp()
  const [params] = useSearchParams()
  const status = readStatus(params)
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useSuspenseInfiniteQuery(proposalsQuery(api, status))
  const items = data.pages.flatMap((page) => page.items)
  return (
    <>
      <div className="flex flex-wrap items-end justify-between gap-4">
        <div>
          <h1>My proposals</h1>
          <p className="mt-1 text-ink-soft">What you proposed, where it stands, and what was said of it.</p>
        </div>
        <Link to={paths.gearNew} className={buttonClass()}>
          Add a piece of gear
        </Link>
      </div>
      <StatusFilter chosen={status} />
      <div className="mt-4">
        {items.length === 0 ? (
          <EmptyState
            title={status === null ? 'Nothing yet' : `Nothing here: ${statusWords[status].toLowerCase()}`}
            action={
              <Link to={paths.gearList} className={buttonClass({ variant: 'primary' })}>
                Find a piece to measure
              </Link>
            }
          >
            Open any piece and press “Correct this” beside a number, or add one that is missing.
          </EmptyState>
        ) : (
          <ul>
            {items.map((item) => (
              <ProposalRow key={item.id} item={item} />
            ))}
          </ul>
        )}
      </div>
      {hasNextPage && (
        <Button className="mt-4" isBusy={isFetchingNextPage} onClick={() => void fetchNextPage()}>
          Show more
        </Button>
      )}
    </>
  )
}
