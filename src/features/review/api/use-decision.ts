import { useMutation, useQueryClient } from '@tanstack/react-query'
import type { DecisionRequest } from '#shared/schemas/review'
import { useApp } from '../../../lib/app-context'
import { proposalPath } from './get-proposal'

export interface Decided {
  readonly request: DecisionRequest
  /** Of the version that was looked at. */
  readonly etag: string
}

/** Decides about the version that was read. Everything that may look different afterwards is read anew. */
export function useDecision(id: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: ({ request, etag }: Decided) =>
      api.send('POST', `${proposalPath(id)}/decision`, request, { ifMatch: etag }),
    onSettled: async () => {
      await Promise.all([
        queryClient.invalidateQueries({ queryKey: ['review'] }),
        queryClient.invalidateQueries({ queryKey: ['gear'] }),
      ])
    },
  })
}
