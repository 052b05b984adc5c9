import { getAttribute, getKind, type KindKey } from '../kinds/index'
import type { BooleanAttribute, ChoiceAttribute, MeasureAttribute, SetAttribute } from '../kinds/types'
import { gearStatuses } from './gear'

/** Attributes that the list of gear can be narrowed by; texts and groups are read on the piece's own page. */
export type FilterableAttribute = MeasureAttribute | ChoiceAttribute | SetAttribute | BooleanAttribute

export type OptionValue = string | number | boolean

/** Keeps pieces with a number from `from` to `to` (null: open), with one of the values, or whose value nobody knows yet. */
export type GearFilter =
  | { readonly key: string; readonly type: 'range'; readonly from: number | null; readonly to: number | null }
  | { readonly key: string; readonly type: 'options'; readonly values: readonly OptionValue[] }
  | { readonly key: string; readonly type: 'unknown' }

export interface FilterIssue {
  readonly key: string
  readonly detail: string
}

const unknownText = 'unknown'
const mostOptions = 40

export function listFilterable(kind: KindKey): readonly FilterableAttribute[] {
  return getKind(kind).attributes.filter(
    (attribute): attribute is FilterableAttribute =>
      attribute.type === 'measure' ||
      attribute.type === 'choice' ||
      attribute.type === 'set' ||
      attribute.type === 'boolean',
  )
}

const identityFilters = ['brand', 'status'] as const

function describeAllowed(kind: KindKey | undefined): string {
  if (kind === undefined) return `without a kind those are ${identityFilters.join(' and ')}`
  const keys = [...identityFilters, ...listFilterable(kind).map(({ key }) => key)]
  return `those of the kind ${kind} are ${keys.join(', ')}`
}

const rangePattern = /^(-?\d{1,12}(?:\.\d{1,9})?)?(\.\.)?(-?\d{1,12}(?:\.\d{1,9})?)?$/

function readRange({ key, unit }: MeasureAttribute, text: string): GearFilter | FilterIssue {
  if (text === unknownText) return { key, type: 'unknown' }
  const [, low, dots, high] = rangePattern.exec(text) ?? []
  if (low === undefined && high === undefined) {
    return { key, detail: `must be a range in ${unit} such as 50..150, 50.. or ..150, one number, or ${unknownText}` }
  }
  const from = low === undefined ? null : Number(low)
  const to = dots === undefined ? from : high === undefined ? null : Number(high)
  if (from !== null && to !== null && from > to) {
    return { key, detail: `can match nothing: its lower end, ${from}, is above its upper end, ${to}` }
  }
  return { key, type: 'range', from, to }
}

function readOptions(key: string, text: string, allowed: readonly string[]): GearFilter | FilterIssue {
  const parts = [...new Set(text.split(','))]
  const wrong = parts.filter((part) => !allowed.includes(part))
  if (wrong.length > 0) return { key, detail: `must be one or more of: ${allowed.join(', ')}` }
  return { key, type: 'options', values: parts }
}

function readAttribute(attribute: FilterableAttribute, text: string): GearFilter | FilterIssue {
  const { key } = attribute
  if (attribute.type === 'measure') return readRange(attribute, text)
  if (text === unknownText) return { key, type: 'unknown' }
  if (attribute.type === 'boolean') {
    const read = readOptions(key, text, ['true', 'false'])
    return 'detail' in read || read.type !== 'options'
      ? read
      : { ...read, values: read.values.map((value) => value === 'true') }
  }
  const read = readOptions(
    key,
    text,
    attribute.options.map(({ value }) => value),
  )
  if ('detail' in read || read.type !== 'options' || attribute.numeric !== true) return read
  return { ...read, values: read.values.map(Number) }
}

function readBrands(text: string): GearFilter | FilterIssue {
  const values = text.split(',').map((brand) => brand.trim())
  const isRight = values.length <= mostOptions && values.every((brand) => brand !== '')
  return isRight
    ? { key: 'brand', type: 'options', values }
    : { key: 'brand', detail: `must be one to ${mostOptions} brands, with commas between them` }
}

function readFilter(kind: KindKey | undefined, key: string, text: string): GearFilter | FilterIssue {
  if (key === 'brand') return readBrands(text)
  if (key === 'status') return readOptions(key, text, gearStatuses)
  const attribute = kind === undefined ? undefined : getAttribute(kind, key)
  const filterable = kind === undefined ? undefined : listFilterable(kind).find((each) => each === attribute)
  if (filterable !== undefined) return readAttribute(filterable, text)
  return { key, detail: `is not a filter; ${describeAllowed(kind)}` }
}

/** Reads `powerW=50..150&form=glass-rod,titanium-rod`, and says what is wrong with each key that cannot be read. */
export function readGearFilters(
  kind: KindKey | undefined,
  texts: Readonly<Record<string, string>>,
): { readonly filters: readonly GearFilter[]; readonly issues: readonly FilterIssue[] } {
  const read = Object.entries(texts).map(([key, text]) => readFilter(kind, key, text))
  return {
    filters: read.flatMap((each) => ('detail' in each ? [] : [each])),
    issues: read.flatMap((each) => ('detail' in each ? [each] : [])),
  }
}

const plainSorts = ['relevance', 'name', '-name', 'updated', '-updated'] as const

/** The orders of a kind's list: `-` turns one around; pieces without the value come last either way. */
export function listSorts(kind: KindKey | undefined): readonly string[] {
  const measures = kind === undefined ? [] : listFilterable(kind).filter(({ type }) => type === 'measure')
  return [...plainSorts, ...measures.flatMap(({ key }) => [key, `-${key}`])]
}
