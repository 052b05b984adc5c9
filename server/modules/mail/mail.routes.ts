import { Router } from 'express'
import { z } from 'zod'
import { letterQuerySchema, unsubscribeQuerySchema } from '#shared/schemas/admin'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { parseQuery } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { requireActor } from '../../http/session'
import { AppError } from '../../lib/errors'
import { retryLetter, searchLetters } from './letters.service'
import { unsubscribe } from './mail.service'

const idSchema = z.uuid()

export function createMailRoutes(db: Database): Router {
  const router = Router()

  addEndpoint(router, '/admin/letters', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await searchLetters(db, actor, parseQuery(letterQuerySchema, req)))
    },
  })

  addEndpoint(router, '/admin/letters/:id/retry', {
    post: async (req, res) => {
      const actor = requireActor(res)
      const id = idSchema.safeParse(req.params.id)
      if (!id.success) throw new AppError('not-found', 'There is no letter by that name.')
      sendAnswer(res, await retryLetter(db, actor, id.data, getRequestId(req)))
    },
  })

  // A mail program posts a form of its own (RFC 8058) that says nothing beyond the token: no body is read.
  addEndpoint(router, '/unsubscribe', {
    post: async (req, res) => {
      await unsubscribe(db, parseQuery(unsubscribeQuerySchema, req).token, getRequestId(req))
      res.set('Cache-Control', 'private, no-store').status(204).end()
    },
  })

  return router
}
