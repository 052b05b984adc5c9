import { z } from 'zod'
import { kindKeys } from '#shared/kinds/index'
import { limits } from '#shared/limits'
import { gearStatuses, lineSchema, slugSchema } from '#shared/schemas/gear'
import { gtinSchema } from '#shared/schemas/gtin'

/** What a piece is called, beside its specs. */
export const identitySchema = z.strictObject({
  slug: slugSchema,
  kind: z.enum(kindKeys),
  brand: lineSchema(limits.brand),
  model: lineSchema(limits.model),
  status: z.enum(gearStatuses),
  gtin: gtinSchema.optional(),
  notes: z.string().max(limits.notes).optional(),
})

/** What comes with a revision's values; the values themselves are the kind's own schema's business. */
export const revisionSchema = z.object({
  date: z.iso.date('must be a day such as 2025-03-31'),
  author: lineSchema(limits.author),
  summary: lineSchema(limits.summary).optional(),
  values: z.record(z.string(), z.object({ evidence: lineSchema(limits.evidence).optional() }).nullable()),
})
