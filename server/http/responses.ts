import { createHash } from 'node:crypto'
import type { Request, Response } from 'express'

export interface CachedBody {
  readonly text: string
  readonly etag: string
}

/** Serialised once, with a strong ETag of the content; `revision` lets a change say what it starts from. */
export function createBody(value: unknown, revision?: string): CachedBody {
  const text = JSON.stringify(value)
  const hash = createHash('sha256').update(text).digest('base64url').slice(0, 27)
  return { text, etag: revision === undefined ? `"${hash}"` : `"${revision}.${hash}"` }
}

/** Answers a read: 304 where the visitor already has it. Caches ask again each time, since a number may be corrected. */
export function sendRead(req: Request, res: Response, body: CachedBody): void {
  res.set('ETag', body.etag)
  res.set('Cache-Control', 'public, no-cache')
  if (req.fresh) res.status(304).end()
  else res.type('application/json').send(body.text)
}

/** Answers a calculation about somebody's own setup: for nobody else, and not to be kept. */
export function sendAnswer(res: Response, value: unknown): void {
  res.set('Cache-Control', 'private, no-store')
  res.json(value)
}
