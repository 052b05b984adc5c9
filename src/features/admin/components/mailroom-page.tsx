import { Fragment } from 'react'
import { useQuery } from '@tanstack/react-query'
import type { ReceivedLetter } from '#shared/schemas/admin'
import { Button } from '../../../components/ui/button'
import { EmptyState } from '../../../components/ui/empty-state'
import { ErrorState } from '../../../components/ui/error-state'
import { LoadingBlock } from '../../../components/ui/loading-block'
import { Skeleton } from '../../../components/ui/skeleton'
import { useApp } from '../../../lib/app-context'
import { toApiError } from '../../../lib/problem'
import { mailroomQuery } from '../api/mailroom-query'
import { printMoment } from '../print-moment'

const webAddress = /(https?:\/\/[^\s<>"]+)/

/** The words as they are, with web addresses as links. Split by a group, every second part is an address. */
function LinkedText({ text }: { readonly text: string }) {
  return text.split(webAddress).map((part, index) =>
    index % 2 === 1 ? (
      <a key={index} href={part} className="link break-all">
        {part}
      </a>
    ) : (
      <Fragment key={index}>{part}</Fragment>
    ),
  )
}

function Received({ letter }: { readonly letter: ReceivedLetter }) {
  return (
    <li className="border border-rule bg-sheet p-4">
      <article aria-label={letter.subject}>
        <h2 className="text-lg break-words">{letter.subject}</h2>
        <p className="text-sm break-words text-ink-soft">
          To {letter.to} · from {letter.from} · {printMoment(letter.receivedAt)}
        </p>
        <div className="mt-3 max-w-prose break-words whitespace-pre-wrap">
          <LinkedText text={letter.text} />
        </div>
      </article>
    </li>
  )
}

/** Demo mode alone: letters that would have gone out, to be read by whoever tries the site. */
export function MailroomPage() {
  const { api } = useApp()
  const { data, error, refetch, isFetching } = useQuery(mailroomQuery(api))
  return (
    <div className="space-y-6">
      <h1>Mailroom</h1>
      <p className="max-w-prose">
        This is a demo: no e-mail leaves this machine. What would have been sent is here, newest first, for everybody to
        read. A letter arrives some seconds after what it tells of.
      </p>
      <Button isBusy={isFetching} onClick={() => void refetch()}>
        Look again
      </Button>
      {error !== null ? (
        <ErrorState title={toApiError(error).title}>{toApiError(error).message}</ErrorState>
      ) : data === undefined ? (
        <LoadingBlock label="Loading letters">
          <Skeleton className="h-64 w-full" />
        </LoadingBlock>
      ) : data.items.length === 0 ? (
        <EmptyState title="No letter has arrived">Sign up, or ask for a new password, and look again.</EmptyState>
      ) : (
        <ul className="space-y-4" aria-label="Letters">
          {data.items.map((letter) => (
            <Received key={`${letter.messageId} ${letter.receivedAt}`} letter={letter} />
          ))}
        </ul>
      )}
    </div>
  )
}
