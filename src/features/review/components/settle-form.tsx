import { useState } from 'react'
import { limits } from '#shared/limits'
import { Button } from '../../../components/ui/button'
import { TextareaField } from '../../../components/ui/textarea-field'
import { toApiError } from '../../../lib/problem'

export interface SettleFormProps {
  readonly id: string
  readonly label: string
  readonly hint: string
  readonly action: string
  readonly isBusy: boolean
  readonly failure: unknown
  readonly onSettle: (words: string) => void
}

/** Nothing is settled without words. They stay, whatever comes back. */
export function SettleForm({ id, label, hint, action, isBusy, failure, onSettle }: SettleFormProps) {
  const [words, setWords] = useState('')
  const [isTried, setTried] = useState(false)
  const missing = isTried && words.trim() === '' ? 'Say it in words' : undefined
  const failed = failure ? `${toApiError(failure).message} Your words are still here.` : undefined
  return (
    <form
      className="mt-3 max-w-prose print:hidden"
      onSubmit={(event) => {
        event.preventDefault()
        setTried(true)
        if (words.trim() === '') document.getElementById(id)?.focus()
        else onSettle(words.trim())
      }}
    >
      <TextareaField
        id={id}
        label={label}
        hint={hint}
        rows={2}
        maxLength={limits.words}
        value={words}
        error={missing ?? failed}
        onChange={setWords}
      />
      <Button type="submit" className="mt-2" isBusy={isBusy}>
        {action}
      </Button>
    </form>
  )
}
