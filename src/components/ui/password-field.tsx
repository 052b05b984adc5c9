import { useState, type ComponentProps } from 'react'
import { Button } from './button'
import { controlClass, describedBy, FieldShell, type FieldProps } from './field'

export type PasswordFieldProps = FieldProps &
  Pick<ComponentProps<'input'>, 'name'> & {
    /** Tells a password manager which of the two to offer. */
    readonly autoComplete: 'current-password' | 'new-password'
  }

/** Can be shown while it is typed, and pasted. */
export function PasswordField({ id, label, hint, error, ...input }: PasswordFieldProps) {
  const [isShown, setIsShown] = useState(false)
  return (
    <FieldShell id={id} label={label} hint={hint} error={error}>
      <div className="flex gap-2">
        <input
          {...input}
          id={id}
          type={isShown ? 'text' : 'password'}
          spellCheck={false}
          autoCapitalize="none"
          className={controlClass}
          aria-invalid={error ? true : undefined}
          aria-describedby={describedBy({ id, label, hint, error })}
        />
        <Button
          aria-pressed={isShown}
          aria-label={`Show ${typeof label === 'string' ? label.toLowerCase() : 'password'}`}
          onClick={() => setIsShown(!isShown)}
        >
          Show
        </Button>
      </div>
    </FieldShell>
  )
}
