import { getAttribute, getKind, type KindKey } from '#shared/kinds/index'
import type { FieldError } from '../../../components/ui/error-summary'
import { capitalise } from '../../../lib/capitalise'
import type { ApiError } from '../../../lib/problem'

/** Id of the control that holds a part of the form: `specs.lengthMm.text` is `specs-lengthMm-text`. */
export const fieldIdOf = (path: string): string => path.replaceAll('.', '-')

export interface FoundError {
  readonly path: string
  readonly message: string
}

/** Every message in a tree of errors, with its path. */
export function flattenErrors(errors: unknown, path: readonly string[] = []): FoundError[] {
  if (typeof errors !== 'object' || errors === null) return []
  if ('message' in errors && typeof errors.message === 'string' && 'type' in errors)
    return [{ path: path.join('.'), message: errors.message }]
  return Object.entries(errors).flatMap(([key, inner]) => (key === 'ref' ? [] : flattenErrors(inner, [...path, key])))
}

const backingKeys = new Set(['plusMinus', 'evidence', 'date', 'source'])

function mapValuePointer(kind: KindKey, [key = '', part, ...rest]: readonly string[]): string {
  const attribute = getAttribute(kind, key)
  if (part !== undefined && backingKeys.has(part)) return `specs.${key}.${part}`
  if (attribute?.type !== 'group') return `specs.${key}.text`
  const inside = attribute.many ? rest : ['0', ...rest]
  return inside.length > 1 ? `specs.${key}.entries.${inside.join('.')}` : `specs.${key}.entries`
}

/** The part of the form that a pointer of the API names; null where no field stands for it. */
export function mapPointer(kind: KindKey, pointer: string): string | null {
  const [root, ...rest] = pointer.replace(/^#\//, '').split('/')
  if (root === 'values' && rest.length > 0) return mapValuePointer(kind, rest)
  if (root === 'identity' && rest[0] !== undefined) return `identity.${rest[0]}`
  return root === 'summary' ? 'summary' : null
}

const labelPath = (kind: KindKey, path: string): string => {
  const [root, key = '', , , field] = path.split('.')
  if (root === 'identity') return key
  const attribute = getAttribute(kind, key)
  const inner = attribute?.type === 'group' ? attribute.fields.find((one) => one.key === field) : undefined
  return (inner ?? attribute)?.label ?? ''
}

/** Details of the API begin in the middle of a sentence: "must be a number". */
const toSentence = (detail: string): string => {
  const whole = /^(must|is|has|are) /.test(detail) ? `This ${detail}` : capitalise(detail)
  return whole.endsWith('.') ? whole : `${whole}.`
}

/** What the API refused, at the fields that it named. */
export function readRefusal(
  kind: KindKey,
  { errors, message }: ApiError,
): readonly (FoundError | { message: string })[] {
  if (errors.length === 0) return [{ message }]
  return errors.map(({ pointer, detail }) => {
    const path = mapPointer(kind, pointer)
    return path === null ? { message: toSentence(detail) } : { path, message: toSentence(detail) }
  })
}

/** In the order of the page, each beginning with the field that it is about. */
export function summarise(kind: KindKey, errors: readonly FoundError[]): readonly FieldError[] {
  const order = ['identity', ...getKind(kind).attributes.map(({ key }) => `specs.${key}`)]
  const rank = ({ path }: FoundError) => {
    const at = order.findIndex((start) => path === start || path.startsWith(`${start}.`))
    return at === -1 ? order.length : at
  }
  return errors
    .toSorted((a, b) => rank(a) - rank(b))
    .map(({ path, message }) => {
      const label = labelPath(kind, path)
      return { fieldId: fieldIdOf(path), message: label === '' ? message : `${capitalise(label)}: ${message}` }
    })
}
