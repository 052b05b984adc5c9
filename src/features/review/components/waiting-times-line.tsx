import type { WaitingTimes } from '#shared/schemas/review'
import { printSince, printSpan } from '../model/print-span'

const hourMs = 3_600_000

export interface WaitingTimesLineProps {
  readonly times: WaitingTimes
  /** When they were asked for. */
  readonly now: number
}

/** How long people wait: the same figures that everybody can read. */
export function WaitingTimesLine({ times: { days, decided, hours, waiting, oldestAt }, now }: WaitingTimesLineProps) {
  const span = (count: number) => printSpan(count * hourMs)
  return (
    <p className="mt-3 max-w-prose text-sm text-ink-soft">
      {hours === null
        ? `Nothing was decided in the last ${days} days, so there are no waiting times yet. `
        : `Half of what is sent in is decided within ${span(hours.p50)}, three quarters within ${span(hours.p75)}, 95 of 100 within ${span(hours.p95)} (${decided} decided in the last ${days} days). `}
      {waiting > 0 &&
        oldestAt !== null &&
        `${waiting === 1 ? 'One waits' : `${waiting} wait`} now, the longest for ${printSince(oldestAt, now)}.`}
    </p>
  )
}
