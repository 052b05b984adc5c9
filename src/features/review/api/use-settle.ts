import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useApp } from '../../../lib/app-context'

export interface Settlement {
  readonly words: string
  /** Of a dispute: the revision whose value is used from then on. */
  readonly revision?: number
}

/** Settles a dispute or an error report for good. */
export function useSettle(pile: 'disputes' | 'reports', id: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (settlement: Settlement) => api.send('POST', `/${pile}/${encodeURIComponent(id)}/settle`, settlement),
    onSuccess: async () => {
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: ['review', pile] }),
        queryClient.invalidateQueries({ queryKey: ['gear'] }),
      ])
    },
  })
}
