import { useMutation, useQueryClient } from '@tanstack/react-query'
import { letterSchema } from '#shared/schemas/admin'
import { useApp } from '../../../lib/app-context'
import { lettersKey } from './letters-query'

/** Gives a letter its tries again; whether it worked or somebody was quicker, the list is asked for anew. */
export function useRetryLetter(id: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: async () => letterSchema.parse(await api.post(`/admin/letters/${encodeURIComponent(id)}/retry`, {})),
    onSettled: () => queryClient.invalidateQueries({ queryKey: lettersKey }),
  })
}
