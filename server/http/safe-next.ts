/** A path on this site, or the start page: `//evil`, `/\evil` and full addresses lead nowhere else. */
export function readSafeNext(next: unknown): string {
  if (typeof next !== 'string' || !next.startsWith('/')) return '/'
  const base = 'http://here.invalid'
  try {
    const url = new URL(next, base)
    const path = `${url.pathname}${url.search}${url.hash}`
    return url.origin === base && !path.startsWith('//') ? path : '/'
  } catch {
    return '/'
  }
}
