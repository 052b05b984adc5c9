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

/** A password being chosen: length is what counts, so nothing is asked of its composition. */
const newPasswordSchema = z
  .string({ error: 'is missing' })
  .max(limits.password, `is longer than ${limits.password} characters`)
  .refine(
    (password) => [...password.normalize('NFC')].length >= limits.passwordMin,
    `is shorter than ${limits.passwordMin} characters: a few words in a row are easy to keep in mind`,
  )

export const personNameSchema = z
  .string({ error: 'is missing' })
  .trim()
  .normalize()
  .min(2, 'is shorter than 2 characters')
  .max(limits.personName, `is longer than ${limits.personName} characters`)
  .regex(
    /^[\p{L}\p{N}][\p{L}\p{M}\p{N}]*(?:[ .'_-][\p{L}\p{M}\p{N}]+)*$/u,
    'takes letters and digits, with single spaces, dots, hyphens or apostrophes between them',
  )

const tokenSchema = z.string({ error: 'is missing' }).min(1, 'is missing').max(100, 'is not from one of our letters')

export const signUpSchema = z.strictObject({ name: personNameSchema, email: emailSchema, password: newPasswordSchema })
export const confirmSchema = z.strictObject({ token: tokenSchema })
export const resetRequestSchema = z.strictObject({ email: emailSchema })
export const resetSchema = z.strictObject({ token: tokenSchema, password: newPasswordSchema })
export const emailChangeSchema = z.strictObject({ email: emailSchema, password: givenPasswordSchema })
export const passwordChangeSchema = z.strictObject({
  password: givenPasswordSchema,
  newPassword: newPasswordSchema,
  /** End every session but this one. */
  endOthers: z.boolean({ error: 'must be true or false' }).default(true),
})
export const goodbyeSchema = z.strictObject({ password: givenPasswordSchema })
export const meChangeSchema = z
  .strictObject({
    name: personNameSchema.optional(),
    wantsNotices: z.boolean({ error: 'must be true or false' }).optional(),
  })
  .refine((change) => Object.keys(change).length > 0, 'names nothing to change')

/** The same whether an address has an account or not: the letter says which. */
export const letterSentSchema = z.object({ message: z.string() })
export const confirmedSchema = z.object({ message: z.string() })

/** One's own account, for oneself alone. */
export const meSchema = z.object({
  name: z.string(),
  email: z.string(),
  role: z.enum(roles),
  since: z.string(),
  wantsNotices: z.boolean(),
})

export const ownSessionsSchema = z.object({
  items: z.array(
    z.object({
      id: z.string(),
      startedAt: z.string(),
      seenAt: z.string(),
      endsAt: z.string(),
      /** What the browser said of itself at the start. */
      agent: z.string().nullable(),
      isThis: z.boolean(),
    }),
  ),
})

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
export type SignUp = z.infer<typeof signUpSchema>
export type Reset = z.infer<typeof resetSchema>
export type EmailChange = z.infer<typeof emailChangeSchema>
export type PasswordChange = z.infer<typeof passwordChangeSchema>
export type MeChange = z.infer<typeof meChangeSchema>
export type Me = z.infer<typeof meSchema>
export type OwnSessions = z.infer<typeof ownSessionsSchema>
