import { Router } from 'express'
import { queueQuerySchema } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { addEndpoint } from '../../http/methods'
import { parseQuery } from '../../http/requests'
import { createBody, sendAnswer, sendRead } from '../../http/responses'
import { requireActor } from '../../http/session'
import { getQueue, getWaitingTimes } from './queue.service'

/** The queue of the review desk, and how long people wait in it. */
export function createReviewRoutes(db: Database): Router {
  const router = Router()

  addEndpoint(router, '/review', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await getQueue(db, actor, parseQuery(queueQuerySchema, req)))
    },
  })

  addEndpoint(router, '/review/times', {
    get: async (req, res) => sendRead(req, res, createBody(await getWaitingTimes(db))),
  })

  return router
}
