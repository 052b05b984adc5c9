import { queryOptions } from '@tanstack/react-query'
import type { GearList } from '#shared/schemas/gear'
import type { ApiClient } from '../../../lib/api-client'
import { ApiError } from '../../../lib/problem'
import { writeApiQuery, type BrowseState } from '../link/browse-state'

export interface GearPage {
  readonly list: GearList
  /** The place in the list that the address named is gone: this is its beginning. */
  readonly isRestarted: boolean
}

const isStaleCursor = (error: unknown): boolean =>
  error instanceof ApiError && error.status === 422 && error.errors.some(({ pointer }) => pointer === '#/cursor')

async function fetchList(api: ApiClient, query: string, signal: AbortSignal): Promise<GearList> {
  const [answer, { gearListSchema }] = await Promise.all([
    api.get(`/gear?${query}`, signal),
    import('#shared/schemas/gear'),
  ])
  return gearListSchema.parse(answer)
}

async function fetchPage(api: ApiClient, state: BrowseState, signal: AbortSignal): Promise<GearPage> {
  try {
    return { list: await fetchList(api, writeApiQuery(state), signal), isRestarted: false }
  } catch (error) {
    if (state.from === null || !isStaleCursor(error)) throw error
    return { list: await fetchList(api, writeApiQuery({ ...state, from: null }), signal), isRestarted: true }
  }
}

/** One page of the catalogue, with how it spreads over each filter. */
export const gearPageQuery = (api: ApiClient, state: BrowseState) =>
  queryOptions({
    queryKey: ['gear-list', state.kind, writeApiQuery(state)] as const,
    queryFn: ({ signal }) => fetchPage(api, state, signal),
  })
