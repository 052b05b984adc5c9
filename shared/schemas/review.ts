import { z } from 'zod'
import { limits } from '../limits'
import { lineSchema, slugSchema, sourceOfValueSchema } from './gear'
import { cursorSchema, kindSchema } from './gear-requests'
import { leaseSchema } from './proposals'
import { ages, queueSorts, reasons, type ReasonCode } from './review-choices'
import { wordsSchema } from './text-fields'

export { reasons, type ReasonCode }

const decisionNames = ['approve', 'send-back', 'decline'] as const
const reasonCodes = [...Object.keys(reasons['send-back']), ...Object.keys(reasons.decline)] as [
  ReasonCode,
  ...ReasonCode[],
]

const fieldDecisionSchema = z
  .strictObject({
    decision: z.enum(['approve', 'decline'], { error: 'must be approve or decline' }),
    words: wordsSchema(limits.words).optional(),
  })
  .refine(({ decision, words }) => decision === 'approve' || words !== undefined, {
    path: ['words'],
    message: 'are needed to decline a field',
  })

/** `fields` are keys of the proposal's values, and `identity.brand` and the like; what is left out is approved. */
export const decisionRequestSchema = z
  .strictObject({
    decision: z.enum(decisionNames, { error: `must be one of: ${decisionNames.join(', ')}` }),
    fields: z.record(z.string().max(limits.sort), fieldDecisionSchema).optional(),
    reasonCode: z.enum(reasonCodes, { error: `must be one of: ${reasonCodes.join(', ')}` }).optional(),
    words: wordsSchema(limits.words).optional(),
  })
  .superRefine(({ decision, fields, reasonCode, words }, context) => {
    const complain = (key: string, message: string) => context.addIssue({ code: 'custom', path: [key], message })
    if (decision === 'approve') {
      if (reasonCode !== undefined) complain('reasonCode', 'must be left out to approve')
      return
    }
    const codes = Object.keys(reasons[decision])
    if (reasonCode === undefined || !codes.includes(reasonCode)) {
      complain('reasonCode', `must be one of: ${codes.join(', ')}`)
    }
    if (words === undefined) complain('words', 'are needed: its author reads them')
    if (fields !== undefined) complain('fields', 'must be left out unless you approve')
  })

export const queueQuerySchema = z.strictObject({
  kind: kindSchema.optional(),
  /** Waiting for longer than that. */
  age: z.enum(ages, { error: `must be one of: ${ages.join(', ')}` }).optional(),
  flagged: z.enum(['yes', 'no'], { error: 'must be yes or no' }).optional(),
  sort: z.enum(queueSorts, { error: `must be one of: ${queueSorts.join(', ')}` }).default('oldest'),
  cursor: cursorSchema.optional(),
})

export const queueItemSchema = z.object({
  id: z.string(),
  kind: z.string(),
  /** Null: a new piece. */
  slug: z.string().nullable(),
  brand: z.string().nullable(),
  model: z.string().nullable(),
  changed: z.array(z.string()),
  summary: z.string().nullable(),
  author: z.string(),
  /** Nobody decides their own. */
  isMine: z.boolean(),
  record: z.object({ accepted: z.number().int(), declined: z.number().int() }),
  flags: z.number().int(),
  /** The piece has moved on since the revision it was proposed for. */
  isBehind: z.boolean(),
  submittedAt: z.string(),
  lease: leaseSchema.nullable(),
})

export const queueSchema = z.object({
  items: z.array(queueItemSchema),
  /** With these filters, over all pages. */
  total: z.number().int(),
  /** How many wait of each kind, without filters. */
  kinds: z.array(z.object({ kind: z.string(), count: z.number().int() })),
  next: z.string().nullable(),
})

/** Hours from sending in to the decision, of the last 90 days; null while there are none. */
export const waitingTimesSchema = z.object({
  days: z.number().int(),
  decided: z.number().int(),
  hours: z.object({ p50: z.number(), p75: z.number(), p95: z.number() }).nullable(),
  waiting: z.number().int(),
  oldestAt: z.string().nullable(),
})

const pieceSchema = z.object({ slug: z.string(), kind: z.string(), brand: z.string(), model: z.string() })

export const valueSourcesSchema = z.object({ slug: z.string(), key: z.string(), items: z.array(sourceOfValueSchema) })

export const disputeSchema = z.object({
  id: z.string(),
  gear: pieceSchema,
  key: z.string(),
  status: z.enum(['open', 'settled']),
  /** The proposal that would have turned it once more. */
  proposalId: z.string().nullable(),
  /** Every value that it ever had, oldest first; `revision` is what a settlement names. */
  values: z.array(sourceOfValueSchema),
  words: z.string().nullable(),
  createdAt: z.string(),
})

export const disputeListSchema = z.object({ items: z.array(disputeSchema), next: z.string().nullable() })
export const settleDisputeSchema = z.strictObject({
  /** The revision whose value is to be used. */
  revision: z.int({ error: 'must be the number of a revision' }).min(1),
  words: wordsSchema(limits.words),
})

export const reportRequestSchema = z.strictObject({
  key: lineSchema(limits.sort).optional(),
  words: wordsSchema(limits.words),
})

export const errorReportSchema = z.object({
  id: z.string(),
  gear: pieceSchema,
  key: z.string().nullable(),
  words: z.string(),
  /** Null: somebody without an account. */
  author: z.string().nullable(),
  status: z.enum(['open', 'settled']),
  createdAt: z.string(),
})

export const errorReportListSchema = z.object({ items: z.array(errorReportSchema), next: z.string().nullable() })
export const pageQuerySchema = z.strictObject({ cursor: cursorSchema.optional() })
export const settleReportSchema = z.strictObject({ words: wordsSchema(limits.words) })

export const confirmationRequestSchema = z.strictObject({
  key: lineSchema(limits.sort),
  /** What they measured themselves, in the canonical unit. */
  measured: z.number({ error: 'must be a number' }).optional(),
})
export const confirmationSchema = z.object({ key: z.string(), count: z.number().int() })

export const duplicatesQuerySchema = z.strictObject({
  kind: kindSchema.optional(),
  brand: lineSchema(limits.brand).optional(),
  model: lineSchema(limits.model).optional(),
  gtin: z
    .string()
    .regex(/^\d{8,14}$/, 'must be 8 to 14 digits')
    .optional(),
})

export const duplicatesSchema = z.object({
  items: z.array(
    pieceSchema.extend({
      gtin: z.string().nullable(),
      /** `gtin` and `name` are the same as asked for; `alike` is near. */
      match: z.enum(['gtin', 'name', 'alike']),
    }),
  ),
})

export const restoreRequestSchema = z.strictObject({
  revision: z.int({ error: 'must be the number of a revision' }).min(1),
  words: wordsSchema(limits.summary),
})
export const mergeRequestSchema = z.strictObject({ into: slugSchema, words: wordsSchema(limits.words) })
/** Unmerge, retire, unretire. */
export const careRequestSchema = z.strictObject({ words: wordsSchema(limits.words) })

/** How a piece stands, and what the reader may do with it; for merged and retired pieces too. */
export const gearCareSchema = z.object({
  slug: z.string(),
  kind: z.string(),
  brand: z.string(),
  model: z.string(),
  revision: z.number().int(),
  state: z.enum(['live', 'merged', 'retired']),
  mergedInto: z.string().nullable(),
  retiredReason: z.string().nullable(),
  /** Keys that the reader confirmed, and those whose value is the reader's own. */
  confirmed: z.array(z.string()),
  own: z.array(z.string()),
  /** The reader's own proposals about it that are still open. */
  proposals: z.array(z.object({ id: z.string(), status: z.string() })),
  can: z.object({
    propose: z.boolean(),
    confirm: z.boolean(),
    restore: z.boolean(),
    merge: z.boolean(),
    unmerge: z.boolean(),
    retire: z.boolean(),
    unretire: z.boolean(),
  }),
})

export const revertRequestSchema = z.strictObject({ words: wordsSchema(limits.summary) })

export const longJobSchema = z.object({
  id: z.string(),
  kind: z.string(),
  status: z.enum(['waiting', 'running', 'done', 'failed']),
  done: z.number().int(),
  total: z.number().int().nullable(),
  outcome: z.record(z.string(), z.unknown()).nullable(),
  createdAt: z.string(),
  endedAt: z.string().nullable(),
})

export type DecisionRequest = z.infer<typeof decisionRequestSchema>
export type QueueQuery = z.infer<typeof queueQuerySchema>
export type QueueItem = z.infer<typeof queueItemSchema>
export type Queue = z.infer<typeof queueSchema>
export type WaitingTimes = z.infer<typeof waitingTimesSchema>
export type ValueSources = z.infer<typeof valueSourcesSchema>
export type Dispute = z.infer<typeof disputeSchema>
export type DisputeList = z.infer<typeof disputeListSchema>
export type ErrorReport = z.infer<typeof errorReportSchema>
export type ErrorReportList = z.infer<typeof errorReportListSchema>
export type DuplicatesQuery = z.infer<typeof duplicatesQuerySchema>
export type Duplicates = z.infer<typeof duplicatesSchema>
export type GearCare = z.infer<typeof gearCareSchema>
export type LongJob = z.infer<typeof longJobSchema>
