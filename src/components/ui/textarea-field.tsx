import type { ComponentProps } from 'react'
import clsx from 'clsx'
import { controlClass, describedBy, FieldShell, type FieldProps } from './field'

export type TextareaFieldProps = FieldProps &
  Omit<ComponentProps<'textarea'>, 'id' | 'onChange' | 'aria-describedby' | 'aria-invalid'> & {
    readonly onChange?: (value: string) => void
  }

/** Some lines of plain words. */
export function TextareaField({ id, label, hint, error, onChange, className, rows = 3, ...area }: TextareaFieldProps) {
  return (
    <FieldShell id={id} label={label} hint={hint} error={error}>
      <textarea
        {...area}
        id={id}
        rows={rows}
        className={clsx(controlClass, 'py-2', className)}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, label, hint, error })}
        onChange={onChange && ((event) => onChange(event.target.value))}
      />
    </FieldShell>
  )
}
