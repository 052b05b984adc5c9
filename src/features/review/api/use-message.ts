import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useApp } from '../../../lib/app-context'
import { createKey } from '../../../lib/create-key'
import { proposalPath, proposalQuery } from './get-proposal'

/** Words to the author that decide nothing. */
export function useMessage(id: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (words: string) =>
      api.send('POST', `${proposalPath(id)}/messages`, { words }, { idempotencyKey: createKey() }),
    onSuccess: () => queryClient.invalidateQueries({ queryKey: proposalQuery(api, id).queryKey }),
  })
}
