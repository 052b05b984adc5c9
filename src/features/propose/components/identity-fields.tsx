import { useController, type Control } from 'react-hook-form'
import { limits } from '#shared/limits'
import { identityAttributes } from '#shared/kinds/common'
import { SelectField } from '../../../components/ui/select-field'
import { TextField } from '../../../components/ui/text-field'
import { TextareaField } from '../../../components/ui/textarea-field'
import { capitalise } from '../../../lib/capitalise'
import { fieldIdOf } from '../model/form-errors'
import type { ReadForm } from '../model/read-typed'
import type { TypedForm, TypedIdentity } from '../model/typed-form'

type FormControl = Control<TypedForm, unknown, ReadForm>

function useIdentity(control: FormControl, key: keyof TypedIdentity) {
  const { field, fieldState } = useController({ control, name: `identity.${key}` })
  const attribute = identityAttributes.find((one) => one.key === key)
  return {
    id: fieldIdOf(field.name),
    name: field.name,
    label: capitalise(attribute?.label ?? key),
    hint: attribute?.guide,
    value: field.value,
    onChange: field.onChange as (text: string) => void,
    error: fieldState.error?.message,
  }
}

const statusOptions = identityAttributes.flatMap((one) =>
  one.key === 'status' && one.type === 'choice' ? one.options : [],
)

/** What names the piece. */
export function NameFields({ control }: { readonly control: FormControl }) {
  const brand = useIdentity(control, 'brand')
  const model = useIdentity(control, 'model')
  const gtin = useIdentity(control, 'gtin')
  const status = useIdentity(control, 'status')
  return (
    <div className="grid gap-x-6 gap-y-4 sm:grid-cols-2">
      <TextField {...brand} maxLength={limits.brand} autoComplete="off" />
      <TextField {...model} maxLength={limits.model} autoComplete="off" />
      <TextField {...gtin} maxLength={20} inputMode="numeric" autoComplete="off" className="font-mono" />
      <SelectField {...status} options={statusOptions} />
    </div>
  )
}

export function NotesField({ control }: { readonly control: FormControl }) {
  return <TextareaField {...useIdentity(control, 'notes')} rows={4} maxLength={limits.notes} />
}
