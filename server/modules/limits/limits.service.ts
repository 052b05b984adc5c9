import { createHash } from 'node:crypto'
import type { Database } from '../../db/database'
import { addHit, deleteCount, deletePastCounts, getCount, takeHit, type RateCount } from './limits.queries'

export type { RateCount }

/** Counts that every process sees, each over a window of its own. */
export interface Counter {
  readonly add: (key: string) => Promise<RateCount>
  /** How many there are in the window that runs, without one more. */
  readonly read: (key: string) => Promise<RateCount>
  readonly takeBack: (key: string) => Promise<void>
  readonly clear: (key: string) => Promise<void>
}

/** What is counted may name a person or an address, so only its hash is kept. */
function nameCount(name: string, key: string): string {
  return `${name}:${createHash('sha256').update(key).digest('base64url').slice(0, 32)}`
}

export function createCounter(
  db: Database,
  name: string,
  windowMs: number,
  now: () => Date = () => new Date(),
): Counter {
  return {
    async add(key) {
      const count = await addHit(db, nameCount(name, key), now(), windowMs)
      if (count.hits === 1) await deletePastCounts(db, now())
      return count
    },
    async read(key) {
      const count = await getCount(db, nameCount(name, key))
      const isRunning = count !== null && count.resetsAt > now()
      return isRunning ? count : { hits: 0, resetsAt: new Date(now().getTime() + windowMs) }
    },
    takeBack: (key) => takeHit(db, nameCount(name, key)),
    clear: (key) => deleteCount(db, nameCount(name, key)),
  }
}
