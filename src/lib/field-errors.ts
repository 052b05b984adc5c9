import type { FieldError } from '../components/ui/error-summary'
import type { ApiError } from './problem'

export interface FormFailure {
  readonly summary: readonly FieldError[]
  /** By the field's name: the same words beside it. */
  readonly byField: Readonly<Record<string, string>>
}

export const noFailure: FormFailure = { summary: [], byField: {} }

const sentence = (text: string): string => (/[.!?]$/.test(text) ? text : `${text}.`)

/** A refusal in the words of the form: each wrong field by its label, and what is about none of them as it came. */
export function toFormFailure(
  { errors, message }: ApiError,
  labels: Readonly<Record<string, string>>,
  fieldId: (name: string) => string,
): FormFailure {
  if (errors.length === 0) return { summary: [{ message }], byField: {} }
  const summary = errors.map(({ pointer, detail }): FieldError & { readonly name?: string } => {
    const name = pointer.replace(/^#\//, '').split('/')[0] ?? ''
    const label = labels[name]
    return label === undefined
      ? { message: sentence(`${name} ${detail}`) }
      : { name, fieldId: fieldId(name), message: sentence(`${label} ${detail}`) }
  })
  const byField = Object.fromEntries(summary.flatMap(({ name, message: text }) => (name ? [[name, text]] : [])))
  return { summary, byField }
}
