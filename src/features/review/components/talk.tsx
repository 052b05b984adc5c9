import { useState } from 'react'
import type { Proposal } from '#shared/schemas/proposals'
import { Button } from '../../../components/ui/button'
import { TextareaField } from '../../../components/ui/textarea-field'
import { printMoment } from '../../../lib/print-date'
import { toApiError } from '../../../lib/problem'
import { useMessage } from '../api/use-message'

const kindWords: Readonly<Record<Proposal['messages'][number]['kind'], string>> = {
  message: 'wrote',
  submitted: 'sent it in',
  amended: 'changed it',
  'sent-back': 'sent it back',
  approved: 'approved it',
  declined: 'declined it',
  withdrawn: 'withdrew it',
}

function Messages({ messages }: Pick<Proposal, 'messages'>) {
  return (
    <ol className="mt-2">
      {messages.map(({ id, author, kind, words, at }) => (
        <li key={id} className="border-t border-rule py-2">
          <p className="text-sm text-ink-soft">
            <strong className="font-semibold text-ink">{author}</strong> {kindWords[kind]},{' '}
            <time dateTime={at}>{printMoment(at)}</time>
          </p>
          {words !== null && <p className="max-w-prose whitespace-pre-line">{words}</p>}
        </li>
      ))}
    </ol>
  )
}

export interface TalkProps {
  readonly proposal: Pick<Proposal, 'id' | 'messages' | 'can'>
  readonly onSaid: (message: string) => void
}

/** Everything that was said and done about a proposal, and words that decide nothing. */
export function Talk({ proposal: { id, messages, can }, onSaid }: TalkProps) {
  const [words, setWords] = useState('')
  const [error, setError] = useState<string>()
  const { mutate, isPending } = useMessage(id)
  const say = () => {
    if (words.trim() === '') {
      setError('Write something first')
      document.getElementById('talk-words')?.focus()
      return
    }
    setError(undefined)
    mutate(words.trim(), {
      onSuccess: () => {
        setWords('')
        onSaid('Your words were sent.')
      },
      onError: (failure) => setError(`${toApiError(failure).message} Your words are still here.`),
    })
  }
  return (
    <section className="mt-10" aria-labelledby="talk">
      <h2 id="talk">Talk</h2>
      {messages.length > 0 ? (
        <Messages messages={messages} />
      ) : (
        <p className="mt-1 text-ink-soft">Nothing was said yet.</p>
      )}
      {can.say && (
        <form
          onSubmit={(event) => {
            event.preventDefault()
            say()
          }}
          className="mt-3 max-w-prose print:hidden"
        >
          <TextareaField
            id="talk-words"
            label="Say something that decides nothing"
            hint="Its author is told."
            maxLength={2000}
            value={words}
            error={error}
            onChange={setWords}
          />
          <Button type="submit" className="mt-2" isBusy={isPending}>
            Send your words
          </Button>
        </form>
      )}
    </section>
  )
}
