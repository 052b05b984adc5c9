import { useState, type FormEvent, type ReactNode } from 'react'
import { noFailure, toFormFailure } from '../../lib/field-errors'
import { toApiError } from '../../lib/problem'
import { useIsLive } from '../../lib/use-is-live'
import { Button } from './button'
import type { ButtonLook } from './button-class'
import { ErrorSummary } from './error-summary'

export interface FormField {
  readonly id: string
  readonly name: string
  readonly label: string
  readonly error: string | undefined
}

export interface SubmitFormProps {
  /** Begins the ids of its fields. */
  readonly id: string
  readonly labels: Readonly<Record<string, string>>
  /** The verb on its button. */
  readonly action: string
  readonly variant?: ButtonLook['variant']
  /** Sends what the fields hold; what it rejects with is shown, and nothing typed is lost. */
  readonly onSend: (values: FormData) => Promise<void>
  readonly children: (field: (name: string) => FormField) => ReactNode
}

/** A form whose answer comes without leaving the page. Its fields keep what was typed by themselves. */
export function SubmitForm({ id, labels, action, variant = 'primary', onSend, children }: SubmitFormProps) {
  const [failure, setFailure] = useState(noFailure)
  const [attempt, setAttempt] = useState(0)
  const [isBusy, setIsBusy] = useState(false)
  const isLive = useIsLive()
  const fieldId = (name: string) => `${id}-${name}`

  async function send(event: FormEvent<HTMLFormElement>): Promise<void> {
    event.preventDefault()
    if (isBusy) return
    setIsBusy(true)
    try {
      await onSend(new FormData(event.currentTarget))
      setFailure(noFailure)
    } catch (error) {
      setFailure(toFormFailure(toApiError(error), labels, fieldId))
      setAttempt((count) => count + 1)
    } finally {
      setIsBusy(false)
    }
  }

  return (
    // Posted, if ever the browser itself sends it: an address is no place for a password.
    <form id={id} method="post" noValidate onSubmit={(event) => void send(event)} className="space-y-4">
      <ErrorSummary title="That did not work yet" errors={failure.summary} attempt={attempt} />
      {children((name) => ({
        id: fieldId(name),
        name,
        label: labels[name] ?? name,
        error: failure.byField[name],
      }))}
      <Button type="submit" variant={variant} isBusy={isBusy} disabled={!isLive}>
        {action}
      </Button>
      <noscript>
        <p className="text-sm">This form needs scripts: it is sent without leaving the page.</p>
      </noscript>
    </form>
  )
}
