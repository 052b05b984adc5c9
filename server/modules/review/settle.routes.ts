import { Router } from 'express'
import { pageQuerySchema, settleDisputeSchema, settleReportSchema } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { readId } from '../../http/path-params'
import { parseBody, parseQuery, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { requireActor } from '../../http/session'
import { getDisputes, settleDispute } from './disputes.service'
import { getReports, settleReport } from './reports.service'

/** Disputes and readers' reports, and how they end. */
export function createSettleRoutes(db: Database): Router {
  const router = Router()

  addEndpoint(router, '/review/disputes', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await getDisputes(db, actor, parseQuery(pageQuerySchema, req).cursor))
    },
  })

  addEndpoint(router, '/review/reports', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await getReports(db, actor, parseQuery(pageQuerySchema, req).cursor))
    },
  })

  addEndpoint(router, '/disputes/:id/settle', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const settling = { id: readId(req, 'dispute'), requestId: getRequestId(req) }
        await settleDispute(db, actor, { ...parseBody(settleDisputeSchema, req), ...settling })
        sendAnswer(res, { status: 'settled' })
      },
    ],
  })

  addEndpoint(router, '/reports/:id/settle', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const settling = { id: readId(req, 'report'), requestId: getRequestId(req) }
        await settleReport(db, actor, { ...parseBody(settleReportSchema, req), ...settling })
        sendAnswer(res, { status: 'settled' })
      },
    ],
  })

  return router
}
