import type { Filter } from '#shared/engine/ask/types'
import { getAttribute, type KindKey } from '#shared/kinds/index'
import type { Filters } from '#shared/schemas/filters'
import { readGearFilters, type GearFilter } from '#shared/schemas/gear-filters'
import type { LinkProblem } from '#shared/schemas/setup-link'
import { writeRange } from '../../../lib/ranges'

/** What the piece itself should be, by attribute key, each as the list of gear spells its filters: `50..150`. */
export type Wishes = Readonly<Record<string, string>>

const prefix = 'wish.'
/** Which kind a form was made for: another kind has other attributes. */
export const madeForKey = 'of'

export function readWishes(params: URLSearchParams, kind: KindKey): Wishes {
  const madeFor = params.get(madeForKey)
  if (madeFor !== null && madeFor !== kind) return {}
  const own = [...params].filter(([key, text]) => key.startsWith(prefix) && text.trim() !== '')
  return Object.fromEntries(own.map(([key, text]) => [key.slice(prefix.length), text.trim()]))
}

export const listWishEntries = (wishes: Wishes): readonly (readonly [string, string])[] =>
  Object.entries(wishes).map(([key, text]) => [`${prefix}${key}`, text])

function writeFilter(filter: Filter): string {
  if (typeof filter !== 'object') return String(filter)
  const [from, to] = filter
  return writeRange({ from, to })
}

/** The wishes of a question that was read. */
export const toWishes = (filters: Readonly<Record<string, Filter>>): Wishes =>
  Object.fromEntries(Object.entries(filters).map(([key, filter]) => [key, writeFilter(filter)]))

function toFilter(filter: GearFilter): Filters[string] | null {
  if (filter.type === 'range') return [filter.from, filter.to]
  if (filter.type === 'unknown' || filter.values.length !== 1) return null
  const [value = ''] = filter.values
  return typeof value === 'number' ? String(value) : value
}

/** The wishes as the API takes them, and those that it could not take, with why. */
export function resolveWishes(kind: KindKey, wishes: Wishes): { filters: Filters; problems: readonly LinkProblem[] } {
  const { filters, issues } = readGearFilters(kind, wishes)
  const toProblem = (key: string, detail: string): LinkProblem => ({
    path: `the wish for its ${getAttribute(kind, key)?.label ?? `“${key}”`}`,
    text: wishes[key] ?? '',
    detail,
  })
  const read = filters.map((filter) => ({ key: filter.key, value: toFilter(filter) }))
  const isOwn = ({ key }: { readonly key: string }) => key !== 'brand' && key !== 'status'
  return {
    filters: Object.fromEntries(
      read
        .filter(isOwn)
        .flatMap(({ key, value }): [string, Filters[string]][] => (value === null ? [] : [[key, value]])),
    ),
    problems: [
      ...issues.map(({ key, detail }) => toProblem(key, detail)),
      ...read.filter(isOwn).flatMap(({ key, value }) => (value === null ? toProblem(key, 'must be one value') : [])),
      ...read.flatMap((wish) => (isOwn(wish) ? [] : toProblem(wish.key, 'is no measure of the piece'))),
    ],
  }
}
