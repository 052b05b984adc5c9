import { useSubmit } from 'react-router-dom'
import type { RevisionSummary } from '#shared/schemas/gear'
import { Button } from '../../../components/ui/button'
import { SelectField } from '../../../components/ui/select-field'
import { paths } from '../../../config/paths'
import { printDate } from '../../../lib/print-date'
import type { ComparedRevisions } from '../read-compared-revisions'

export interface RevisionChooserProps {
  readonly slug: string
  readonly revisions: readonly RevisionSummary[]
  readonly compared: ComparedRevisions
}

/** Any two states of the piece; a plain form. */
export function RevisionChooser({ slug, revisions, compared }: RevisionChooserProps) {
  const submit = useSubmit()
  const options = revisions.map(({ number, createdAt }) => ({
    value: String(number),
    label: `no. ${number}, ${printDate(createdAt)}`,
  }))
  return (
    <form
      key={`${compared.before} ${compared.after}`}
      action={paths.gearHistory(slug)}
      method="get"
      onSubmit={(event) => {
        event.preventDefault()
        void submit(event.currentTarget, { preventScrollReset: true })
      }}
      className="mt-3 grid grid-cols-1 items-end gap-x-4 gap-y-3 sm:grid-cols-[minmax(0,16rem)_minmax(0,16rem)_auto] sm:justify-start print:hidden"
    >
      <SelectField
        id="before"
        name="before"
        label="From"
        defaultValue={String(compared.before)}
        options={[...options, { value: '0', label: 'before it was recorded' }]}
      />
      <SelectField id="after" name="after" label="To" defaultValue={String(compared.after)} options={options} />
      <Button type="submit">Set side by side</Button>
    </form>
  )
}
