import type { SignIn } from '#shared/schemas/accounts'
import { AppError } from '../../lib/errors'
import type { AccountContext } from './account-context'
import { getPersonByEmail, updatePerson, type PersonRow } from './accounts.queries'
import { isLive, type LivePerson } from './check-own-password'
import { createDeviceMark, isKnownDevice } from './known-device'
import { hashPassword, isHashWeak, isPasswordRight, pretendToCheck } from './passwords'

/** NIST SP 800-63B, 3.2.2, asks for no more than 100 failures in a row on one account. */
const failuresPerHour = 100

const refusal =
  'This e-mail address and password do not go together. If you have just signed up, open the link in our letter first.'

/**
 * Strangers' failures, from however many addresses, close an account to strangers only: a browser that its owner has
 * signed in with before is counted by itself.
 */
function nameFailures(person: PersonRow | null, email: string, device: string | null): string {
  const isKnown = isLive(person) && isKnownDevice(device, person.passwordHash)
  return isKnown ? `known ${device} ${email.toLowerCase()}` : email.toLowerCase()
}

async function checkFailures({ failures }: AccountContext, key: string): Promise<void> {
  const { hits, resetsAt } = await failures.read(key)
  if (hits < failuresPerHour) return
  throw new AppError(
    'too-many-requests',
    'Signing in with this address has failed too often. Try again later, or ask for a new password: that opens it at once.',
    [],
    { retryAt: resetsAt },
  )
}

/** The same answer after the same time, whether it was the address or the password. */
async function isRight(person: PersonRow | null, password: string): Promise<boolean> {
  if (isLive(person)) {
    return (await isPasswordRight(person.passwordHash, password)) && person.emailConfirmedAt !== null
  }
  await pretendToCheck(password)
  return false
}

function refuseSuspended({ suspendedAt, suspendedReason }: PersonRow): void {
  if (suspendedAt === null) return
  const reason = suspendedReason ?? 'no reason is given'
  throw new AppError('forbidden', `This account is suspended: ${reason} What you contributed is kept.`)
}

async function strengthenHash({ db }: AccountContext, person: LivePerson, password: string): Promise<string> {
  if (!isHashWeak(person.passwordHash)) return person.passwordHash
  const passwordHash = await hashPassword(password)
  await updatePerson(db, person.id, { passwordHash })
  return passwordHash
}

export interface ProvenPerson {
  readonly personId: number
  /** For the browser to keep. */
  readonly device: string
}

/** Answers whom the password proves. */
export async function checkSignIn(
  context: AccountContext,
  { email, password }: SignIn,
  device: string | null,
): Promise<ProvenPerson> {
  const person = await getPersonByEmail(context.db, email)
  const key = nameFailures(person, email, device)
  await checkFailures(context, key)
  if (!(await isRight(person, password)) || !isLive(person)) {
    await context.failures.add(key)
    throw new AppError('unauthenticated', refusal)
  }
  refuseSuspended(person)
  const passwordHash = await strengthenHash(context, person, password)
  return { personId: person.id, device: createDeviceMark(passwordHash) }
}
