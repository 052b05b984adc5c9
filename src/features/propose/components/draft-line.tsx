import { Button } from '../../../components/ui/button'
import { printMoment } from '../../../lib/print-moment'
import type { Draft } from '../model/drafts'

export interface DraftLineProps {
  readonly restored: Draft | null
  /** Revision on record now; null for a new piece. */
  readonly revision: number | null
  readonly onDrop: () => void
}

/** Says that something typed earlier is back, and lets it be thrown away. */
export function DraftLine({ restored, revision, onDrop }: DraftLineProps) {
  return (
    <div role="status">
      {restored && (
        <div className="mt-4 flex flex-wrap items-center gap-x-4 gap-y-2 border border-l-[5px] border-action bg-sheet px-4 py-3">
          <p className="min-w-0 grow">
            What you typed on {printMoment(restored.at)} is back, as this browser kept it.
            {restored.baseRevision !== null && restored.baseRevision !== revision && (
              <>
                {' '}
                The record has moved on since, from revision {restored.baseRevision} to {revision}.
              </>
            )}
          </p>
          <Button size="sm" onClick={onDrop}>
            Throw it away
          </Button>
        </div>
      )}
    </div>
  )
}
