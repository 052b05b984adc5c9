import { isAdmin, type Actor } from '../../lib/actor'

/** Letters name addresses: they are for those who answer for the site. */
export const canManageLetters = (actor: Actor | null): boolean => isAdmin(actor)

export const canRetry = (letter: { readonly status: string }): boolean => letter.status === 'dead'
