import type { Response } from 'express'
import type { Actor } from '../lib/actor'
import { AppError } from '../lib/errors'

/** Who is signed in, as the session's middleware found it; null for a visitor. */
export function getActor(res: Response): Actor | null {
  return (res.locals.actor as Actor | undefined) ?? null
}

export function requireActor(res: Response): Actor {
  const actor = getActor(res)
  if (actor === null) throw new AppError('unauthenticated', 'Sign in to do this.')
  return actor
}
