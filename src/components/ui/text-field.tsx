import type { ComponentProps } from 'react'
import clsx from 'clsx'
import { controlClass, describedBy, FieldShell, type FieldProps } from './field'

export type TextFieldProps = FieldProps &
  Omit<ComponentProps<'input'>, 'id' | 'onChange' | 'aria-describedby' | 'aria-invalid'> & {
    readonly onChange?: (value: string) => void
  }

/** Controlled with `value` and `onChange`, or a plain form field with `defaultValue`. */
export function TextField({ id, label, hint, error, onChange, className, ...input }: TextFieldProps) {
  return (
    <FieldShell id={id} label={label} hint={hint} error={error}>
      <input
        {...input}
        id={id}
        className={clsx(controlClass, className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, label, hint, error })}
        onChange={onChange && ((event) => onChange(event.target.value))}
      />
    </FieldShell>
  )
}
