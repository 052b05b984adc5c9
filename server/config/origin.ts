import type { Env } from './env'

/** What links in letters begin with: never what a visitor sent as Host. */
export function getOwnOrigin({ PUBLIC_ORIGIN, HOST, PORT }: Pick<Env, 'PUBLIC_ORIGIN' | 'HOST' | 'PORT'>): string {
  if (PUBLIC_ORIGIN !== undefined) return PUBLIC_ORIGIN
  const reachable = HOST === '0.0.0.0' ? '127.0.0.1' : HOST === '::' ? '::1' : HOST
  return `http://${reachable.includes(':') ? `[${reachable}]` : reachable}:${PORT}`
}
