import { Router } from 'express'
import { auditQuerySchema } from '#shared/schemas/admin'
import type { Database } from '../../db/database'
import { addEndpoint } from '../../http/methods'
import { parseQuery } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { requireActor } from '../../http/session'
import { searchAudit } from './audit.service'

export function createAuditRoutes(db: Database): Router {
  const router = Router()
  addEndpoint(router, '/admin/audit', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await searchAudit(db, actor, parseQuery(auditQuerySchema, req)))
    },
  })
  return router
}
