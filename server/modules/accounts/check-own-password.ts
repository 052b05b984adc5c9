import { AppError } from '../../lib/errors'
import type { AccountContext } from './account-context'
import { getPerson, type PersonRow } from './accounts.queries'
import { isPasswordRight } from './passwords'

export type LivePerson = PersonRow & { readonly name: string; readonly email: string; readonly passwordHash: string }

export function isLive(person: PersonRow | null): person is LivePerson {
  return person !== null && person.name !== null && person.email !== null && person.passwordHash !== null
}

const failuresPerHour = 20

/** Asks somebody who is signed in for the password once more, before what a borrowed session must not do. */
export async function checkOwnPassword(
  { db, failures }: AccountContext,
  personId: number,
  password: string,
): Promise<LivePerson> {
  const person = await getPerson(db, personId)
  if (!isLive(person)) throw new AppError('unauthenticated', 'Sign in to do this.')
  const key = `own ${personId}`
  const { hits, resetsAt } = await failures.read(key)
  if (hits >= failuresPerHour) {
    const detail = `The password was wrong ${failuresPerHour} times. Nothing was changed; try again later.`
    throw new AppError('too-many-requests', detail, [], { retryAt: resetsAt })
  }
  if (await isPasswordRight(person.passwordHash, password)) return person
  await failures.add(key)
  throw new AppError('forbidden', 'That is not your present password. Nothing was changed.', [
    { pointer: '#/password', detail: 'is not your present password' },
  ])
}
