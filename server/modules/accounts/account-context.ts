import type { Database } from '../../db/database'
import { createCounter, type Counter } from '../limits/limits.service'

/** What everything about accounts is done with. */
export interface AccountContext {
  readonly db: Database
  /** What links in letters begin with. */
  readonly origin: string
  readonly now: () => Date
  /** Failed tries at one account's password, from wherever they come. */
  readonly failures: Counter
  /** Letters that were asked for to one address. */
  readonly letters: Counter
}

const hourMs = 60 * 60 * 1000

export function createAccountContext(db: Database, origin: string, now: () => Date = () => new Date()): AccountContext {
  return {
    db,
    origin,
    now,
    failures: createCounter(db, 'failed-passwords', hourMs, now),
    letters: createCounter(db, 'letters', hourMs, now),
  }
}
