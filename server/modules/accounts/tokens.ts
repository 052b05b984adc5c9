import { createHash, randomBytes } from 'node:crypto'
import type { Database } from '../../db/database'
import { createInvalidError } from '../../lib/errors'
import { insertToken, takeToken } from './tokens.queries'

const hour = 60 * 60 * 1000

const lifetimes = { confirm: 48 * hour, 'change-email': 48 * hour, reset: hour } as const

export type Purpose = keyof typeof lifetimes

const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex')

/** Answers a new token, of which only the hash is kept. */
export async function issueToken(
  db: Database,
  { personId, purpose, email, now }: { personId: number; purpose: Purpose; email: string; now: Date },
): Promise<string> {
  const token = randomBytes(32).toString('base64url')
  const expiresAt = new Date(now.getTime() + lifetimes[purpose])
  await insertToken(db, { tokenHash: hashToken(token), personId, purpose, email, createdAt: now, expiresAt })
  return token
}

/** Uses up a token, in the transaction of what it allows. Throws where it is unknown, used, too old, or for something else. */
export async function redeemToken(db: Database, token: string, purposes: readonly Purpose[], now: Date) {
  const row = await takeToken(db, hashToken(token), now)
  if (row === null || !purposes.some((purpose) => purpose === row.purpose)) {
    const detail = 'has been used already, is too old, or is not from one of our letters'
    throw createInvalidError([{ pointer: '#/token', detail }])
  }
  return row
}
