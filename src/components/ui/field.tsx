import type { ReactNode } from 'react'

export interface FieldProps {
  /** Of the control; hint, echo and error take theirs from it. */
  readonly id: string
  readonly label: ReactNode
  readonly hint?: ReactNode
  /** Says what to do, in the words of the error summary. */
  readonly error?: string | undefined
}

interface FieldShellProps extends FieldProps {
  /** A line under the control that does not move the layout when it fills. */
  readonly echo?: ReactNode
  readonly children: ReactNode
}

/** The ids that describe a control, for its `aria-describedby`. */
export function describedBy({ id, hint, error, echo }: FieldProps & { readonly echo?: ReactNode }): string | undefined {
  const ids = [hint && `${id}-hint`, error && `${id}-error`, echo && !error && `${id}-echo`].filter(Boolean)
  return ids.length > 0 ? ids.join(' ') : undefined
}

export const controlClass =
  'block w-full min-h-11 rounded-ui border-[1.5px] border-ink-soft bg-sheet px-3 text-base text-ink ' +
  'placeholder:text-ink-soft placeholder:opacity-100 aria-invalid:border-no aria-invalid:border-2'

export function FieldShell({ id, label, hint, error, echo, children }: FieldShellProps) {
  return (
    <div>
      <label htmlFor={id} className="block text-sm font-semibold">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-sm text-ink-soft">
          {hint}
        </p>
      )}
      <div className="mt-1">{children}</div>
      {error ? (
        <p id={`${id}-error`} className="mt-1 text-sm font-semibold text-no">
          <span className="sr-only">Error: </span>
          {error}
        </p>
      ) : (
        echo !== undefined && (
          <p id={`${id}-echo`} className="mt-1 min-h-5 font-mono text-xs text-ink-soft">
            {echo}
          </p>
        )
      )}
    </div>
  )
}
