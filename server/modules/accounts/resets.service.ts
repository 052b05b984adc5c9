import type { Reset } from '#shared/schemas/accounts'
import { recordAudit } from '../../lib/audit'
import { createInvalidError } from '../../lib/errors'
import { queueLetter } from '../mail/mail.service'
import type { AccountContext } from './account-context'
import { writePasswordChangedLetter, writeResetLetter } from './account-letters'
import { getPersonByEmail, lockPerson, updatePerson } from './accounts.queries'
import { isLive } from './check-own-password'
import { judgePassword } from './judge-password'
import { mayWriteTo } from './letter-allowance'
import { hashPassword } from './passwords'
import { deleteSessionsOf } from './sessions.queries'
import { issueToken, redeemToken } from './tokens'

/** Longer than either way takes, so that the time does not tell whether there is an account. */
const answerMs = 150

const wait = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds))

async function sendReset(context: AccountContext, email: string): Promise<void> {
  const mayWrite = await mayWriteTo(context, email)
  const person = await getPersonByEmail(context.db, email)
  if (!mayWrite || !isLive(person)) return
  await context.db.transaction(async (tx) => {
    const of = { personId: person.id, purpose: 'reset', email: person.email, now: context.now() } as const
    const url = `${context.origin}/reset?token=${await issueToken(tx, of)}`
    await queueLetter(tx, writeResetLetter({ personId: person.id, recipient: person.email }, person.name, url))
  })
}

/** Writes to the address if it has an account; the answer is the same if not. */
export async function askForReset(context: AccountContext, email: string): Promise<void> {
  await Promise.all([sendReset(context, email), wait(answerMs)])
}

/** Sets a new password by the link in a letter, which proves the address too, and ends every session. */
export async function resetPassword(context: AccountContext, { token, password }: Reset): Promise<void> {
  const { db, origin, now } = context
  const passwordHash = await hashPassword(password)
  const email = await db.transaction(async (tx) => {
    const { personId } = await redeemToken(tx, token, ['reset'], now())
    const person = await lockPerson(tx, personId)
    if (!isLive(person)) throw createInvalidError([{ pointer: '#/token', detail: 'is for an account that is gone' }])
    const weakness = await judgePassword(password, person)
    if (weakness !== null) throw createInvalidError([{ pointer: '#/password', detail: weakness }])
    await updatePerson(tx, personId, { passwordHash, emailConfirmedAt: person.emailConfirmedAt ?? now() })
    await deleteSessionsOf(tx, personId)
    const to = { personId, recipient: person.email }
    await queueLetter(tx, writePasswordChangedLetter(to, person.name, origin))
    await recordAudit(tx, {
      actorId: personId,
      action: 'person.reset-password',
      subjectType: 'person',
      subjectId: personId,
    })
    return person.email
  })
  await context.failures.clear(email.toLowerCase())
}
