import { useEffect, useRef } from 'react'
import { ErrorSummary } from '../../../components/ui/error-summary'
import type { Refusal } from '../model/explain-refusal'

export interface RefusalNoticeProps {
  readonly refusal: Refusal
  /** Counts the attempts, so that a repeated failure takes focus again. */
  readonly attempt: number
}

const titles = {
  amended: 'Its author changed it while you read',
  overtaken: 'Somebody else was quicker',
  failed: 'Your decision did not go through',
} as const

function explain(refusal: Exclude<Refusal, { kind: 'wrong' }>): string {
  if (refusal.kind !== 'amended') return refusal.detail
  const { changed } = refusal
  return changed.length === 0
    ? 'The values are the same as before; look over it once more and decide again.'
    : `Changed: ${changed.join(', ')}. The page shows the new version; look over it and decide again.`
}

/** Why a decision did not count. Takes focus, and says that nothing typed is lost. */
export function RefusalNotice({ refusal, attempt }: RefusalNoticeProps) {
  const box = useRef<HTMLDivElement>(null)
  useEffect(() => box.current?.focus(), [attempt, refusal])
  if (refusal.kind === 'wrong')
    return <ErrorSummary title="The decision needs another look" errors={refusal.errors} attempt={attempt} />
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      aria-labelledby="refusal-title"
      className="border border-l-[5px] border-changes bg-sheet px-5 py-4"
    >
      <h2 id="refusal-title">{titles[refusal.kind]}</h2>
      <p className="mt-1 max-w-prose">{explain(refusal)}</p>
      <p className="mt-1 max-w-prose">What you chose and typed is still here.</p>
    </div>
  )
}
