import { z } from 'zod'
import { limits } from '../limits'

export const roles = ['member', 'moderator', 'admin'] as const

const emailSchema = z
  .string({ error: 'is missing' })
  .trim()
  .min(1, 'is missing')
  .max(limits.email, `is longer than ${limits.email} characters`)
  .regex(
    /^[^\s@<>"(),:;\\[\]]+@[^\s@<>"(),:;\\[\]]+\.[^\s@<>"(),:;\\[\]]+$/,
    'is not an e-mail address such as you@example.org',
  )

/** A password as it is typed to prove who one is: whatever it was when it was chosen. */
const givenPasswordSchema = z
  .string({ error: 'is missing' })
  .min(1, 'is missing')
  .max(limits.password, `is longer than ${limits.password} characters`)

export const signInSchema = z.strictObject({ email: emailSchema, password: givenPasswordSchema })

/** Who is signed in, and what this person may do; `person` is null for a visitor. */
export const sessionSchema = z.object({
  person: z
    .object({
      name: z.string(),
      role: z.enum(roles),
      email: z.string(),
      isConfirmed: z.boolean(),
      can: z.object({ contribute: z.boolean(), review: z.boolean(), administer: z.boolean() }),
    })
    .nullable(),
})

export type SignIn = z.infer<typeof signInSchema>
export type SessionAnswer = z.infer<typeof sessionSchema>
export type SignedIn = NonNullable<SessionAnswer['person']>
