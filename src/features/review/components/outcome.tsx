import { useEffect, useRef } from 'react'
import { useQuery } from '@tanstack/react-query'
import { Link } from 'react-router-dom'
import type { Proposal } from '#shared/schemas/proposals'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import { useApp } from '../../../lib/app-context'
import { queueQuery } from '../api/get-queue'
import type { Course } from '../model/decision-draft'
import { readQueueFilters, writeQueueQuery } from '../model/queue-filters'

export interface OutcomeProps {
  readonly proposal: Pick<Proposal, 'id' | 'gear' | 'revision'>
  readonly course: Course
  /** Filters of the queue that the proposal was found with. */
  readonly search: string
}

const outcomeWords: Readonly<Record<Course, string>> = {
  approve: 'Approved',
  'send-back': 'Sent back',
  decline: 'Declined',
}

/** What came of the decision, and the next thing to do. Takes focus. */
export function Outcome({ proposal: { id, gear, revision }, course, search }: OutcomeProps) {
  const { api } = useApp()
  const box = useRef<HTMLDivElement>(null)
  const filters = { ...readQueueFilters(new URLSearchParams(search)), cursor: null }
  const { data } = useQuery(queueQuery(api, filters))
  const query = writeQueueQuery(filters)
  const next = data?.items.find((item) => item.id !== id && !item.isMine && (item.lease?.isMine ?? true))
  useEffect(() => box.current?.focus(), [])
  return (
    <div
      ref={box}
      role="status"
      tabIndex={-1}
      aria-labelledby="outcome"
      className="border border-l-[5px] border-fits bg-sheet px-5 py-4"
    >
      <h2 id="outcome">
        {outcomeWords[course]}
        {course === 'approve' && revision !== null && `: revision ${revision} is public`}
      </h2>
      <p className="mt-1">Its author is told, with your words.</p>
      {course === 'approve' && gear && (
        <p className="mt-1 flex flex-wrap gap-x-4">
          <Link to={paths.gear(gear.slug)} className="link">
            See the public page
          </Link>
          <Link to={paths.gearHistory(gear.slug)} className="link">
            See its history
          </Link>
        </p>
      )}
      <p className="mt-4 flex flex-wrap gap-3">
        {next && (
          <Link to={`${paths.reviewProposal(next.id)}${query}`} className={buttonClass({ variant: 'primary' })}>
            Next: {next.brand} · {next.model}
          </Link>
        )}
        <Link to={`${paths.review}${query}`} className={buttonClass()}>
          Back to the queue
        </Link>
      </p>
      {data && !next && <p className="mt-2 text-sm text-ink-soft">Nothing else waits for you with these filters.</p>}
    </div>
  )
}
