import type { EmailChange, MeChange, PasswordChange } from '#shared/schemas/accounts'
import { findUniqueViolation } from '../../db/errors'
import type { Actor } from '../../lib/actor'
import { recordAudit } from '../../lib/audit'
import { AppError, createInvalidError } from '../../lib/errors'
import { forgetKeysOf } from '../idempotency/idempotency.service'
import { forgetLettersOf, queueLetter } from '../mail/mail.service'
import type { AccountContext } from './account-context'
import {
  writeEmailChangeLetter,
  writeEmailChangeNotice,
  writeGoodbyeLetter,
  writeKnownLetter,
  writePasswordChangedLetter,
} from './account-letters'
import { countOtherAdmins, erasePerson, getPerson, getPersonByEmail, updatePerson } from './accounts.queries'
import { checkOwnPassword, isLive, type LivePerson } from './check-own-password'
import { judgePassword } from './judge-password'
import { mayWriteTo } from './letter-allowance'
import { isNameTaken, nameTaken } from './names'
import { hashPassword } from './passwords'
import { deleteSessionsOf } from './sessions.queries'
import { issueToken } from './tokens'
import { deleteTokensOf } from './tokens.queries'

const about = (id: number) => ({ actorId: id, subjectType: 'person', subjectId: id })

export async function getMe({ db }: AccountContext, { id }: Actor): Promise<LivePerson> {
  const person = await getPerson(db, id)
  if (!isLive(person)) throw new AppError('unauthenticated', 'Sign in to do this.')
  return person
}

export async function changeMe(context: AccountContext, actor: Actor, change: MeChange): Promise<void> {
  const { db, now } = context
  const { name, wantsNotices } = change
  const isRenamed = name !== undefined && name.toLowerCase() !== actor.name.toLowerCase()
  if (isRenamed && (await isNameTaken(db, name, { email: actor.email, now: now() })))
    throw createInvalidError([nameTaken])
  const store = db.transaction(async (tx) => {
    await updatePerson(tx, actor.id, {
      ...(name !== undefined && { name }),
      ...(wantsNotices !== undefined && { wantsNotices }),
    })
    await recordAudit(tx, { ...about(actor.id), action: 'person.change', detail: { fields: Object.keys(change) } })
  })
  await store.catch((error: unknown) => {
    throw findUniqueViolation(error) === null ? error : createInvalidError([nameTaken])
  })
}

/** Writes to the new address, which counts once it is confirmed, and tells the old one. */
export async function changeEmail(context: AccountContext, actor: Actor, change: EmailChange): Promise<void> {
  const { db, origin, now } = context
  const person = await checkOwnPassword(context, actor.id, change.password)
  if (change.email.toLowerCase() === person.email.toLowerCase()) {
    throw createInvalidError([{ pointer: '#/email', detail: 'is your address already' }])
  }
  if (!(await mayWriteTo(context, change.email))) return
  const holder = await getPersonByEmail(db, change.email)
  await db.transaction(async (tx) => {
    const to = { personId: null, recipient: change.email }
    if (holder === null) {
      const of = { personId: actor.id, purpose: 'change-email', email: change.email, now: now() } as const
      const url = `${origin}/confirm?token=${await issueToken(tx, of)}`
      await queueLetter(tx, writeEmailChangeLetter(to, person.name, url))
    } else await queueLetter(tx, writeKnownLetter(to, holder.name ?? '', origin))
    const old = { personId: actor.id, recipient: person.email }
    await queueLetter(tx, writeEmailChangeNotice(old, person.name, origin))
    await recordAudit(tx, { ...about(actor.id), action: 'person.ask-email' })
  })
}

/** Sets a new password; the other sessions end unless they are to stay. */
export async function changePassword(
  context: AccountContext,
  actor: Actor,
  { password, newPassword, endOthers }: PasswordChange,
  sessionPublicId: string,
): Promise<void> {
  const person = await checkOwnPassword(context, actor.id, password)
  const weakness = await judgePassword(newPassword, person)
  if (weakness !== null) throw createInvalidError([{ pointer: '#/newPassword', detail: weakness }])
  const passwordHash = await hashPassword(newPassword)
  await context.db.transaction(async (tx) => {
    await updatePerson(tx, actor.id, { passwordHash })
    if (endOthers) await deleteSessionsOf(tx, actor.id, sessionPublicId)
    const to = { personId: actor.id, recipient: person.email }
    await queueLetter(tx, writePasswordChangedLetter(to, person.name, context.origin))
    await recordAudit(tx, { ...about(actor.id), action: 'person.change-password', detail: { endOthers } })
  })
}

/** Takes away all that names the person. What they contributed stays, under "a former member". */
export async function deleteMe(context: AccountContext, actor: Actor, password: string): Promise<void> {
  const person = await checkOwnPassword(context, actor.id, password)
  await context.db.transaction(async (tx) => {
    if (person.role === 'admin' && (await countOtherAdmins(tx, actor.id)) === 0) {
      throw new AppError('conflict', 'You are the only admin: make somebody else one first. Nothing was deleted.')
    }
    await deleteSessionsOf(tx, actor.id)
    await deleteTokensOf(tx, actor.id)
    await forgetKeysOf(tx, actor.id)
    await forgetLettersOf(tx, actor.id, person.email)
    await erasePerson(tx, actor.id, context.now())
    await queueLetter(tx, writeGoodbyeLetter(person.email))
    await recordAudit(tx, { ...about(actor.id), action: 'person.delete' })
  })
}
