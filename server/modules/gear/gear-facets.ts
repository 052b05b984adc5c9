import { getKind, isKindKey, kindKeys, type KindKey } from '#shared/kinds/index'
import type { Facet } from '#shared/schemas/gear'
import { listFilterable, type FilterableAttribute, type OptionValue } from '#shared/schemas/gear-filters'
import type { CatalogueEntry } from '../catalogue/build-snapshot'

export type Facets = Record<string, Facet>

/** Counts one attribute as entries come by. */
interface Counter {
  readonly key: string
  readonly add: (entry: CatalogueEntry) => void
  readonly finish: () => Facet
}

/** A catalogue has thousands of brands; a page has room for some. */
const mostOptions = 100

function countMeasure(attribute: FilterableAttribute & { type: 'measure' }): Counter {
  const { key, label, unit } = attribute
  let [min, max, known, unknown] = [Infinity, -Infinity, 0, 0]
  return {
    key,
    add: ({ piece }) => {
      const value = piece.specs[key]?.value
      if (typeof value !== 'number') {
        unknown += 1
        return
      }
      known += 1
      if (value < min) min = value
      if (value > max) max = value
    },
    finish: () => {
      const isKnown = known > 0
      return { type: 'measure', label, unit, min: isKnown ? min : null, max: isKnown ? max : null, known, unknown }
    },
  }
}

type Read = (entry: CatalogueEntry) => readonly OptionValue[]

/** `labels` says which values there can be, in order; without it they are listed as found, most frequent first. */
function countOptions(key: string, label: string, read: Read, labels?: ReadonlyMap<OptionValue, string>): Counter {
  const counts = new Map<OptionValue, number>([...(labels?.keys() ?? [])].map((value) => [value, 0]))
  let [known, unknown] = [0, 0]
  return {
    key,
    add: (entry) => {
      const values = read(entry)
      if (values.length === 0) unknown += 1
      else known += 1
      for (const value of values) counts.set(value, (counts.get(value) ?? 0) + 1)
    },
    finish: () => {
      const all = [...counts].map(([value, count]) => ({ value, label: labels?.get(value) ?? String(value), count }))
      const sorted =
        labels === undefined ? all.toSorted((a, b) => b.count - a.count || (a.label < b.label ? -1 : 1)) : all
      const listed = sorted.slice(0, mostOptions)
      return { type: 'options', label, counts: listed, more: sorted.length - listed.length, known, unknown }
    },
  }
}

function countAttribute(attribute: FilterableAttribute): Counter {
  if (attribute.type === 'measure') return countMeasure(attribute)
  const { key, label } = attribute
  const read: Read = ({ piece }) => {
    const value = piece.specs[key]?.value
    return value === undefined ? [] : ([] as OptionValue[]).concat(value as OptionValue | OptionValue[])
  }
  if (attribute.type === 'boolean') {
    const labels = [true, false].map((value) => [value, value ? 'yes' : 'no'] as const)
    return countOptions(key, label, read, new Map<OptionValue, string>(labels))
  }
  const toValue = (value: string) => (attribute.numeric ? Number(value) : value)
  return countOptions(
    key,
    label,
    read,
    new Map(attribute.options.map((option) => [toValue(option.value), option.label])),
  )
}

const statusLabels = new Map<OptionValue, string>([
  ['current', 'in production'],
  ['discontinued', 'discontinued'],
  ['unknown', 'not known'],
])

const kindLabels = new Map<OptionValue, string>(kindKeys.map((key) => [key, getKind(key).plural]))

function createCounters(kind: KindKey | undefined): Counter[] {
  const ofKind =
    kind === undefined
      ? [countOptions('kind', 'kind', (entry) => (isKindKey(entry.kind) ? [entry.kind] : []), kindLabels)]
      : listFilterable(kind).map(countAttribute)
  return [
    countOptions('brand', 'brand', ({ gear }) => [gear.brand]),
    countOptions('status', 'status', ({ status }) => [status], statusLabels),
    ...ofKind,
  ]
}

export interface Sifted {
  readonly passed: readonly CatalogueEntry[]
  readonly facets: Facets
  /** How many would pass without each one of the filters. */
  readonly without: ReadonlyMap<string, number>
}

export interface Test {
  readonly key: string
  readonly passes: (entry: CatalogueEntry) => boolean
}

/** What passes every test, and the facets: each counts what passes all tests but its own. In one walk. */
export function siftEntries(
  kind: KindKey | undefined,
  entries: readonly CatalogueEntry[],
  tests: readonly Test[],
): Sifted {
  const counters = createCounters(kind)
  const counterByKey = new Map(counters.map((counter) => [counter.key, counter]))
  const passed: CatalogueEntry[] = []
  const without = new Map(tests.map(({ key }) => [key, 0]))
  for (const entry of entries) {
    const failed = tests.filter(({ passes }) => !passes(entry))
    const [only] = failed
    if (only === undefined) {
      passed.push(entry)
      for (const counter of counters) counter.add(entry)
    } else if (failed.length === 1) {
      counterByKey.get(only.key)?.add(entry)
      without.set(only.key, (without.get(only.key) ?? 0) + 1)
    }
  }
  for (const [key, count] of without) without.set(key, count + passed.length)
  return { passed, without, facets: Object.fromEntries(counters.map(({ key, finish }) => [key, finish()])) }
}
