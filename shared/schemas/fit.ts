import { z } from 'zod'
import { getAttribute } from '../kinds/index'
import { limits } from '../limits'
import { verdictSchema } from './answer'
import { checkFilters, filtersSchema } from './filters'
import { cursorSchema, kindSchema } from './gear-requests'
import { checkPieceInput, pieceInputShape } from './piece-input'
import { placeSchema, quantitySchema, setupSchema } from './setup'

const limitError = `must be a whole number from 1 to ${limits.answersMax}`

export const fitRequestSchema = z
  .strictObject({
    setup: setupSchema,
    kind: kindSchema,
    /** Only pieces of which these attributes are known and match. */
    filters: filtersSchema.optional(),
    limit: z.int({ error: limitError }).min(1, limitError).max(limits.answersMax, limitError).default(limits.answers),
    cursor: cursorSchema.optional(),
    /** Only answers with this verdict. */
    verdict: verdictSchema.optional(),
    /** Only pieces that fail this check, or lack data for it. */
    check: z
      .string({ error: 'must be the id of a check, such as heater.space' })
      .max(80)
      .regex(/^[a-z-]+\.[a-z-]+$/, 'must be the id of a check, such as heater.space')
      .optional(),
    /** Only pieces that cannot be judged because nobody has recorded this attribute of theirs. */
    missing: z.string({ error: 'must be the key of an attribute, such as lengthMm' }).max(80).optional(),
    /** Also the shared scales, and where every candidate stands on them. */
    scales: z.boolean({ error: 'must be true or false' }).default(false),
  })
  .superRefine(checkFilters)
  .superRefine(({ kind, missing }, context) => {
    if (missing !== undefined && !getAttribute(kind, missing))
      context.addIssue({ code: 'custom', path: ['missing'], message: 'is not an attribute of this kind' })
  })

export const fitCheckRequestSchema = z.strictObject({
  setup: setupSchema,
  piece: z.strictObject(pieceInputShape).superRefine(checkPieceInput),
  quantity: quantitySchema.optional(),
  place: placeSchema.optional(),
  /** Items that the piece would take the place of; without it, those of its kind. */
  instead: z.array(z.string().max(limits.itemId)).max(limits.items).optional(),
  /** Beside what is there, in the place of nothing. */
  beside: z.boolean({ error: 'must be true or false' }).optional(),
})

export const reportRequestSchema = z.strictObject({ setup: setupSchema })

export type FitRequest = z.input<typeof fitRequestSchema>
export type FitParsed = z.output<typeof fitRequestSchema>
export type FitCheckRequest = z.input<typeof fitCheckRequestSchema>
export type FitCheckParsed = z.output<typeof fitCheckRequestSchema>
