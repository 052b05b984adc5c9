import { getKind } from '#shared/kinds/index'
import type { GearListQuery } from './gear-query'
import type { SearchResult } from './gear-search.service'

interface Loosened {
  readonly key: string
  readonly total: number
}

function describeFilters(loosen: readonly Loosened[]): string {
  const [best] = loosen
  if (best === undefined || best.total === 0) return 'No piece passes these filters, nor all but one of them.'
  return `No piece passes all of these filters. Without ${best.key} there would be ${best.total}.`
}

/** Why a list is empty, and what would fill it. */
export function describeEmpty(query: GearListQuery, result: SearchResult | null, loosen: readonly Loosened[]): string {
  const { kind, q } = query
  if (result !== null && result.search.tokens.length === 0) {
    return 'There is no letter or digit in what was typed, so there is nothing to look for.'
  }
  const isFound = result !== null && result.ids.length + result.rest.length > 0
  if (loosen.length > 0 && (result === null || isFound)) return describeFilters(loosen)
  if (q === undefined) return 'The catalogue has nothing of this kind yet.'
  const among = kind === undefined ? 'in the catalogue' : `among the ${getKind(kind).plural}`
  const advice =
    result !== null && result.search.code.length < 2
      ? 'Type a few more letters.'
      : 'Try fewer words, or a brand or model alone.'
  return `Nothing ${among} is called or described like that. ${advice}`
}

/** What was typed beside the words that were looked for, where that was cut short. */
export function describePassedOver(result: SearchResult | null): string | null {
  if (result === null || !result.search.isCut) return null
  return 'Only the first words of what was typed were looked for.'
}
