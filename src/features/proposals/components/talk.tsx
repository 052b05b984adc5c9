import { useState } from 'react'
import { limits } from '#shared/limits'
import type { Proposal } from '#shared/schemas/proposals'
import { Button } from '../../../components/ui/button'
import { TextareaField } from '../../../components/ui/textarea-field'
import { printDate } from '../../../lib/print-date'

const turnWords: Readonly<Record<Proposal['messages'][number]['kind'], string>> = {
  message: 'wrote',
  submitted: 'sent it in',
  amended: 'amended it',
  'sent-back': 'sent it back',
  approved: 'approved it',
  declined: 'declined it',
  withdrawn: 'took it back',
}

export interface TalkProps {
  readonly proposal: Proposal
  readonly isBusy: boolean
  readonly error: string | undefined
  /** Says whether the words were taken; what was typed stays until they are. */
  readonly onSay: (words: string, onTaken: () => void) => void
}

/** Every turn that it took and every word about it, oldest first. */
export function Talk({ proposal: { messages, can }, isBusy, error, onSay }: TalkProps) {
  const [words, setWords] = useState('')
  return (
    <section className="mt-10" aria-labelledby="talk-title">
      <h2 id="talk-title">Talk</h2>
      {messages.length === 0 && <p className="mt-1 text-ink-soft">Nothing was said yet.</p>}
      <ol className="mt-2">
        {messages.map(({ id, author, kind, words: said, at }) => (
          <li key={id} className="border-t border-rule py-2">
            <p className="text-sm text-ink-soft">
              <strong className="font-semibold text-ink">{author}</strong> {turnWords[kind]}, {printDate(at)}
            </p>
            {said !== null && <p className="max-w-prose break-words whitespace-pre-line">{said}</p>}
          </li>
        ))}
      </ol>
      {can.say && (
        <form
          noValidate
          className="mt-4 max-w-2xl"
          onSubmit={(event) => {
            event.preventDefault()
            if (words.trim() !== '') onSay(words.trim(), () => setWords(''))
          }}
        >
          <TextareaField
            id="talk-words"
            label="Answer, or add something"
            maxLength={limits.words}
            value={words}
            onChange={setWords}
            error={error}
          />
          <Button type="submit" className="mt-2" isBusy={isBusy}>
            Send the words
          </Button>
        </form>
      )}
    </section>
  )
}
