import type { Database } from '../../db/database'
import { AppError } from '../../lib/errors'
import {
  deleteKeysOf,
  deleteOldKeys,
  deleteUnansweredKey,
  getKey,
  insertKey,
  takeAbandonedKey,
  updateAnswer,
  type KeyOfPerson,
  type StoredAnswer,
} from './idempotency.queries'

export type { KeyOfPerson, StoredAnswer }

/** A request is cut off well before this, so a key still without an answer belongs to a process that is gone. */
const abandonedAfterMs = 60_000
const keptMs = 3 * 24 * 60 * 60 * 1000

/** Claims a key for a request. Answers what it was answered with before, or null: then it is to be done now. */
export async function claimKey(db: Database, of: KeyOfPerson, requestHash: string): Promise<StoredAnswer | null> {
  await deleteOldKeys(db, of.personId, new Date(Date.now() - keptMs))
  if (await insertKey(db, of, requestHash)) return null
  const row = await getKey(db, of)
  // Let go between the two looks: whoever comes now is first.
  if (row === null) return claimKey(db, of, requestHash)
  if (row.requestHash !== requestHash) {
    throw new AppError('invalid', 'This Idempotency-Key came with another request. Use a new one for a new request.')
  }
  if (row.status !== null) return { status: row.status, headers: row.headers ?? {}, body: row.body ?? '' }
  if (await takeAbandonedKey(db, of, new Date(Date.now() - abandonedAfterMs))) return null
  throw new AppError('conflict', 'The same request is still on its way. Send it again in a moment for its answer.')
}

export const keepAnswer = updateAnswer

/** Lets go of a key whose request changed nothing: it may be sent again, mended. */
export const releaseKey = deleteUnansweredKey

/** Takes away all keys of somebody, with the answers that they keep. */
export const forgetKeysOf = deleteKeysOf
