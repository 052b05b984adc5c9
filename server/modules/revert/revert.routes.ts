import { Router } from 'express'
import { revertRequestSchema } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { readId } from '../../http/path-params'
import { parseBody, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { requireActor } from '../../http/session'
import { getJob, startRevert } from './revert.service'

/** Taking one person's changes back, and how far that has come. */
export function createRevertRoutes(db: Database): Router {
  const router = Router()

  addEndpoint(router, '/admin/people/:name/revert', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const { words } = parseBody(revertRequestSchema, req)
        const job = await startRevert(db, actor, { name: String(req.params.name), words, requestId: getRequestId(req) })
        res.status(202).location(`/api/v1/admin/jobs/${job.id}`)
        sendAnswer(res, job)
      },
    ],
  })

  addEndpoint(router, '/admin/jobs/:id', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await getJob(db, actor, readId(req, 'job')))
    },
  })

  return router
}
