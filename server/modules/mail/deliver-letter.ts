import type { Database } from '../../db/database'
import { queues } from '../../db/job-queue'
import type { Mailer } from '../../services/mail/mailer'
import { claimLetter, markFailed, markSent } from './outbox.queries'

const mostTries = queues.letters.retryLimit + 1
const longestError = 300

/** A mail server may repeat what it was told, the letter included. */
function describeError(error: unknown): string {
  const text = error instanceof Error ? error.message : String(error)
  return text.replace(/\s+/g, ' ').slice(0, longestError)
}

export interface Delivery {
  readonly db: Database
  readonly mailer: Mailer
  /** What the Message-ID ends with. */
  readonly domain: string
}

/**
 * Sends a letter that waits; one that was sent or given up is left alone, so a job that runs again does no harm. When
 * the process ends between sending and noting it, the letter goes out once more under the same Message-ID.
 */
export async function deliverLetter({ db, mailer, domain }: Delivery, id: string): Promise<void> {
  const letter = await claimLetter(db, id)
  if (letter === undefined) return
  try {
    await mailer.send({ ...letter, messageId: `${letter.id}@${domain}` })
  } catch (error) {
    const isLast = letter.attempts >= mostTries
    await markFailed(db, id, describeError(error), isLast)
    if (isLast) return
    throw error
  }
  await markSent(db, id)
}
