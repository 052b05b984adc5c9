import { useState, type ReactNode } from 'react'
import { Button } from '../../../components/ui/button'
import { ErrorSummary } from '../../../components/ui/error-summary'
import { TextareaField } from '../../../components/ui/textarea-field'
import { toApiError } from '../../../lib/problem'

export interface WordsFormProps {
  readonly id: string
  readonly label: string
  readonly hint?: string
  readonly action: string
  readonly maxLength: number
  readonly isBusy: boolean
  readonly failure: unknown
  readonly onSend: (words: string) => void
  /** Above the words. */
  readonly children?: ReactNode
}

/** An act that is not done without saying why. What was typed stays, whatever comes back. */
export function WordsForm(props: WordsFormProps) {
  const { id, label, hint, action, maxLength, isBusy, failure, onSend, children } = props
  const [words, setWords] = useState('')
  const [attempt, setAttempt] = useState(0)
  const isMissing = attempt > 0 && words.trim() === ''
  const missing = isMissing ? 'Say why: it is kept in the history' : undefined
  const errors = missing
    ? [{ fieldId: id, message: missing }]
    : failure
      ? [{ message: `${toApiError(failure).message} Your words are still here.` }]
      : []
  return (
    <form
      className="grid max-w-prose gap-4"
      onSubmit={(event) => {
        event.preventDefault()
        setAttempt((count) => count + 1)
        if (words.trim() !== '') onSend(words.trim())
      }}
    >
      <ErrorSummary title="This was not done" errors={errors} attempt={attempt} />
      {children}
      <TextareaField
        id={id}
        label={label}
        hint={hint}
        maxLength={maxLength}
        value={words}
        error={missing}
        onChange={setWords}
      />
      <div>
        <Button type="submit" isBusy={isBusy}>
          {action}
        </Button>
      </div>
    </form>
  )
}
