import { z } from 'zod'
import { sourceSchema } from './specs'
import type { FitResult } from '../engine/types'

const numberOrNull = z.number().nullable()
const outcomeSchema = z.enum(['pass', 'change', 'fail', 'nodata'])
export const verdictSchema = z.enum(['fits', 'changes', 'no', 'unknown'])

export const gearRefSchema = z.object({ slug: z.string(), brand: z.string(), model: z.string() })

const valueSchema = z.object({
  value: z.unknown(),
  source: sourceSchema,
  plusMinus: z.number().optional(),
})

export const checkSchema = z.object({
  id: z.string(),
  label: z.string(),
  outcome: outcomeSchema,
  measured: z.union([z.number(), z.string(), z.array(z.string()), z.null()]),
  limit: z.union([z.number(), z.tuple([z.number(), z.number()]), z.null()]),
  unit: z.string().nullable(),
  margin: numberOrNull,
  message: z.string(),
  basis: z.object({ type: z.enum(['physics', 'standard', 'practice']), source: z.string() }),
  missing: z.array(z.string()).optional(),
  assumed: z.array(z.string()).optional(),
  probability: z.number().min(0).max(1).optional(),
  /** Where it could as well go the other way (5 to 95 %): what to measure or check first. */
  closeCall: z.string().optional(),
})

const knockOnSideSchema = z.union([outcomeSchema, z.number(), z.null()])

const knockOnSchema = z.object({
  kind: z.enum(['need', 'check', 'budget', 'freed', 'missing']),
  subject: z.string(),
  from: knockOnSideSchema,
  to: knockOnSideSchema,
  message: z.string(),
})

const placementSchema = z.object({
  chamber: z.string(),
  position: z.enum(['upright', 'leaning', 'flat']),
  angleDeg: z.number(),
})

const turnSchema = z.object({
  path: z.string(),
  from: z.number(),
  to: z.number(),
  unit: z.string(),
  verdict: z.enum(['fits', 'changes']),
  message: z.string(),
})

export const answerSchema = z.object({
  gear: gearRefSchema.nullable(),
  kind: z.string(),
  specs: z.record(z.string(), valueSchema),
  pieces: z.array(z.object({ gear: gearRefSchema.nullable(), quantity: z.number().int() })),
  verdict: verdictSchema,
  summary: z.string(),
  checks: z.array(checkSchema),
  knockOns: z.array(knockOnSchema),
  cautions: z.array(z.string()),
  confidence: z.object({ level: z.enum(['measured', 'maker', 'estimate', 'mixed']), closeCalls: z.number().int() }),
  place: placementSchema.optional(),
  /** The smallest change to one number of the setup that would turn the verdict; absent where none would. */
  turnsBy: turnSchema.optional(),
})

const assumptionSchema = z.object({
  key: z.string(),
  value: z.union([z.number(), z.string(), z.boolean(), z.array(z.string()), z.array(z.number())]),
  message: z.string(),
})

const scaleSchema = z.object({
  key: z.string(),
  check: z.string(),
  label: z.string(),
  unit: z.string(),
  limitText: z.string(),
  limits: z.array(z.number()),
  zones: z.array(z.object({ from: z.number(), to: z.number(), outcome: outcomeSchema })),
})

const markSchema = gearRefSchema.extend({
  verdict: verdictSchema,
  values: z.record(z.string(), numberOrNull),
})

const countSchema = z.number().int()

export const fitResultSchema = z.object({
  answers: z.array(answerSchema),
  counts: z.object({ fits: countSchema, changes: countSchema, no: countSchema, unknown: countSchema }),
  failedBy: z.array(z.object({ check: z.string(), count: countSchema, label: z.string() })),
  missingBy: z.array(z.object({ key: z.string(), count: countSchema, label: z.string() })),
  assumptions: z.array(assumptionSchema),
  total: countSchema,
  next: z.string().nullable(),
  scales: z.array(scaleSchema).optional(),
  marks: z.array(markSchema).optional(),
})

export const reportSchema = z.object({
  verdict: verdictSchema,
  items: z.array(
    z.object({
      id: z.string(),
      kind: z.string(),
      gear: gearRefSchema.nullable(),
      specs: z.record(z.string(), valueSchema),
      quantity: z.number().int(),
      verdict: verdictSchema,
      checks: z.array(checkSchema),
      cautions: z.array(z.string()),
      place: placementSchema.optional(),
    }),
  ),
  missing: z.array(z.object({ need: z.string(), message: z.string() })),
  needs: z.array(
    z.object({
      need: z.string(),
      amount: numberOrNull,
      unit: z.string().nullable(),
      neededBy: z.array(z.string()),
      metBy: z.array(z.string()),
      message: z.string(),
    }),
  ),
  budgets: z.record(
    z.string(),
    z.object({ used: z.number(), limit: numberOrNull, unit: z.string(), message: z.string() }),
  ),
  cautions: z.array(z.string()),
  assumptions: z.array(assumptionSchema),
})

/** What the engine finds, with the place in the list where the next page begins. */
export type FitAnswer = FitResult & { readonly next: string | null }
