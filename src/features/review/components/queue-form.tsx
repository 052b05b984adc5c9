import { useNavigate } from 'react-router-dom'
import { getKind, isKindKey } from '#shared/kinds/index'
import type { Queue } from '#shared/schemas/review'
import { Button } from '../../../components/ui/button'
import { SelectField } from '../../../components/ui/select-field'
import { paths } from '../../../config/paths'
import { readQueueFilters, writeQueueQuery, type QueueFilters } from '../model/queue-filters'

const ageOptions = [
  { value: 'day', label: 'longer than a day' },
  { value: 'week', label: 'longer than a week' },
  { value: 'month', label: 'longer than a month' },
]

const flagOptions = [
  { value: 'yes', label: 'with warnings' },
  { value: 'no', label: 'without warnings' },
]

const sortOptions = [
  { value: 'oldest', label: 'the longest wait first' },
  { value: 'newest', label: 'the newest first' },
  { value: 'flagged', label: 'the most warnings first' },
  { value: 'newcomers', label: 'newcomers first' },
]

export interface QueueFormProps {
  readonly filters: QueueFilters
  readonly kinds: Queue['kinds']
}

/** Narrows and orders the queue: a plain form, which goes off by itself where there are scripts. */
export function QueueForm({ filters, kinds }: QueueFormProps) {
  const navigate = useNavigate()
  const waiting = new Map(kinds.map(({ kind, count }) => [kind, count]))
  if (filters.kind !== null && !waiting.has(filters.kind)) waiting.set(filters.kind, 0)
  const kindOptions = [...waiting].flatMap(([kind, count]) =>
    isKindKey(kind) ? [{ value: kind, label: `${getKind(kind).plural} (${count})` }] : [],
  )
  const show = (form: HTMLFormElement) => {
    const params = new URLSearchParams()
    for (const [name, value] of new FormData(form)) if (typeof value === 'string') params.set(name, value)
    void navigate(`${paths.review}${writeQueueQuery(readQueueFilters(params))}`)
  }
  return (
    <form
      key={writeQueueQuery(filters)}
      action={paths.review}
      method="get"
      onChange={(event) => show(event.currentTarget)}
      className="mt-4 grid grid-cols-1 items-end gap-x-4 gap-y-3 sm:grid-cols-2 lg:grid-cols-[repeat(4,minmax(0,1fr))_auto] print:hidden"
    >
      <SelectField
        id="queue-kind"
        name="kind"
        label="Kind"
        emptyLabel="all kinds"
        options={kindOptions}
        defaultValue={filters.kind ?? ''}
      />
      <SelectField
        id="queue-age"
        name="age"
        label="Waiting"
        emptyLabel="for any time"
        options={ageOptions}
        defaultValue={filters.age ?? ''}
      />
      <SelectField
        id="queue-flagged"
        name="flagged"
        label="Warnings"
        emptyLabel="with or without"
        options={flagOptions}
        defaultValue={filters.flagged ?? ''}
      />
      <SelectField id="queue-sort" name="sort" label="Order" options={sortOptions} defaultValue={filters.sort} />
      <noscript>
        <Button type="submit">Show</Button>
      </noscript>
    </form>
  )
}
