import type { Database } from '../../db/database'
import { insertLetter, type NewLetter } from './outbox.queries'

/** Writes a letter in the transaction of what it tells of: both are kept, or neither. A worker sends it. */
export async function queueLetter(db: Database, letter: NewLetter): Promise<void> {
  await insertLetter(db, letter)
}
