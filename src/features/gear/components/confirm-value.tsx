import { useState } from 'react'
import type { Attribute } from '#shared/kinds/types'
import { describeExample } from '#shared/units/examples'
import { readMeasure } from '#shared/units/read'
import type { Printer } from '#shared/units/print'
import { MeasureField } from '../../../components/ui/measure-field'
import { toApiError } from '../../../lib/problem'
import { useSignedIn } from '../../../lib/session'
import { useConfirmValue } from '../api/confirm-value'

export interface ConfirmValueProps {
  readonly slug: string
  readonly attribute: Attribute
  readonly count: number
  readonly printer: Printer
}

const countWords = (count: number): string =>
  count === 1 ? 'One other person found the same.' : `${count} others found the same.`

/** How many found the same number, and one press to be one more; one's own reading may go along. */
export function ConfirmValue({ slug, attribute, count, printer }: ConfirmValueProps) {
  const person = useSignedIn()
  const { mutate, isPending, isSuccess, error } = useConfirmValue(slug)
  const [reading, setReading] = useState<string | null>(null)
  const { key, label } = attribute
  const measure = attribute.type === 'measure' ? attribute : null
  const read =
    reading !== null && measure && reading.trim() !== '' ? readMeasure(reading, measure.unit, printer.system) : null
  const unread = read && !read.ok ? read.reason : undefined
  const words = measure ? 'Same number here' : 'Same here'
  const confirm = () => {
    if (unread === undefined) mutate({ key, ...(read?.ok && { measured: read.value }) })
  }
  return (
    <div className="contents">
      {count > 0 && <span>{countWords(count)}</span>}
      <span role="status" className={isSuccess ? 'font-semibold text-fits' : 'sr-only'}>
        {isSuccess ? 'Noted: the same number with you.' : ''}
      </span>
      {person?.can.contribute && !isSuccess && (
        <>
          <button
            type="button"
            aria-disabled={isPending || undefined}
            className="link min-h-8 font-semibold aria-disabled:opacity-55"
            aria-label={`${words}: ${label}`}
            onClick={() => !isPending && confirm()}
          >
            {words}
          </button>
          {measure && reading === null && (
            <button
              type="button"
              className="link min-h-8"
              aria-label={`Add your own reading of the ${label}`}
              onClick={() => setReading('')}
            >
              with my reading
            </button>
          )}
          {measure && reading !== null && (
            <span className="w-44">
              <MeasureField
                id={`reading-${key}`}
                name={`reading-${key}`}
                label={`Your reading of the ${label}`}
                placeholder={describeExample(measure.unit, printer.system)}
                value={reading}
                onChange={setReading}
                echo={read?.ok ? read.echo : ''}
                error={unread}
              />
            </span>
          )}
        </>
      )}
      {error && (
        <span role="alert" className="text-no">
          {toApiError(error).message}
        </span>
      )}
    </div>
  )
}
