import { useMutation, useQueryClient } from '@tanstack/react-query'
import { confirmationSchema } from '#shared/schemas/review'
import { createKey } from '../../../lib/create-key'
import { useApp } from '../../../lib/app-context'
import { gearQuery } from './get-gear'

export interface Confirmation {
  readonly key: string
  /** In the canonical unit. */
  readonly measured?: number
}

/** "Same number here": one more person found a value as it is recorded. */
export function useConfirmValue(slug: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  const { queryKey } = gearQuery(api, slug)
  return useMutation({
    mutationFn: async (confirmation: Confirmation) => {
      const path = `/gear/${encodeURIComponent(slug)}/confirmations`
      const { body } = await api.send('POST', path, confirmation, { idempotencyKey: createKey() })
      return confirmationSchema.parse(body)
    },
    onSuccess: ({ key, count }) => {
      queryClient.setQueryData(
        queryKey,
        (gear) => gear && { ...gear, confirmations: { ...gear.confirmations, [key]: count } },
      )
    },
  })
}
