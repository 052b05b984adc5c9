import { z } from 'zod'
import { limits } from '../limits'
import { countTextSchema, cursorSchema } from './gear-requests'

const momentError = 'must be a day such as 2026-05-31, or a moment such as 2026-05-31T12:00:00Z'

/** A day counts from its first moment. */
const fromSchema = z
  .union([z.iso.date(), z.iso.datetime({ offset: true })], { error: momentError })
  .transform((text) => new Date(text))

/** A day counts to its last moment. */
const toSchema = z
  .union([z.iso.date().transform((text) => `${text}T23:59:59.999Z`), z.iso.datetime({ offset: true })], {
    error: momentError,
  })
  .transform((text) => new Date(text))

const wordSchema = z.string().trim().max(limits.searchText, `must be at most ${limits.searchText} characters`)

export const auditQuerySchema = z.strictObject({
  /** Name of a person, or `system`. */
  actor: wordSchema.optional(),
  /** Whole, such as `proposal.approve`, or its beginning, such as `proposal`. */
  action: wordSchema.optional(),
  /** A type such as `proposal`, or one subject such as `proposal:` and its id. */
  subject: wordSchema.optional(),
  from: fromSchema.optional(),
  to: toSchema.optional(),
  limit: countTextSchema(limits.pageMax).default(50),
  cursor: cursorSchema.optional(),
})

export const auditEventSchema = z.object({
  id: z.number().int(),
  at: z.string(),
  /** Null: the system itself, or somebody without an account. */
  actor: z.string().nullable(),
  action: z.string(),
  subject: z.object({ type: z.string(), id: z.string() }),
  detail: z.record(z.string(), z.unknown()),
  requestId: z.string().nullable(),
})

export const auditListSchema = z.object({ items: z.array(auditEventSchema), next: z.string().nullable() })

export const letterStatuses = ['waiting', 'sent', 'dead'] as const

export const letterQuerySchema = z.strictObject({
  status: z.enum(letterStatuses, { error: `must be one of ${letterStatuses.join(', ')}` }).default('dead'),
  limit: countTextSchema(limits.pageMax).default(50),
  cursor: cursorSchema.optional(),
})

/** A letter without its words: they may hold what signs somebody in. */
export const letterSchema = z.object({
  id: z.uuid(),
  recipient: z.string(),
  kind: z.string(),
  subject: z.string(),
  status: z.enum(letterStatuses),
  attempts: z.number().int(),
  lastError: z.string().nullable(),
  createdAt: z.string(),
  sentAt: z.string().nullable(),
  can: z.object({ retry: z.boolean() }),
})

export const letterListSchema = z.object({
  items: z.array(letterSchema),
  next: z.string().nullable(),
  counts: z.object({ waiting: z.number().int(), sent: z.number().int(), dead: z.number().int() }),
  /** Since when the letter waits that has waited longest. */
  oldestWaiting: z.string().nullable(),
})

export const receivedLetterSchema = z.object({
  receivedAt: z.string(),
  messageId: z.string(),
  from: z.string(),
  to: z.string(),
  subject: z.string(),
  text: z.string(),
  html: z.string(),
  unsubscribeUrl: z.string().nullable(),
})

export const mailroomSchema = z.object({ items: z.array(receivedLetterSchema) })

export const unsubscribeQuerySchema = z.strictObject({
  token: z.string({ error: 'is missing: use the link in the letter' }).min(1).max(200),
})

export type AuditQuery = z.infer<typeof auditQuerySchema>
export type AuditEventItem = z.infer<typeof auditEventSchema>
export type AuditList = z.infer<typeof auditListSchema>
export type LetterItem = z.infer<typeof letterSchema>
export type LetterList = z.infer<typeof letterListSchema>
export type LetterQuery = z.infer<typeof letterQuerySchema>
export type Mailroom = z.infer<typeof mailroomSchema>
export type ReceivedLetter = z.infer<typeof receivedLetterSchema>
