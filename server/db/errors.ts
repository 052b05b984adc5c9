/** Driver codes and PostgreSQL codes that mean "not now": unreachable, shutting down, out of connections, or too slow. */
const awayCodes = new Set([
  'ECONNREFUSED',
  'ECONNRESET',
  'ECONNABORTED',
  'ETIMEDOUT',
  'ENOTFOUND',
  'EAI_AGAIN',
  'EHOSTUNREACH',
  'ENETUNREACH',
  'EPIPE',
  '53100',
  '53200',
  '53300',
  '55P03',
  '57014',
  '57P01',
  '57P02',
  '57P03',
  '57P05',
  '25P03',
  '40001',
  '40P01',
])

/** node-postgres gives these without a code. */
const awayMessages = [
  'timeout exceeded when trying to connect',
  'Connection terminated',
  'Client has encountered a connection error',
  'Query read timeout',
  'Cannot use a pool after calling end on the pool',
]

/** Walks the causes, since drizzle wraps what the driver threw. */
export function* walkCauses(error: unknown): Generator<{ code?: unknown; message?: unknown; constraint?: unknown }> {
  let current = error
  for (let depth = 0; depth < 8 && typeof current === 'object' && current !== null; depth += 1) {
    yield current
    current = (current as { cause?: unknown }).cause
  }
}

function isAway(code: unknown, message: unknown): boolean {
  if (typeof code === 'string') return awayCodes.has(code) || code.startsWith('08')
  return typeof message === 'string' && awayMessages.some((start) => message.startsWith(start))
}

export function isDatabaseAway(error: unknown): boolean {
  for (const { code, message } of walkCauses(error)) if (isAway(code, message)) return true
  return false
}

/** The name of the unique constraint that a write ran into, if that is why it failed. */
export function findUniqueViolation(error: unknown): string | null {
  for (const { code, constraint } of walkCauses(error)) {
    if (code === '23505') return typeof constraint === 'string' ? constraint : 'unknown'
  }
  return null
}
