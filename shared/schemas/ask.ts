import { z } from 'zod'
import { limits } from '../limits'
import { kindKeys } from '../kinds/index'
import { unitSystems } from '../units/systems'

const textError = `must be a question of 1 to ${limits.question} characters`

export const askRequestSchema = z.strictObject({
  text: z
    .string({ error: textError })
    .max(limits.question, textError)
    .refine((text) => text.trim() !== '', textError),
  /** What a number without a unit is in. */
  units: z.enum(unitSystems, { error: `must be ${unitSystems.join(' or ')}` }).default('us'),
})

export type AskParsed = z.infer<typeof askRequestSchema>

const filterSchema = z.union([z.tuple([z.number().nullable(), z.number().nullable()]), z.string(), z.boolean()])

export const questionSchema = z.object({
  intent: z.enum(['check', 'find', 'replace', 'missing']),
  /** What is asked about; null where the text does not say. */
  kind: z.enum(kindKeys).nullable(),
  gear: z.object({ slug: z.string(), brand: z.string(), model: z.string() }).optional(),
  /** By attribute key: [from, to] with null for open, an option, or yes and no. */
  filters: z.record(z.string(), filterSchema),
  /** What the text tells of the setup; it may not be enough for one yet. */
  setup: z.record(z.string(), z.unknown()),
  understood: z.array(
    z.object({
      text: z.string(),
      meaning: z.string(),
      /** Setup path of the first field that it filled. */
      path: z.string().optional(),
      /** UTF-16 offsets into the text. */
      start: z.number().int(),
      end: z.number().int(),
    }),
  ),
  /** Words that seem to matter and were not used, as typed. */
  ignored: z.array(z.string()),
})

export type AskAnswer = z.infer<typeof questionSchema>
