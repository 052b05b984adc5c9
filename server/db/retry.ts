import type { Database } from './database'
import { walkCauses } from './errors'

/** Two transactions that wait for each other, or that saw a state which no order of them gives: run again, one wins. */
const collisionCodes = new Set(['40P01', '40001'])
const mostTries = 4

function isCollision(error: unknown): boolean {
  for (const { code } of walkCauses(error)) if (typeof code === 'string' && collisionCodes.has(code)) return true
  return false
}

const wait = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds))

/** A transaction, run anew where PostgreSQL gave it up for another's sake. `work` may run several times. */
export async function runTransaction<T>(db: Database, work: (tx: Database) => Promise<T>): Promise<T> {
  for (let attempt = 1; ; attempt += 1) {
    try {
      return await db.transaction(work)
    } catch (error) {
      if (attempt === mostTries || !isCollision(error)) throw error
      await wait(attempt * 20 * (0.5 + Math.random()))
    }
  }
}
