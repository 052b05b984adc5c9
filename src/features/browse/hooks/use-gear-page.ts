import { useQuery } from '@tanstack/react-query'
import { useApp } from '../../../lib/app-context'
import { gearPageQuery } from '../api/gear-list'
import type { BrowseState } from '../link/browse-state'

/** One page of the list; while another of the same kind is on its way, the earlier one stays. */
export function useGearPage(state: BrowseState) {
  const { api } = useApp()
  const { data, error, isPlaceholderData, refetch } = useQuery({
    ...gearPageQuery(api, state),
    placeholderData: (earlier, query) => (query?.queryKey[1] === state.kind ? earlier : undefined),
  })
  return { page: data, error, isStale: isPlaceholderData, retry: () => void refetch() }
}
