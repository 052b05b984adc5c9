import { z } from 'zod'
import type { ReplacementsResult } from '../engine/swap/types'
import { limits } from '../limits'
import { answerSchema, fitResultSchema, gearRefSchema } from './answer'
import { fitRequestSchema } from './fit'
import { setupSchema } from './setup'

const { limit, cursor, verdict, check } = fitRequestSchema.shape

export const replacementsRequestSchema = z.strictObject({
  setup: setupSchema,
  /** The item that is gone, whatever its state says; `tank` for the tank itself. */
  itemId: z.string({ error: 'must be the id of an item, or tank' }).min(1, 'is empty').max(limits.itemId),
  limit,
  cursor,
  verdict,
  check,
})

const addOnSchema = z.object({
  need: z.string(),
  message: z.string(),
  options: z.array(z.array(z.object({ gear: gearRefSchema, quantity: z.number().int() }))),
})

const differenceSchema = z.object({
  key: z.string(),
  label: z.string(),
  from: z.unknown(),
  to: z.unknown(),
  unit: z.string().nullable(),
  sense: z.enum(['better', 'worse', 'different']),
  message: z.string(),
})

export const replacementSchema = answerSchema.extend({
  addOns: z.array(addOnSchema),
  differences: z.array(differenceSchema),
})

const { counts, failedBy, missingBy, assumptions, total, next } = fitResultSchema.shape

export const replacementsSchema = z.object({
  gone: z.object({
    id: z.string(),
    kind: z.string(),
    gear: gearRefSchema.nullable(),
    specs: answerSchema.shape.specs,
    quantity: z.number().int(),
  }),
  answers: z.array(replacementSchema),
  counts,
  failedBy,
  missingBy,
  assumptions,
  total,
  next,
})

export type ReplacementsRequest = z.input<typeof replacementsRequestSchema>
export type ReplacementsParsed = z.output<typeof replacementsRequestSchema>

/** What the engine finds, with the place in the list where the next page begins. */
export type ReplacementsAnswer = ReplacementsResult & { readonly next: string | null }
