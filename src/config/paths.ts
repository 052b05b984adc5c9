/** Every address of a page, in one place. */
export const paths = {
  home: '/',
  find: '/find',
  method: '/method',
  gearList: '/gear',
  gear: (slug: string) => `/gear/${encodeURIComponent(slug)}`,
  setupNew: '/setups/new',
  /** A setup that lives in its address alone. */
  setup: '/setups/link',
  swap: (itemId: string) => `/setups/link/swap/${encodeURIComponent(itemId)}`,
  measuringSheet: '/setups/measuring-sheet',
  worksheets: '/worksheets',
  worksheet: (name: string) => `/worksheets/${encodeURIComponent(name)}`,
  review: '/review',
  reviewProposal: (id: string) => `/review/${encodeURIComponent(id)}`,
  disputes: '/review/disputes',
  reports: '/review/reports',
  revertPerson: (name: string) => `/admin/people/${encodeURIComponent(name)}/revert`,
  /** Comes back to `next` afterwards. */
  signIn: (next: string) => `/sign-in?next=${encodeURIComponent(next)}`,
  gearNew: '/gear/new',
  gearEdit: (slug: string) => `/gear/${encodeURIComponent(slug)}/edit`,
  proposals: '/proposals',
  proposal: (id: string) => `/proposals/${encodeURIComponent(id)}`,
  gearHistory: (slug: string) => `/gear/${encodeURIComponent(slug)}/history`,
} as const
