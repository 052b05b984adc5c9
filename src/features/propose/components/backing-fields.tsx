import { useController, type Control } from 'react-hook-form'
import { limits } from '#shared/limits'
import type { Attribute } from '#shared/kinds/types'
import { Disclosure } from '../../../components/ui/disclosure'
import { MeasureField } from '../../../components/ui/measure-field'
import { SelectField } from '../../../components/ui/select-field'
import { TextField } from '../../../components/ui/text-field'
import { fieldIdOf } from '../model/form-errors'
import type { ReadForm } from '../model/read-typed'
import { sourceOptions } from '../model/sources'
import type { TypedForm } from '../model/typed-form'

export interface BackingFieldsProps {
  readonly control: Control<TypedForm, unknown, ReadForm>
  readonly attribute: Attribute
}

/** What backs this one value, where that is not what backs them all. */
export function BackingFields({ control, attribute: { key, type, label } }: BackingFieldsProps) {
  const source = useController({ control, name: `specs.${key}.source` })
  const plusMinus = useController({ control, name: `specs.${key}.plusMinus` })
  const date = useController({ control, name: `specs.${key}.date` })
  const evidence = useController({ control, name: `specs.${key}.evidence` })
  const fields = [source, plusMinus, date, evidence]
  const isSaid = fields.some(({ field, fieldState }) => field.value !== '' || fieldState.invalid)
  const shared = ({ field, fieldState }: (typeof fields)[number]) => ({
    id: fieldIdOf(field.name),
    name: field.name,
    value: field.value,
    onChange: field.onChange,
    error: fieldState.error?.message,
  })
  return (
    <div className="[&>details]:border-t-0">
      <Disclosure
        isOpen={isSaid}
        summary={
          <span className="text-sm font-normal">
            Source of this {type === 'measure' ? 'number' : 'value'} <span className="sr-only">({label})</span>
          </span>
        }
      >
        <div className="grid gap-4 sm:grid-cols-2">
          <SelectField {...shared(source)} label="Source" options={sourceOptions} emptyLabel="as said for all" />
          {type === 'measure' && (
            <MeasureField {...shared(plusMinus)} label="± how much" hint="The likely error of the measurement." />
          )}
          <TextField
            {...shared(date)}
            type="date"
            label="Day"
            hint="Of the measurement or document. Empty: as for all."
          />
          <TextField
            {...shared(evidence)}
            label="What backs it"
            hint="Words, or a link that begins with https://"
            maxLength={limits.evidence}
          />
        </div>
      </Disclosure>
    </div>
  )
}
