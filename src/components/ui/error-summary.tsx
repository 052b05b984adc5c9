import { useEffect, useRef } from 'react'

export interface FieldError {
  /** Id of the control that the error belongs to; without one the error is about the whole form. */
  readonly fieldId?: string
  readonly message: string
}

export interface ErrorSummaryProps {
  readonly title?: string
  readonly errors: readonly FieldError[]
  /** Counts the attempts, so that a repeated failure takes focus again. */
  readonly attempt?: number
}

export function ErrorSummary({ title = 'Some answers need another look', errors, attempt = 0 }: ErrorSummaryProps) {
  const box = useRef<HTMLDivElement>(null)
  const hasErrors = errors.length > 0
  useEffect(() => {
    if (hasErrors) box.current?.focus()
  }, [attempt, hasErrors])
  if (!hasErrors) return null
  return (
    <div
      ref={box}
      role="alert"
      tabIndex={-1}
      autoFocus
      aria-labelledby="error-summary-title"
      className="rounded-ui border-2 border-no bg-sheet p-4"
    >
      <h2 id="error-summary-title">{title}</h2>
      <ul className="mt-2 list-disc space-y-1 pl-5">
        {errors.map(({ fieldId, message }) => (
          <li key={`${fieldId}${message}`}>
            {fieldId ? (
              <a
                href={`#${fieldId}`}
                onClick={() => document.getElementById(fieldId)?.focus()}
                className="text-no underline"
              >
                {message}
              </a>
            ) : (
              message
            )}
          </li>
        ))}
      </ul>
    </div>
  )
}
