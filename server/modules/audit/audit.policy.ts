import { isAdmin, type Actor } from '../../lib/actor'

/** The trail tells who did what: it is for those who answer for the site. */
export const canReadAudit = (actor: Actor | null): boolean => isAdmin(actor)
