import type { LetterItem } from '#shared/schemas/admin'
import { Button } from '../../../components/ui/button'
import { toApiError } from '../../../lib/problem'
import { useRetryLetter } from '../api/retry-letter'
import { printMoment } from '../print-moment'

const printTries = (attempts: number) => (attempts === 1 ? '1 try' : `${attempts} tries`)

export function LetterRow({ letter }: { readonly letter: LetterItem }) {
  const { subject, recipient, kind, attempts, lastError, createdAt, sentAt, can } = letter
  const retry = useRetryLetter(letter.id)
  return (
    <li className="grid gap-x-4 gap-y-2 border-t border-rule py-3 md:grid-cols-[minmax(0,1fr)_auto]">
      <div className="min-w-0 space-y-1">
        <p className="font-semibold break-words">{subject}</p>
        <p className="text-sm break-words text-ink-soft">
          To {recipient} · <span className="font-mono text-xs">{kind}</span> · written {printMoment(createdAt)}
          {sentAt !== null && ` · sent ${printMoment(sentAt)}`} · {printTries(attempts)}
        </p>
        {lastError !== null && <p className="font-mono text-xs break-words">{lastError}</p>}
        {retry.isError && (
          <p role="alert" className="text-sm font-semibold text-no">
            {toApiError(retry.error).message}
          </p>
        )}
      </div>
      {can.retry && (
        <div>
          <Button size="sm" isBusy={retry.isPending} onClick={() => retry.mutate()}>
            Try again<span className="sr-only"> to send “{subject}”</span>
          </Button>
        </div>
      )}
    </li>
  )
}
