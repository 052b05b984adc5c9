/** Every address of a page, in one place. */
export const paths = {
  home: '/',
  find: '/find',
  method: '/method',
  gear: (slug: string) => `/gear/${encodeURIComponent(slug)}`,
} as const
