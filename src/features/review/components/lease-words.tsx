import type { QueueItem } from '#shared/schemas/review'
import { printSpan } from '../model/print-span'

export interface LeaseWordsProps {
  readonly item: Pick<QueueItem, 'lease' | 'isMine'>
  readonly now: number
}

/** Who is at it, if anybody. */
export function LeaseWords({ item: { lease, isMine }, now }: LeaseWordsProps) {
  if (isMine) return <span>your own: somebody else decides</span>
  if (lease === null || Date.parse(lease.until) <= now) return <span className="text-ink-soft">free</span>
  const left = printSpan(Date.parse(lease.until) - now)
  return (
    <strong className="font-semibold">
      {lease.isMine ? 'yours' : lease.holder}, {left} more
    </strong>
  )
}
