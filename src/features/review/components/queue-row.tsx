import type { ReactNode } from 'react'
import { Link } from 'react-router-dom'
import { getKind, isKindKey } from '#shared/kinds/index'
import type { QueueItem } from '#shared/schemas/review'
import { paths } from '../../../config/paths'
import { nameKey } from '../model/list-fields'
import { printSince } from '../model/print-span'
import { LeaseWords } from './lease-words'
import { RecordWords } from './record-words'

export interface QueueRowProps {
  readonly item: QueueItem
  readonly now: number
  /** Filters of the queue, which the next proposal is looked for with. */
  readonly search: string
}

interface CellProps {
  readonly title: string
  readonly children: ReactNode
}

function Cell({ title, children }: CellProps) {
  return (
    <td role="cell" className="flex gap-2 align-top text-sm md:table-cell md:border-t md:border-rule md:px-3 md:py-3">
      <span aria-hidden="true" className="w-20 flex-none text-ink-soft md:hidden">
        {title}
      </span>
      <span className="min-w-0">{children}</span>
    </td>
  )
}

const listChanges = ({ kind, changed }: QueueItem): string => {
  const names = changed.map((key) => nameKey(kind, key))
  return names.length > 4 ? `${names.slice(0, 3).join(', ')} and ${names.length - 3} more` : names.join(', ')
}

/** One proposal of the queue: a table's row, or a card on a phone. */
export function QueueRow({ item, now, search }: QueueRowProps) {
  const { id, kind, slug, brand, model, summary, submittedAt, author, record, flags, isBehind } = item
  const label = isKindKey(kind) ? getKind(kind).label : kind
  return (
    <tr
      role="row"
      className="block border-t border-rule py-3 focus-within:bg-action-soft md:table-row md:border-0 md:py-0"
    >
      <th
        role="rowheader"
        scope="row"
        className="block pb-1 text-left align-top font-normal md:table-cell md:border-t md:border-rule md:py-3 md:pr-3"
      >
        <Link to={`${paths.reviewProposal(id)}${search}`} data-queue-item="" className="link font-semibold">
          {brand ?? 'Unnamed'} · {model ?? 'unnamed'}
        </Link>
        <span className="block text-sm text-ink-soft">
          {slug === null ? `new ${label}` : `${label}: ${listChanges(item)}`}
        </span>
        {summary !== null && <span className="block max-w-prose text-sm">“{summary}”</span>}
      </th>
      <Cell title="Waiting">
        <time dateTime={submittedAt} className="font-mono">
          {printSince(submittedAt, now)}
        </time>
      </Cell>
      <Cell title="From">
        {author}
        <span className="block text-ink-soft">
          <RecordWords record={record} />
        </span>
      </Cell>
      <Cell title="Warnings">
        {flags === 0 ? (
          <span className="text-ink-soft">none</span>
        ) : (
          <strong className="font-semibold text-changes">{flags === 1 ? 'one' : flags}</strong>
        )}
        {isBehind && <span className="block">the piece has moved on since</span>}
      </Cell>
      <Cell title="Held by">
        <LeaseWords item={item} now={now} />
      </Cell>
    </tr>
  )
}
