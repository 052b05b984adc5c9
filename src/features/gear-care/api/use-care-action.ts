import { useMutation, useQueryClient } from '@tanstack/react-query'
import { useApp } from '../../../lib/app-context'
import { piecePath } from './get-care'

export type CareAction =
  | { readonly action: 'merge'; readonly into: string; readonly words: string }
  | { readonly action: 'unmerge' | 'retire' | 'unretire'; readonly words: string }
  | { readonly action: 'restore'; readonly revision: number; readonly words: string; readonly seen: number }

/** `seen`: the newest revision that the person was shown; an older one than there is answers 412. */
function writeRequest(wanted: CareAction) {
  if (wanted.action === 'restore') {
    const { revision, words, seen } = wanted
    return { body: { revision, words }, options: { ifMatch: `"r${seen}"` } }
  }
  if (wanted.action === 'merge') return { body: { into: wanted.into, words: wanted.words }, options: {} }
  return { body: { words: wanted.words }, options: {} }
}

/** A moderator's acts on a piece. All that was read of any gear is read anew. */
export function useCareAction(slug: string) {
  const { api } = useApp()
  const queryClient = useQueryClient()
  return useMutation({
    mutationFn: (wanted: CareAction) => {
      const { body, options } = writeRequest(wanted)
      return api.send('POST', `${piecePath(slug)}/${wanted.action}`, body, options)
    },
    onSuccess: (_, { action }) => {
      // Its own page is another one now: what was read for it must not be shown once more.
      if (action !== 'restore') queryClient.removeQueries({ queryKey: ['gear', slug], exact: true })
      return queryClient.invalidateQueries({ queryKey: ['gear'] })
    },
  })
}
