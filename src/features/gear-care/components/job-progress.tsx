import type { LongJob } from '#shared/schemas/review'

export interface JobProgressProps {
  readonly job: LongJob
}

const words: Readonly<Record<LongJob['status'], string>> = {
  waiting: 'Waits to begin.',
  running: 'Under way.',
  done: 'Done.',
  failed: 'Stopped before the end. What was done so far stands; begin again to go on.',
}

/** "3 reverted, 1 left alone": whatever the work counted. */
function listOutcome(outcome: LongJob['outcome']): string {
  return Object.entries(outcome ?? {})
    .filter(([, value]) => typeof value === 'number' || typeof value === 'string')
    .map(([key, value]) => `${String(value)} ${key}`)
    .join(', ')
}

/** How far long work has come; it goes on when the page is left. */
export function JobProgress({ job: { status, done, total, outcome } }: JobProgressProps) {
  const told = listOutcome(outcome)
  return (
    <div className="mt-4 max-w-prose">
      <progress
        aria-label="Pieces gone through"
        max={total ?? 1}
        {...(total !== null && { value: done })}
        className="h-3 w-full accent-action"
      />
      <p role="status" className="mt-1">
        {words[status]} {total === null ? `${done} gone through.` : `${done} of ${total} gone through.`}
      </p>
      {told !== '' && <p className="text-sm text-ink-soft">{told}</p>}
    </div>
  )
}
