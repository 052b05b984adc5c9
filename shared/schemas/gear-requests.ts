import { z } from 'zod'
import { kindKeys } from '../kinds/index'
import { limits } from '../limits'
import { lineSchema } from './gear'

export const kindSchema = z.enum(kindKeys, { error: 'must be one of the kinds that GET /api/v1/kinds lists' })

export const cursorSchema = z
  .string({ error: 'must be a cursor from an earlier answer' })
  .max(limits.cursor, 'must be a cursor from an earlier answer')

/** A whole number as a query key holds it. */
export function countTextSchema(max: number) {
  const error = `must be a whole number from 1 to ${max}`
  return z
    .string()
    .regex(/^[0-9]{1,6}$/, error)
    .transform(Number)
    .pipe(z.number().min(1, error).max(max, error))
}

/** The fixed keys. Every other key is a filter, which `readGearFilters` holds to the kind's own attributes. */
export const gearQuerySchema = z.object({
  kind: kindSchema.optional(),
  q: lineSchema(limits.searchText).optional(),
  sort: z.string().max(limits.sort).optional(),
  limit: countTextSchema(limits.pageMax).default(limits.page),
  cursor: cursorSchema.optional(),
})

export type GearQuery = z.infer<typeof gearQuerySchema>
