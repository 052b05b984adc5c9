import { createHash, randomBytes } from 'node:crypto'
import type { Database } from '../../db/database'
import { recordAudit } from '../../lib/audit'
import { AppError } from '../../lib/errors'
import { deleteLettersTo, deleteOldLetters, insertLetter, requeueStranded, type NewLetter } from './outbox.queries'
import { composeLetter } from './templates/compose-letter'
import type { LetterContent } from './templates/letter-content'
import { findNoticeAddress, insertUnsubscribeToken, stopNotices } from './unsubscribe.queries'

/** Writes a letter in the transaction of what it tells of: both are kept, or neither. A worker sends it. */
export async function queueLetter(db: Database, letter: NewLetter): Promise<void> {
  await insertLetter(db, letter)
}

export interface Notice {
  readonly personId: number
  /** What it tells of, such as `proposal.sent-back`. */
  readonly kind: string
  readonly content: LetterContent
  /** What its links begin with. */
  readonly origin: string
}

const hashToken = (token: string): string => createHash('sha256').update(token).digest('hex')

/** Tells a person of something, unless they want no notices; it can be unsubscribed from in one click. */
export async function queueNotice(db: Database, { personId, kind, content, origin }: Notice): Promise<void> {
  const recipient = await findNoticeAddress(db, personId)
  if (recipient === null) return
  const token = randomBytes(24).toString('base64url')
  await insertUnsubscribeToken(db, personId, recipient, hashToken(token))
  const letter = composeLetter(content, { unsubscribePageUrl: `${origin}/unsubscribe?token=${token}` })
  const unsubscribeUrl = `${origin}/api/v1/unsubscribe?token=${token}`
  await insertLetter(db, { personId, recipient, kind, unsubscribeUrl, ...letter })
}

export async function unsubscribe(db: Database, token: string, requestId: string): Promise<void> {
  await db.transaction(async (tx) => {
    const personId = await stopNotices(tx, hashToken(token))
    if (personId === null) {
      const ways = 'Notices can also be turned off on your account page.'
      throw new AppError('not-found', `This link is not one that we sent, or it is more than a year old. ${ways}`)
    }
    const event = { action: 'person.unsubscribe', subjectType: 'person', subjectId: personId }
    await recordAudit(tx, { actorId: personId, ...event, requestId })
  })
}

/** Takes away every letter to somebody who leaves. */
export const forgetLettersOf = deleteLettersTo

/** Forgets letters that have had their time, and gives those that wait without a job another; says how many. */
export async function sweepLetters(db: Database): Promise<number> {
  await deleteOldLetters(db)
  return requeueStranded(db)
}
