import type { SignUp } from '#shared/schemas/accounts'
import type { Database } from '../../db/database'
import { findUniqueViolation } from '../../db/errors'
import { recordAudit } from '../../lib/audit'
import { createInvalidError } from '../../lib/errors'
import { queueLetter } from '../mail/mail.service'
import type { AccountContext } from './account-context'
import { writeConfirmLetter, writeKnownLetter } from './account-letters'
import { erasePerson, getPersonByEmail, getPersonByName, insertPerson, updatePerson } from './accounts.queries'
import { judgePassword } from './judge-password'
import { mayWriteTo } from './letter-allowance'
import { isLapsed, isNameTaken, isPending, nameTaken } from './names'
import { hashPassword } from './passwords'
import { issueToken, redeemToken } from './tokens'

async function checkSignUp({ db, now }: AccountContext, input: SignUp): Promise<void> {
  const weakness = await judgePassword(input.password, input)
  const isTaken = await isNameTaken(db, input.name, { email: input.email, now: now() })
  const issues = [
    ...(isTaken ? [nameTaken] : []),
    ...(weakness === null ? [] : [{ pointer: '#/password', detail: weakness }]),
  ]
  if (issues.length > 0) throw createInvalidError(issues)
}

async function freeName(tx: Database, name: string, email: string, now: Date): Promise<void> {
  const holder = await getPersonByName(tx, name)
  const isOthers = holder !== null && holder.email?.toLowerCase() !== email.toLowerCase()
  if (isOthers && isLapsed(holder, now)) await erasePerson(tx, holder.id, now)
}

/** The newest sign-up of an unconfirmed address counts: whoever opens its letter decides which password that was. */
async function keepPending(tx: Database, input: SignUp, passwordHash: string, now: Date): Promise<number> {
  const pending = await getPersonByEmail(tx, input.email)
  const person = { name: input.name, email: input.email, passwordHash, createdAt: now }
  if (pending === null) return insertPerson(tx, person)
  await updatePerson(tx, pending.id, person)
  return pending.id
}

async function keepSignUp(context: AccountContext, input: SignUp, passwordHash: string): Promise<void> {
  const { db, origin } = context
  const now = context.now()
  const mayWrite = await mayWriteTo(context, input.email)
  await db.transaction(async (tx) => {
    const known = await getPersonByEmail(tx, input.email)
    const to = { personId: null, recipient: input.email }
    if (known !== null && !isPending(known)) {
      if (mayWrite) await queueLetter(tx, writeKnownLetter(to, known.name ?? '', origin))
      return
    }
    await freeName(tx, input.name, input.email, now)
    const personId = await keepPending(tx, input, passwordHash, now)
    const token = await issueToken(tx, { personId, purpose: 'confirm', email: input.email, now })
    const url = `${origin}/confirm?token=${token}`
    if (mayWrite) await queueLetter(tx, writeConfirmLetter({ ...to, personId }, input.name, url))
    await recordAudit(tx, { actorId: personId, action: 'person.sign-up', subjectType: 'person', subjectId: personId })
  })
}

/** Keeps a new account until its letter is opened. A known address is told so by letter alone: the answer is the same. */
export async function signUp(context: AccountContext, input: SignUp): Promise<void> {
  await checkSignUp(context, input)
  const passwordHash = await hashPassword(input.password)
  await keepSignUp(context, input, passwordHash).catch((error: unknown) => {
    const constraint = findUniqueViolation(error)
    if (constraint === 'people_name_key') throw createInvalidError([nameTaken])
    // Twice at the same moment: the other one is kept, and has written the letter.
    if (constraint !== 'people_email_key') throw error
  })
}

/** What a confirmed address now stands for. */
export type Confirmed = 'account' | 'email'

/** Confirms the address that a letter went to. */
export async function confirmAddress({ db, now }: AccountContext, token: string): Promise<Confirmed> {
  const confirm = db.transaction(async (tx) => {
    const { personId, purpose, email } = await redeemToken(tx, token, ['confirm', 'change-email'], now())
    await updatePerson(tx, personId, { email, emailConfirmedAt: now() })
    const action = purpose === 'confirm' ? 'person.confirm' : 'person.change-email'
    await recordAudit(tx, { actorId: personId, action, subjectType: 'person', subjectId: personId })
    return purpose === 'confirm' ? ('account' as const) : ('email' as const)
  })
  return confirm.catch((error: unknown) => {
    if (findUniqueViolation(error) === null) throw error
    throw createInvalidError([
      { pointer: '#/token', detail: 'is for an address that has an account of its own by now' },
    ])
  })
}
