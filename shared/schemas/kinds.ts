import { z } from 'zod'

const optionSchema = z.object({ value: z.string(), label: z.string() })

/** One attribute as data. Which members there are depends on `type`; a group holds attributes of its own. */
export const attributeSchema = z.looseObject({
  key: z.string(),
  label: z.string(),
  type: z.enum(['measure', 'choice', 'set', 'boolean', 'text', 'texts', 'group']),
  role: z.enum(['check', 'difference', 'display']),
  guide: z.string().optional(),
  unit: z.string().optional(),
  plausible: z.tuple([z.number(), z.number()]).optional(),
  usual: z.tuple([z.number(), z.number()]).optional(),
  options: z.array(optionSchema).optional(),
  /** Ids of the checks that read it. */
  checks: z.array(z.string()).optional(),
})

/** One line of the rule table, as data. `unit` is the canonical unit of what is measured. */
const ruleSchema = z.object({
  id: z.string(),
  label: z.string(),
  rule: z.string(),
  worst: z.enum(['change', 'fail']),
  unit: z.string().nullable(),
  basis: z.object({ type: z.enum(['physics', 'standard', 'practice']), source: z.string() }),
  reads: z.array(z.string()),
})

export const kindDescriptionSchema = z.object({
  key: z.string(),
  label: z.string(),
  plural: z.string(),
  electric: z.boolean(),
  additive: z.boolean(),
  attributes: z.array(attributeSchema),
  checks: z.array(ruleSchema),
  jsonSchema: z.record(z.string(), z.unknown()),
})

export const kindListSchema = z.object({
  identity: z.array(attributeSchema),
  items: z.array(kindDescriptionSchema),
})

export type KindList = z.infer<typeof kindListSchema>
