import { z } from 'zod'

export const evidenceKinds = ['photo', 'document'] as const

/** A photo or document that backs values, as whoever may see it is told of it. */
export const evidenceSchema = z.object({
  id: z.uuid(),
  kind: z.enum(evidenceKinds),
  contentType: z.string(),
  bytes: z.number().int(),
  width: z.number().int().nullable(),
  height: z.number().int().nullable(),
  caption: z.string().nullable(),
  /** Public once a proposal that names it was approved. */
  isPublished: z.boolean(),
  createdAt: z.string(),
  url: z.string(),
  thumbnailUrl: z.string().nullable(),
  can: z.object({ remove: z.boolean() }),
})

export const evidenceListSchema = z.object({ items: z.array(evidenceSchema) })

const captionLength = 300

/** The fields beside the file. */
export const evidenceFieldsSchema = z.strictObject({
  caption: z
    .string({ error: 'must be text' })
    .trim()
    .max(captionLength, `must be at most ${captionLength} characters`)
    .optional(),
})

/** For the form as for the server: what may be sent, before anybody looks inside. */
export const evidenceLimits = {
  bytes: 25 * 1024 * 1024,
  pixels: 50_000_000,
  perProposal: 40,
  caption: captionLength,
  contentTypes: ['image/jpeg', 'image/png', 'image/webp', 'application/pdf'],
} as const

export type Evidence = z.infer<typeof evidenceSchema>
export type EvidenceList = z.infer<typeof evidenceListSchema>
