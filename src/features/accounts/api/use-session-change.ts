import { useNavigate } from 'react-router-dom'
import { useApp } from '../../../lib/app-context'
import { sessionQuery } from '../../../lib/session'

/** After somebody signed in or out: what was fetched for the one before is forgotten, and the page goes on. */
export function useSessionChange(): (next: string) => Promise<void> {
  const { api, queryClient } = useApp()
  const navigate = useNavigate()
  // What the page at hand still shows is forgotten once it is left.
  const forget = () =>
    queryClient.removeQueries({ type: 'inactive', predicate: ({ queryKey }) => queryKey[0] !== 'session' })
  return async (next) => {
    await queryClient.fetchQuery({ ...sessionQuery(api), staleTime: 0 })
    forget()
    await navigate(next)
    forget()
  }
}
