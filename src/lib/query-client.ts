import { QueryClient } from '@tanstack/react-query'
import { isAway } from './problem'

const recheckMs = 5_000

/** While the server is away a query asks again by itself, until it answers. */
export const recheckWhileAway = (query: { readonly state: { readonly error: unknown } }): number | false =>
  isAway(query.state.error) ? recheckMs : false

/** What was rendered on the server counts as fresh, so that hydrating asks for nothing twice. */
export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: {
        staleTime: 60_000,
        gcTime: 10 * 60_000,
        retry: false,
        refetchOnWindowFocus: false,
        refetchInterval: recheckWhileAway,
      },
    },
  })
}
