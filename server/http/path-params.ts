import type { Request } from 'express'
import { z } from 'zod'
import { slugSchema } from '#shared/schemas/gear'
import { AppError } from '../lib/errors'

/** Text that cannot be a slug names nothing: it is not there, rather than wrongly asked. */
export function readSlug(req: Request): string {
  const parsed = slugSchema.safeParse(req.params.slug)
  if (!parsed.success) throw new AppError('not-found', 'There is no piece of gear by that name.')
  return parsed.data
}

const idSchema = z.uuid()

/** So it is with what cannot be an id. `what` says of what: "There is no such report." */
export function readId(req: Request, what: string): string {
  const parsed = idSchema.safeParse(req.params.id)
  if (!parsed.success) throw new AppError('not-found', `There is no such ${what}.`)
  return parsed.data
}
