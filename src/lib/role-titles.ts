import type { Role } from '#shared/kinds/types'

/** What an attribute is there for, as a heading over those that share it. */
export const roleTitles: Readonly<Record<Role, string>> = {
  check: 'What decides whether it fits',
  difference: 'What is compared when it replaces another',
  display: 'Also recorded',
}
