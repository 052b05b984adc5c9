import { Router, type RequestHandler } from 'express'
import { addEndpoint } from '../../http/methods'
import { AppError } from '../../lib/errors'
import { listMessages } from '../../services/mail/mailroom'

/** What the local stand-in for a mail server received. `folder` is null wherever real mail is sent. */
function createMailroomHandler(folder: string | null): RequestHandler {
  return async (_req, res) => {
    if (folder === null) throw new AppError('not-found', 'There is nothing here.')
    const items = await listMessages(folder)
    res.set({ 'Cache-Control': 'private, no-store', 'X-Robots-Tag': 'noindex' }).json({ items })
  }
}

export function createMailroomRoutes(folder: string | null, path: string): Router {
  const router = Router()
  addEndpoint(router, path, { get: createMailroomHandler(folder) })
  return router
}
