/** A path on this site, or the start page: `//elsewhere` and full addresses lead nowhere. */
export function readNext(next: string | null): string {
  if (next?.startsWith('/') !== true) return '/'
  const base = 'http://here.invalid'
  if (!URL.canParse(next, base)) return '/'
  const { origin, pathname, search, hash } = new URL(next, base)
  const path = `${pathname}${search}${hash}`
  return origin === base && !path.startsWith('//') ? path : '/'
}
