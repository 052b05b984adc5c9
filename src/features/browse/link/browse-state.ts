import type { KindKey } from '#shared/kinds/index'

export type Density = 'comfortable' | 'compact'

/** All of the catalogue page: what its address holds, and nothing else. */
export interface BrowseState {
  /** Null: every kind. */
  readonly kind: KindKey | null
  readonly q: string
  /** As the API spells them, canonical: `powerW` → `50..150`, `form` → `glass-rod,titanium-rod`. */
  readonly filters: Readonly<Record<string, string>>
  /** Null: by relevance where something is searched for, else by name. */
  readonly sort: string | null
  /** Null: those that the kind is shown with at first. */
  readonly columns: readonly string[] | null
  readonly density: Density
  /** Slugs, side by side. */
  readonly compare: readonly string[]
  /** Where the list goes on, and as which page that is told. */
  readonly from: { readonly cursor: string; readonly page: number } | null
}

export const mostCompared = 4

/** Keys of the page's own; none of them is an attribute of any kind. */
export const ownKeys = ['kind', 'q', 'sort', 'cols', 'density', 'compare', 'cursor', 'page'] as const

export const emptyState: BrowseState = {
  kind: null,
  q: '',
  filters: {},
  sort: null,
  columns: null,
  density: 'comfortable',
  compare: [],
  from: null,
}

// Commas and dots say in these addresses what they say in the API's; escaped they only make links hard to read.
const spell = (query: URLSearchParams): string => query.toString().replaceAll('%2C', ',')

function listPairs({ kind, q, filters, sort }: BrowseState): [string, string][] {
  const pairs: [string, string][] = []
  if (kind) pairs.push(['kind', kind])
  if (q) pairs.push(['q', q])
  pairs.push(...Object.entries(filters))
  if (sort) pairs.push(['sort', sort])
  return pairs
}

/** The one address of a state, without its path. */
export function writeBrowseState(state: BrowseState): string {
  const { columns, density, compare, from } = state
  const pairs = listPairs(state)
  if (columns) pairs.push(['cols', columns.join(',')])
  if (density === 'compact') pairs.push(['density', density])
  if (compare.length > 0) pairs.push(['compare', compare.join(',')])
  if (from) pairs.push(['cursor', from.cursor], ['page', String(from.page)])
  return spell(new URLSearchParams(pairs))
}

/** The question that the open API is asked for this page. */
export function writeApiQuery(state: BrowseState): string {
  const cursor: [string, string][] = state.from ? [['cursor', state.from.cursor]] : []
  return spell(new URLSearchParams([...listPairs(state), ...cursor]))
}

export function withoutFilter(state: BrowseState, key: string): BrowseState {
  if (key === 'q') return { ...state, q: '', sort: state.sort === 'relevance' ? null : state.sort, from: null }
  const { [key]: _, ...filters } = state.filters
  return { ...state, filters, from: null }
}

export function withComparison(state: BrowseState, slug: string, isWanted: boolean): BrowseState {
  const others = state.compare.filter((each) => each !== slug)
  return { ...state, compare: isWanted ? [...others, slug].slice(0, mostCompared) : others }
}

/** Up, then down, then as it was. */
export function nextSort(sort: string | null, key: string): string | null {
  if (sort === key) return `-${key}`
  return sort === `-${key}` ? null : key
}

/** Whether it is one of the few addresses that a search engine should know: a kind as it is first shown. */
export function isPlain({ q, filters, sort, columns, density, compare, from }: BrowseState): boolean {
  const narrowed = Object.keys(filters).length + compare.length
  return q === '' && narrowed === 0 && !sort && !columns && density === 'comfortable' && from === null
}
