import { AppError } from '../../lib/errors'
import type { AccountContext } from './account-context'

/** Enough for somebody who mistypes and waits badly; the rest would only fill a stranger's letterbox. */
const allowance = { sent: 3, asked: 10 } as const

/**
 * Whether one more letter goes to an address this hour. What is asked for over and over is refused, whether the address
 * has an account or not, so the refusal tells nothing either.
 */
export async function mayWriteTo({ letters }: AccountContext, email: string): Promise<boolean> {
  const { hits, resetsAt } = await letters.add(email.toLowerCase())
  if (hits > allowance.asked) {
    throw new AppError(
      'too-many-requests',
      'Letters to this address were asked for many times. Look through what has arrived, or try again in an hour.',
      [],
      { retryAt: resetsAt },
    )
  }
  return hits <= allowance.sent
}
