import type { SignIn } from '#shared/schemas/accounts'
import type { Database } from '../../db/database'
import { AppError } from '../../lib/errors'
import { getPersonByEmail, updatePasswordHash, type PersonRow } from './accounts.queries'
import { hashPassword, isHashWeak, isPasswordRight, pretendToCheck } from './passwords'

const refusal =
  'This e-mail address and password do not go together. If you have just signed up, open the link in our letter first.'

/** The same answer after the same time, whether it was the address or the password. */
async function checkPassword(person: PersonRow | null, password: string): Promise<PersonRow> {
  if (person === null || person.passwordHash === null) await pretendToCheck(password)
  else if ((await isPasswordRight(person.passwordHash, password)) && person.emailConfirmedAt !== null) return person
  throw new AppError('unauthenticated', refusal)
}

/** Answers whom the password proves. */
export async function checkSignIn(db: Database, { email, password }: SignIn): Promise<PersonRow> {
  const person = await checkPassword(await getPersonByEmail(db, email), password)
  if (person.suspendedAt !== null) {
    throw new AppError(
      'forbidden',
      `This account is suspended: ${person.suspendedReason ?? 'no reason is given'}. Your contributions are kept. Write to us if you think that is wrong.`,
    )
  }
  if (person.passwordHash !== null && isHashWeak(person.passwordHash)) {
    await updatePasswordHash(db, person.id, await hashPassword(password))
  }
  return person
}
