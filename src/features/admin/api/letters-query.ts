import { queryOptions } from '@tanstack/react-query'
import { letterListSchema, letterStatuses, type LetterItem } from '#shared/schemas/admin'
import type { ApiClient } from '../../../lib/api-client'

export type LetterStatus = LetterItem['status']

export interface LetterFilters {
  readonly status: LetterStatus
  readonly cursor?: string
}

export function readLetterFilters(search: URLSearchParams): LetterFilters {
  const status = letterStatuses.find((known) => known === search.get('status')) ?? 'dead'
  const cursor = search.get('cursor')
  return { status, ...(cursor !== null && cursor !== '' && { cursor }) }
}

export const lettersKey = ['admin', 'letters'] as const

export const lettersQuery = (api: ApiClient, filters: LetterFilters) =>
  queryOptions({
    queryKey: [...lettersKey, filters],
    queryFn: async ({ signal }) =>
      letterListSchema.parse(await api.get(`/admin/letters?${new URLSearchParams({ ...filters }).toString()}`, signal)),
  })
