import { useState } from 'react'
import { limits } from '#shared/limits'
import type { Attribute } from '#shared/kinds/types'
import { Button } from '../../../components/ui/button'
import { Dialog } from '../../../components/ui/dialog'
import { TextareaField } from '../../../components/ui/textarea-field'
import { toApiError } from '../../../lib/problem'
import { useReportError } from '../api/report-error'

export interface ReportDialogProps {
  readonly slug: string
  /** Null: about the piece as a whole. */
  readonly attribute: Attribute | null
  readonly onClose: () => void
}

/** For whoever sees a mistake and need not have an account to say so. */
export function ReportDialog({ slug, attribute, onClose }: ReportDialogProps) {
  const [words, setWords] = useState('')
  const [isEmpty, setIsEmpty] = useState(false)
  const { mutate, isPending, isSuccess, error } = useReportError(slug)
  const send = () => {
    const said = words.trim()
    setIsEmpty(said === '')
    if (said !== '') mutate({ words: said, ...(attribute && { key: attribute.key }) })
  }
  return (
    <Dialog
      title={attribute ? `Something wrong with the ${attribute.label}?` : 'Something wrong here?'}
      onClose={onClose}
    >
      {isSuccess ? (
        <p role="status">Thank you. The moderators see it beside the piece.</p>
      ) : (
        <form
          noValidate
          onSubmit={(event) => {
            event.preventDefault()
            send()
          }}
        >
          <TextareaField
            id="report-words"
            label="What is wrong"
            hint="What you see on the piece or its sheet, and where. No account is needed; nothing about you is stored with it."
            maxLength={limits.words}
            rows={4}
            autoFocus
            value={words}
            onChange={setWords}
            error={
              isEmpty && words.trim() === ''
                ? 'Say what is wrong.'
                : error
                  ? `${toApiError(error).message} What you wrote is kept.`
                  : undefined
            }
          />
          <Button type="submit" variant="primary" className="mt-3" isBusy={isPending}>
            Tell the moderators
          </Button>
        </form>
      )}
    </Dialog>
  )
}
