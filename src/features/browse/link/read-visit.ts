import { isKindKey, type KindKey } from '#shared/kinds/index'
import { limits } from '#shared/limits'
import { listFilterable, listSorts, readGearFilters } from '#shared/schemas/gear-filters'
import { createPrinter } from '#shared/units/print'
import type { UnitSystem } from '#shared/units/systems'
import { defaultColumns, listColumns } from '../model/columns'
import { mostCompared, ownKeys, writeBrowseState, type BrowseState } from './browse-state'
import { parseRange } from '../../../lib/ranges'
import { endKey, readRanges, type FilterProblem } from './read-ranges'

export interface Visit {
  readonly state: BrowseState
  /** What of the address could not be used, with its text kept. */
  readonly problems: readonly FilterProblem[]
  /** Set where the address should be spelt otherwise, as after a form was sent. */
  readonly redirect?: string
}

/** Which kind the form was made for: after another one is chosen, its filters mean nothing. */
const madeForKey = 'of'

const slugPattern = /^[a-z0-9]+(?:-[a-z0-9]+)*$/
const split = (text: string): string[] => [...new Set(text.split(',').filter(Boolean))]

/** Repeated keys are how a form sends several choices; an empty field says nothing. */
function gather(params: URLSearchParams): Map<string, string> {
  const gathered = new Map<string, string>()
  for (const key of new Set(params.keys())) {
    const texts = params.getAll(key)
    const isEnd = key.endsWith('.from') || key.endsWith('.to')
    const text = texts.filter((each) => each !== '').join(',')
    if (text !== '' || isEnd) gathered.set(key, text)
  }
  return gathered
}

function dropOtherKind(params: Map<string, string>, kind: KindKey | null): void {
  const madeFor = params.get(madeForKey)
  params.delete(madeForKey)
  if (madeFor === undefined || madeFor === (kind ?? '')) return
  const kept: readonly string[] = ['kind', 'q', 'brand', 'status', 'density']
  for (const key of params.keys()) if (!kept.includes(key)) params.delete(key)
}

function readQ(params: ReadonlyMap<string, string>): string {
  return (params.get('q') ?? '')
    .replace(/\p{Cc}/gu, ' ')
    .trim()
    .slice(0, limits.searchText)
    .trim()
}

function readColumns(kind: KindKey | null, text: string | undefined): readonly string[] | null {
  if (kind === null || text === undefined) return null
  const wanted = split(text)
  // In the order of the kind's attributes, whichever order they were ticked in.
  const columns = listColumns(kind).flatMap(({ key }) => (wanted.includes(key) ? [key] : []))
  const isDefault = columns.join() === defaultColumns(kind).join()
  return columns.length === 0 || isDefault ? null : columns
}

function readFrom(params: ReadonlyMap<string, string>): BrowseState['from'] {
  const cursor = params.get('cursor')
  if (cursor === undefined || cursor.length > limits.cursor) return null
  const page = params.get('page') ?? ''
  return { cursor, page: /^[1-9]\d{0,5}$/.test(page) ? Number(page) : 2 }
}

/** What the server would say, in the visitor's units where both ends of a range contradict each other. */
function explain(kind: KindKey | null, key: string, text: string, detail: string, system: UnitSystem): string {
  const attribute = kind === null ? undefined : listFilterable(kind).find((each) => each.key === key)
  const range = parseRange(text)
  if (attribute?.type !== 'measure' || range === null || range.from === null || range.to === null) return detail
  const [from, to] = createPrinter(system).apart(range.from, range.to, attribute.unit)
  return `nothing is at least ${from} and at most ${to} at once`
}

/** Reads an address of the catalogue. Never throws: whatever it holds, there is something to show. */
export function readVisit(params: URLSearchParams, system: UnitSystem): Visit {
  const gathered = gather(params)
  const kindText = gathered.get('kind') ?? ''
  const kind = isKindKey(kindText) ? kindText : null
  dropOtherKind(gathered, kind)
  const { entries, problems: typed } = readRanges(kind, gathered, system)

  const own: readonly string[] = ownKeys
  const texts = Object.fromEntries([...entries].filter(([key]) => !own.includes(key)))
  const { issues } = readGearFilters(kind ?? undefined, texts)
  const refused = new Set(issues.map(({ key }) => key))
  const filters = Object.fromEntries(Object.entries(texts).filter(([key]) => !refused.has(key)))

  const q = readQ(entries)
  const sort = entries.get('sort') ?? null
  const sorts = listSorts(kind ?? undefined).filter((each) => q !== '' || each !== 'relevance')
  const isSortRight = sort === null || sorts.includes(sort)
  const compare = split(entries.get('compare') ?? '').filter((slug) => slugPattern.test(slug))

  const state: BrowseState = {
    kind,
    q,
    filters,
    sort: isSortRight ? sort : null,
    columns: readColumns(kind, entries.get('cols')),
    density: entries.get('density') === 'compact' ? 'compact' : 'comfortable',
    compare: compare.slice(0, mostCompared),
    from: readFrom(entries),
  }
  const problems: FilterProblem[] = [
    ...(kindText !== '' && kind === null ? [{ key: 'kind', text: kindText, detail: 'is not a kind of gear' }] : []),
    ...typed,
    ...issues.map(({ key, detail }) => {
      const text = texts[key] ?? ''
      return { key, text, detail: explain(kind, key, text, detail, system) }
    }),
    ...(isSortRight || sort === null ? [] : [{ key: 'sort', text: sort, detail: 'is not an order of this list' }]),
    ...(compare.length > mostCompared
      ? [{ key: 'compare', text: String(compare.length), detail: `only the first ${mostCompared} are compared` }]
      : []),
  ]
  // What could not be used stays in the address, so that a reader finds it in its field.
  const kept = new URLSearchParams(
    problems
      .filter(({ key }) => key !== 'compare')
      .map(({ key, end, text }): [string, string] => [end ? endKey(key, end) : key, text]),
  ).toString()
  const address = [writeBrowseState({ ...state, compare }), kept].filter(Boolean).join('&')
  const spell = (query: string) => new URLSearchParams(query).toString()
  const isCanonical = spell(params.toString()) === spell(address)
  return { state, problems, ...(!isCanonical && { redirect: address }) }
}
