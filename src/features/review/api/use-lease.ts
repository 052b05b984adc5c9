import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useApp } from '../../../lib/app-context'
import { queueKey } from './get-queue'
import { proposalPath, proposalQuery } from './get-proposal'

/** Holds a proposal for oneself, or lets it go. Whatever came of it, the proposal is read anew. */
export function useLease(id: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (wanted: 'take' | 'release') =>
      api.send(wanted === 'take' ? 'POST' : 'DELETE', `${proposalPath(id)}/lease`),
    onSettled: async () => {
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: proposalQuery(api, id).queryKey }),
        queryClient.invalidateQueries({ queryKey: queueKey }),
      ])
    },
  })
}
