import type { Request, Response } from 'express'
import { AppError } from '../lib/errors'

/** Proposals are tagged `"v3"`; gear `"r7.…"`, of which only the revision counts for a change. */
const tagPattern = /^"[vr](\d{1,9})(\.[\w-]*)?"$/

/** The version that a change starts from. A tag that nothing here gave is as stale as any: 0. */
export function readIfMatch(req: Request): number {
  const tag = req.get('If-Match')?.trim()
  if (tag === undefined || tag === '') {
    const how = 'Send the ETag that the answer carried as If-Match, so that nobody overwrites what they have not seen.'
    throw new AppError('precondition-required', how)
  }
  return Number(tagPattern.exec(tag)?.[1] ?? 0)
}

interface Versioned {
  readonly version: number
}

/** Answers with something that only its reader may see, tagged by its version. */
export function sendVersioned(res: Response, value: Versioned, status = 200): void {
  res.set('ETag', `"v${value.version}"`).set('Cache-Control', 'private, no-store')
  res.status(status).json(value)
}
