import type { ComponentProps } from 'react'
import { controlClass, describedBy, FieldShell, type FieldProps } from './field'

export type SelectFieldProps = FieldProps &
  Omit<ComponentProps<'select'>, 'id' | 'onChange' | 'children' | 'aria-describedby' | 'aria-invalid'> & {
    readonly options: readonly { readonly value: string; readonly label: string }[]
    /** Label of an empty first choice, such as "any". */
    readonly emptyLabel?: string
    readonly onChange?: (value: string) => void
  }

export function SelectField({ id, label, hint, error, options, emptyLabel, onChange, ...select }: SelectFieldProps) {
  return (
    <FieldShell id={id} label={label} hint={hint} error={error}>
      <select
        {...select}
        id={id}
        className={controlClass}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, label, hint, error })}
        onChange={onChange && ((event) => onChange(event.target.value))}
      >
        {emptyLabel !== undefined && <option value="">{emptyLabel}</option>}
        {options.map((option) => (
          <option key={option.value} value={option.value}>
            {option.label}
          </option>
        ))}
      </select>
    </FieldShell>
  )
}
