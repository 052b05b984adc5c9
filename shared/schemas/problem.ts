import { z } from 'zod'

/** RFC 9457. `errors` names every wrong field at once, each by a JSON pointer into the body, or by the query key. */
export const problemSchema = z.object({
  type: z.string(),
  title: z.string(),
  status: z.number().int(),
  detail: z.string(),
  instance: z.string(),
  requestId: z.string(),
  errors: z.array(z.object({ pointer: z.string(), detail: z.string() })).optional(),
  /** Of something stale: how it stands now. */
  current: z.unknown().optional(),
})

export type Problem = z.infer<typeof problemSchema>
