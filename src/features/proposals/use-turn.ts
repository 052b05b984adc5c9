import { useState } from 'react'
import { useMutation, useQueryClient } from '@tanstack/react-query'
import { createKey } from '../../lib/create-key'
import { useApp } from '../../lib/app-context'
import { toApiError } from '../../lib/problem'
import { pathOf, proposalQuery, readTagged, type TaggedProposal } from './api/proposal-query'

/** What its author can do with a proposal besides amending it. */
export type Turn =
  { readonly kind: 'submit' } | { readonly kind: 'withdraw' } | { readonly kind: 'say'; readonly words: string }

/** Does a turn and shows the proposal as it stands afterwards; where somebody was quicker, as it stands now. */
export function useTurn({ proposal, etag }: TaggedProposal) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  const [key, setKey] = useState(createKey)
  const { queryKey } = proposalQuery(api, proposal.id)
  const { mutate, error, isPending, variables } = useMutation({
    mutationFn: async (turn: Turn) => {
      const path = pathOf(proposal.id)
      if (turn.kind === 'say')
        return readTagged(await api.send('POST', `${path}/messages`, { words: turn.words }, { idempotencyKey: key }))
      return readTagged(await api.send('POST', `${path}/${turn.kind}`, {}, { ifMatch: etag }))
    },
    onSuccess: (next) => {
      setKey(createKey())
      queryClient.setQueryData(queryKey, next)
      void queryClient.invalidateQueries({ queryKey: ['proposals', 'mine'] })
    },
    onError: (failure) => {
      if (toApiError(failure).status === 412) void queryClient.invalidateQueries({ queryKey })
    },
  })
  return { take: mutate, failure: error && toApiError(error), isPending, turn: variables?.kind }
}
