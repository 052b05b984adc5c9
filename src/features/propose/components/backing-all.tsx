import { useController, type Control } from 'react-hook-form'
import { limits } from '#shared/limits'
import { SelectField } from '../../../components/ui/select-field'
import { TextField } from '../../../components/ui/text-field'
import { fieldIdOf } from '../model/form-errors'
import type { ReadForm } from '../model/read-typed'
import { sourceOptions } from '../model/sources'
import type { TypedForm } from '../model/typed-form'

/** Where the numbers are from, said once for all that say nothing else. */
export function BackingAll({ control }: { readonly control: Control<TypedForm, unknown, ReadForm> }) {
  const source = useController({ control, name: 'backing.source' })
  const date = useController({ control, name: 'backing.date' })
  const evidence = useController({ control, name: 'backing.evidence' })
  return (
    <section className="mt-8" aria-labelledby="backing-title">
      <h2 id="backing-title">Where the numbers are from</h2>
      <p className="mt-1 max-w-prose text-ink-soft">
        Holds for every value that you set here. A value from elsewhere can say so under its own field.
      </p>
      <div className="mt-3 grid gap-x-6 gap-y-4 sm:grid-cols-3">
        <SelectField
          id={fieldIdOf('backing.source')}
          name="backing.source"
          label="Source"
          options={sourceOptions}
          value={source.field.value}
          onChange={source.field.onChange}
        />
        <TextField
          id={fieldIdOf('backing.date')}
          name="backing.date"
          type="date"
          label="Day"
          hint="Left empty: today."
          value={date.field.value}
          onChange={date.field.onChange}
        />
        <TextField
          id={fieldIdOf('backing.evidence')}
          name="backing.evidence"
          label="What backs them"
          hint="Words, or a link that begins with https://"
          maxLength={limits.evidence}
          value={evidence.field.value}
          onChange={evidence.field.onChange}
        />
      </div>
    </section>
  )
}
