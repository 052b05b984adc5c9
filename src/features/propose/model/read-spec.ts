import type { Attribute, FieldAttribute, GroupAttribute } from '#shared/kinds/types'
import { readLinkValue, spellUnit } from '#shared/schemas/setup-link-values'
import { readMeasure } from '#shared/units/read'
import type { UnitSystem } from '#shared/units/systems'
import { checkField } from '../../../components/setup/check-field'
import type { TypedSpec } from './typed-form'

export interface Problem {
  /** Dotted, inside the form: `specs.lengthMm.text`. */
  readonly path: string
  readonly message: string
}

export interface ReadSpec {
  /** Undefined where nothing was said; what cannot be read is among the problems. */
  readonly value: unknown
  readonly raw?: string
  readonly problems: readonly Problem[]
  /** Of a list: where each entry of the value stands among those typed. */
  readonly places?: readonly number[]
}

function readField(attribute: FieldAttribute, typed: string, path: string, system: UnitSystem): ReadSpec {
  const text = typed.trim()
  if (text === '') return { value: undefined, problems: [] }
  const message = checkField(text, attribute, system)
  if (message !== undefined) return { value: undefined, problems: [{ path, message }] }
  const read = readLinkValue(text, attribute, system, system)
  if (!read.ok) return { value: undefined, problems: [{ path, message: read.detail }] }
  const raw = attribute.type === 'measure' ? spellUnit(text, attribute, system) : undefined
  return { value: read.value, problems: [], ...(raw !== undefined && { raw }) }
}

const isEmpty = (entry: Readonly<Record<string, string>>): boolean =>
  Object.entries(entry).every(([key, text]) => key === 'id' || text.trim() === '')

/** Other things refer to an entry by its id: one that has none takes the next that is free. */
function findId(entry: Readonly<Record<string, string>>, key: string, taken: ReadonlySet<unknown>): string {
  if (entry['id'] !== undefined && entry['id'] !== '') return entry['id']
  const stem = key.replace(/s$/, '')
  for (let number = 1; ; number++) if (!taken.has(`${stem}-${number}`)) return `${stem}-${number}`
}

function readGroup(group: GroupAttribute, entries: TypedSpec['entries'], path: string, system: UnitSystem): ReadSpec {
  const problems: Problem[] = []
  const hasId = group.fields.some(({ key }) => key === 'id')
  const taken = new Set<unknown>(entries.map((entry) => entry['id']))
  const places = entries.flatMap((entry, at) => (isEmpty(entry) ? [] : [at]))
  const values = places.map((at) => {
    const entry = entries[at] ?? {}
    const value: Record<string, unknown> = {}
    if (hasId) {
      value['id'] = findId(entry, group.key, taken)
      taken.add(value['id'])
    }
    for (const field of group.fields) {
      if (field.type === 'group' || field.key === 'id') continue
      const place = `${path}.${at}.${field.key}`
      const read = readField(field, entry[field.key] ?? '', place, system)
      problems.push(...read.problems)
      if (read.value !== undefined) value[field.key] = read.value
      else if (read.problems.length === 0 && group.required.includes(field.key))
        problems.push({ path: place, message: `Say the ${field.label} too, or empty the others.` })
    }
    return value
  })
  const value = group.many ? (values.length > 0 ? values : undefined) : values[0]
  return { value, problems, places }
}

/** What was typed for one attribute, in canonical units. */
export function readSpec(attribute: Attribute, spec: TypedSpec, system: UnitSystem): ReadSpec {
  const path = `specs.${attribute.key}`
  return attribute.type === 'group'
    ? readGroup(attribute, spec.entries, `${path}.entries`, system)
    : readField(attribute, spec.text, `${path}.text`, system)
}

/** A ± is a difference: 1 °C of it is 1.8 °F, not 33.8. */
export function readPlusMinus(attribute: Attribute, text: string, system: UnitSystem): number | string | undefined {
  if (attribute.type !== 'measure' || text.trim() === '') return undefined
  const typed = text.trim().replace(/^(±|\+\/-)\s*/, '')
  const reading = readMeasure(typed, attribute.unit === 'C' ? 'K' : attribute.unit, system)
  return reading.ok ? reading.value : reading.reason
}
