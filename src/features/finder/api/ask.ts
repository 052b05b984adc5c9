import { queryOptions } from '@tanstack/react-query'
import type { AskAnswer } from '#shared/schemas/ask'
import type { UnitSystem } from '#shared/units/systems'
import type { ApiClient } from '../../../lib/api-client'

async function fetchReading(
  api: ApiClient,
  request: { readonly text: string; readonly units: UnitSystem },
  signal: AbortSignal,
): Promise<AskAnswer> {
  const [answer, { questionSchema }] = await Promise.all([
    api.post('/ask', request, signal),
    import('#shared/schemas/ask'),
  ])
  return questionSchema.parse(answer)
}

/** A question read with the names of the catalogue at hand. */
export const readingQuery = (api: ApiClient, text: string, units: UnitSystem) =>
  queryOptions({
    queryKey: ['ask', text, units],
    queryFn: ({ signal }) => fetchReading(api, { text, units }, signal),
  })
