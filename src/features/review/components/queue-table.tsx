import type { QueueItem } from '#shared/schemas/review'
import { QueueRow } from './queue-row'

const titles = ['Proposal', 'Waiting', 'From', 'Warnings', 'Held by'] as const

export interface QueueTableProps {
  readonly items: readonly QueueItem[]
  readonly now: number
  readonly search: string
}

/** The queue: a table with a row for each proposal, cards on a phone. */
export function QueueTable({ items, now, search }: QueueTableProps) {
  return (
    <table role="table" className="mt-3 block w-full border-b-[1.5px] border-ink md:table">
      <caption className="sr-only">Proposals that wait to be decided</caption>
      <thead role="rowgroup" className="hidden md:table-header-group">
        <tr role="row">
          {titles.map((title) => (
            <th
              key={title}
              role="columnheader"
              scope="col"
              className="border-b-[1.5px] border-ink px-3 py-2 text-left text-sm first:w-2/5 first:pl-0"
            >
              {title}
            </th>
          ))}
        </tr>
      </thead>
      <tbody role="rowgroup" className="block md:table-row-group">
        {items.map((item) => (
          <QueueRow key={item.id} item={item} now={now} search={search} />
        ))}
      </tbody>
    </table>
  )
}
