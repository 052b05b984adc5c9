import type { Proposal } from '#shared/schemas/proposals'
import { Button } from '../../../components/ui/button'
import { useNow } from '../hooks/use-now'
import { printCountdown } from '../model/print-span'

export interface LeaseBarProps {
  readonly proposal: Pick<Proposal, 'lease' | 'can'>
  /** When the proposal was read. */
  readonly readAt: number
  readonly isBusy: boolean
  readonly onTake: () => void
  readonly onRelease: () => void
}

/** Who is at a proposal, for how much longer, and the way to take or leave it. */
export function LeaseBar({ proposal: { lease, can }, readAt, isBusy, onTake, onRelease }: LeaseBarProps) {
  const now = useNow(readAt)
  const left = lease === null ? 0 : Date.parse(lease.until) - now
  const isHeld = lease !== null && left > 0
  const isMine = isHeld && lease.isMine
  const hasRunOut = lease?.isMine === true && left <= 0
  if (!can.lease && !isHeld) return null
  return (
    <div className="border-[1.5px] border-ink bg-sheet px-4 py-3">
      <p>
        {isMine ? (
          <>
            You hold this for{' '}
            <span role="timer" className="font-mono">
              {printCountdown(left)}
            </span>{' '}
            more. Nobody else can decide it meanwhile.
          </>
        ) : isHeld ? (
          <>
            <strong className="font-semibold">{lease.holder}</strong> holds this for{' '}
            <span role="timer" className="font-mono">
              {printCountdown(left)}
            </span>{' '}
            more. Read on; you can decide when it is let go of.
          </>
        ) : hasRunOut ? (
          'Your hold ran out. Your words are still here.'
        ) : (
          'Nobody holds this. Take it, and no one decides it while you read: 15 minutes at a time.'
        )}
      </p>
      {can.lease && (
        <p className="mt-2 flex flex-wrap gap-2">
          <Button size="sm" isBusy={isBusy} onClick={onTake}>
            {isMine ? 'Hold it for 15 minutes more' : 'Take it'}
          </Button>
          {isMine && (
            <Button size="sm" isBusy={isBusy} onClick={onRelease}>
              Let it go
            </Button>
          )}
        </p>
      )}
    </div>
  )
}
