import { z } from 'zod'
import { limits } from '../limits'
import { sourceSchema } from './specs'

export const gearStatuses = ['current', 'discontinued', 'unknown'] as const

const controlCharacters = /\p{Cc}/u

/** One line of text as people type it: no control characters, which PostgreSQL would refuse and which forge log lines. */
export function lineSchema(maxLength: number) {
  return z
    .string({ error: 'must be text' })
    .trim()
    .min(1, 'must not be empty')
    .max(maxLength, `must be at most ${maxLength} characters`)
    .refine((text) => !controlCharacters.test(text), 'must not hold control characters')
}

export const slugSchema = z
  .string({ error: 'must be the slug of a piece of gear' })
  .max(limits.slug, `must be at most ${limits.slug} characters`)
  .regex(/^[a-z0-9]+(-[a-z0-9]+)*$/, 'must be the slug of a piece of gear, such as "brand-model-100"')

/** Bare values by attribute key, each in the unit that its key names; `GET /api/v1/kinds` tells what a kind can have. */
export const bareSpecsSchema = z.record(z.string(), z.unknown())

/** A photo or document, to be had at `/api/v1/evidence/{id}`, a photo's small copy at `/api/v1/evidence/{id}/thumbnail`. */
export const evidenceRefSchema = z.object({
  id: z.string(),
  kind: z.enum(['photo', 'document']),
  contentType: z.string(),
  width: z.number().int().nullable(),
  height: z.number().int().nullable(),
  caption: z.string().nullable(),
})

export const provenanceSchema = z.object({
  source: sourceSchema,
  plusMinus: z.number().optional(),
  evidence: z.string().optional(),
  date: z.string(),
  author: z.string(),
  revision: z.number().int(),
  /** Who approved it; absent for what was imported. */
  reviewer: z.string().optional(),
  /** As it was typed. */
  raw: z.string().optional(),
  files: z.array(evidenceRefSchema).optional(),
})

/** One source of a value. `isUsed`: the newest within the highest rank, or what settled a dispute. */
export const sourceOfValueSchema = provenanceSchema.extend({ value: z.unknown(), isUsed: z.boolean() })

export const gearItemSchema = z.object({
  slug: z.string(),
  kind: z.string(),
  brand: z.string(),
  model: z.string(),
  gtin: z.string().nullable(),
  status: z.enum(gearStatuses),
  revision: z.number().int(),
  updatedAt: z.string(),
  specs: bareSpecsSchema,
})

export const gearSchema = gearItemSchema.extend({
  notes: z.string().nullable(),
  createdAt: z.string(),
  provenance: z.record(z.string(), provenanceSchema),
  /** How many people measured the same, by key; keys that nobody confirmed are absent. */
  confirmations: z.record(z.string(), z.number().int()),
  /** Keys of which several sources are on record, each with all of them, the one in use first. */
  sources: z.record(z.string(), z.array(sourceOfValueSchema)),
  /** Keys whose value went to and fro, until a moderator settles it. */
  disputed: z.array(z.string()),
})

const optionCountSchema = z.object({
  value: z.union([z.string(), z.number(), z.boolean()]),
  label: z.string(),
  count: z.number().int(),
})

/** How the answers spread over one filter, that filter itself set aside. */
export const facetSchema = z.discriminatedUnion('type', [
  z.object({
    type: z.literal('measure'),
    label: z.string(),
    unit: z.string(),
    min: z.number().nullable(),
    max: z.number().nullable(),
    known: z.number().int(),
    unknown: z.number().int(),
  }),
  z.object({
    type: z.literal('options'),
    label: z.string(),
    counts: z.array(optionCountSchema),
    /** Options beyond those listed. */
    more: z.number().int(),
    known: z.number().int(),
    unknown: z.number().int(),
  }),
])

export const gearListSchema = z.object({
  items: z.array(gearItemSchema),
  /** Over all pages. */
  total: z.number().int(),
  facets: z.record(z.string(), facetSchema),
  /** Why there is nothing, or what was passed over. */
  hint: z.string().nullable(),
  /** Where filters leave nothing: how many there would be without each one of them. */
  loosen: z.array(z.object({ key: z.string(), total: z.number().int() })),
  next: z.string().nullable(),
})

export const revisionSummarySchema = z.object({
  number: z.number().int(),
  author: z.string(),
  summary: z.string().nullable(),
  createdAt: z.string(),
  /** Keys that the revision set or removed. */
  changed: z.array(z.string()),
})

export const revisionListSchema = z.object({ slug: z.string(), items: z.array(revisionSummarySchema) })

export const revisionSchema = revisionSummarySchema.extend({
  slug: z.string(),
  kind: z.string(),
  specs: bareSpecsSchema,
  provenance: z.record(z.string(), provenanceSchema),
})

export type GearItem = z.infer<typeof gearItemSchema>
export type Gear = z.infer<typeof gearSchema>
export type Facet = z.infer<typeof facetSchema>
export type GearList = z.infer<typeof gearListSchema>
export type EvidenceRef = z.infer<typeof evidenceRefSchema>
export type SourceOfValue = z.infer<typeof sourceOfValueSchema>
export type Provenance = z.infer<typeof provenanceSchema>
export type RevisionSummary = z.infer<typeof revisionSummarySchema>
export type RevisionList = z.infer<typeof revisionListSchema>
export type Revision = z.infer<typeof revisionSchema>
