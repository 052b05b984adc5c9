import type { Attribute, FieldAttribute, GroupAttribute } from '#shared/kinds/types'
import { readLinkValue, spellUnit } from '#shared/schemas/setup-link-values'
import { readMeasure } from '#shared/units/read'
import type { UnitSystem } from '#shared/units/systems'
import { checkField } from '../../../components/setup/check-field'
import type { TypedSpec } from './typed-form'

type Entry = Readonly<Record<string, string>>

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

/** What is on record, and how that reads when typed: a text that stays keeps the number that it was printed from. */
export interface Recorded {
  readonly typed: TypedSpec
  readonly value: unknown
}

const isObject = (value: unknown): value is Record<string, unknown> => typeof value === 'object' && value !== null

/** The value on record of a field of an entry whose text is as it was; undefined where it was typed. */
function findKept(entry: Entry, at: number, key: string, recorded: Recorded | undefined): unknown {
  if (!recorded) return undefined
  const { entries } = recorded.typed
  const earlier = entry['id'] === undefined ? at : entries.findIndex(({ id }) => id === entry['id'])
  const text = entries[earlier]?.[key]
  if (text === undefined || text.trim() !== (entry[key] ?? '').trim()) return undefined
  const values: readonly unknown[] = Array.isArray(recorded.value) ? recorded.value : [recorded.value]
  const value = values[earlier]
  return isObject(value) ? value[key] : undefined
}

const isEmpty = (entry: Entry): boolean =>
  Object.entries(entry).every(([key, text]) => key === 'id' || text.trim() === '')

/** Other things refer to an entry by its id: one that has none takes the next that is free. */
function findId(entry: Entry, key: string, taken: ReadonlySet<unknown>): string {
  if (entry['id'] !== undefined && entry['id'] !== '') return entry['id']
  const stem = key.replace(/s$/, '')
  for (let number = 1; ; number++) if (!taken.has(`${stem}-${number}`)) return `${stem}-${number}`
}

function readGroup(
  group: GroupAttribute,
  entries: readonly Entry[],
  recorded: Recorded | undefined,
  system: UnitSystem,
): ReadSpec {
  const path = `specs.${group.key}.entries`
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
      const kept = findKept(entry, at, field.key, recorded)
      const read =
        kept === undefined ? readField(field, entry[field.key] ?? '', place, system) : { value: kept, problems: [] }
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
export function readSpec(
  attribute: Attribute,
  spec: TypedSpec,
  system: UnitSystem,
  recorded: Recorded | undefined,
): ReadSpec {
  return attribute.type === 'group'
    ? readGroup(attribute, spec.entries, recorded, system)
    : readField(attribute, spec.text, `specs.${attribute.key}.text`, system)
}

/** A ± is a difference: 1 °C of it is 1.8 °F, not 33.8. */
export function readPlusMinus(attribute: Attribute, text: string, system: UnitSystem): number | string | undefined {
  if (attribute.type !== 'measure' || text.trim() === '') return undefined
  const typed = text.trim().replace(/^(±|\+\/-)\s*/, '')
  const reading = readMeasure(typed, attribute.unit === 'C' ? 'K' : attribute.unit, system)
  return reading.ok ? reading.value : reading.reason
}
