import { z } from 'zod'
import { limits } from '../limits'
import { roles } from './accounts'

const momentSchema = z.string()

/** What everybody may see of a person. */
export const personSchema = z.object({
  name: z.string(),
  role: z.enum(roles),
  since: momentSchema,
  isDemo: z.boolean(),
  /** Revisions that were accepted, and what was measured in them. */
  accepted: z.object({ revisions: z.number().int(), pieces: z.number().int(), measured: z.number().int() }),
  /** The newest measurements that were accepted. */
  recent: z.array(
    z.object({
      gear: z.object({ slug: z.string(), kind: z.string(), brand: z.string(), model: z.string() }),
      key: z.string(),
      value: z.unknown(),
      plusMinus: z.number().nullable(),
      revision: z.number().int(),
      at: momentSchema,
    }),
  ),
  can: z.object({ administer: z.boolean() }),
})

export const adminPersonSchema = z.object({
  name: z.string(),
  email: z.string(),
  role: z.enum(roles),
  since: momentSchema,
  isConfirmed: z.boolean(),
  isDemo: z.boolean(),
  acceptedRevisions: z.number().int(),
  suspended: z.object({ since: momentSchema, reason: z.string() }).nullable(),
  can: z.object({ changeRole: z.boolean(), suspend: z.boolean() }),
})

export const adminPeopleSchema = z.object({ items: z.array(adminPersonSchema), next: z.string().nullable() })

export const adminPeopleQuerySchema = z.strictObject({
  /** Part of a name or of an e-mail address. */
  q: z.string().trim().max(limits.email, `is longer than ${limits.email} characters`).optional(),
  role: z.enum(roles, { error: 'must be member, moderator or admin' }).optional(),
  standing: z.enum(['suspended'], { error: 'must be suspended' }).optional(),
  cursor: z.string().max(limits.cursor, 'is no cursor of ours').optional(),
})

export const personChangeSchema = z
  .strictObject({
    role: z.enum(roles, { error: 'must be member, moderator or admin' }).optional(),
    /** Null lifts a suspension. */
    suspended: z
      .strictObject({
        reason: z
          .string({ error: 'is missing' })
          .trim()
          .min(1, 'is missing: the person is told it')
          .max(limits.reason, `is longer than ${limits.reason} characters`),
      })
      .nullable()
      .optional(),
  })
  .refine((change) => Object.keys(change).length > 0, 'names nothing to change')

export type Person = z.infer<typeof personSchema>
export type AdminPerson = z.infer<typeof adminPersonSchema>
export type AdminPeople = z.infer<typeof adminPeopleSchema>
export type AdminPeopleQuery = z.infer<typeof adminPeopleQuerySchema>
export type PersonChange = z.infer<typeof personChangeSchema>
