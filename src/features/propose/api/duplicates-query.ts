import { queryOptions } from '@tanstack/react-query'
import { duplicatesSchema, type Duplicates } from '#shared/schemas/review'
import type { KindKey } from '#shared/kinds/index'
import type { ApiClient } from '../../../lib/api-client'

export interface DuplicatesAsked {
  readonly kind: KindKey
  readonly brand: string
  readonly model: string
  readonly gtin: string
}

async function fetchDuplicates(api: ApiClient, asked: DuplicatesAsked, signal: AbortSignal): Promise<Duplicates> {
  const said = Object.entries(asked).filter(([, text]) => text !== '') as [string, string][]
  return duplicatesSchema.parse(await api.get(`/gear/duplicates?${new URLSearchParams(said).toString()}`, signal))
}

/** Pieces on record that may be the one that somebody is about to add. */
export const duplicatesQuery = (api: ApiClient, asked: DuplicatesAsked) =>
  queryOptions({
    queryKey: ['gear', 'duplicates', asked],
    queryFn: ({ signal }) => fetchDuplicates(api, asked, signal),
  })
