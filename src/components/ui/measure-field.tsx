import type { ComponentProps, ReactNode } from 'react'
import { controlClass, describedBy, FieldShell, type FieldProps } from './field'

export interface MeasureFieldProps extends FieldProps {
  readonly name: string
  /** As typed: the text is kept raw, also when it cannot be read. Leave out for a plain form field. */
  readonly value?: string
  readonly defaultValue?: string
  readonly onChange?: (raw: string) => void
  /** What was read, in both unit systems; or, while empty, what is assumed. */
  readonly echo?: ReactNode
  /** An example to type, in the person's units. */
  readonly placeholder?: string
  readonly inputRef?: ComponentProps<'input'>['ref']
}

/** Takes a measure as people write it ("4 1/2 in") and says underneath how it was read. */
export function MeasureField(props: MeasureFieldProps) {
  const { id, label, hint, error, echo = '', onChange, inputRef, ...input } = props
  return (
    <FieldShell id={id} label={label} hint={hint} error={error} echo={echo}>
      <input
        {...input}
        id={id}
        ref={inputRef}
        type="text"
        // Not "decimal": people type units, fractions and primes.
        inputMode="text"
        autoComplete="off"
        autoCapitalize="off"
        spellCheck={false}
        className={`${controlClass} font-mono`}
        aria-invalid={error ? true : undefined}
        aria-describedby={describedBy({ id, label, hint, error, echo })}
        onChange={onChange && ((event) => onChange(event.target.value))}
      />
    </FieldShell>
  )
}
