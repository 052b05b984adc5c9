/** Every address of a page, in one place. */
export const paths = {
  home: '/',
  find: '/find',
  method: '/method',
  gearList: '/gear',
  gear: (slug: string) => `/gear/${encodeURIComponent(slug)}`,
  gearHistory: (slug: string) => `/gear/${encodeURIComponent(slug)}/history`,
} as const
