import { Router, type Request } from 'express'
import { decisionRequestSchema } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { readId } from '../../http/path-params'
import { parseBody, readJsonBody } from '../../http/requests'
import { requireActor } from '../../http/session'
import { readIfMatch, sendVersioned } from '../../http/versions'
import { decideProposal } from './decide.service'
import { leaseProposal, releaseProposal } from './lease.service'

/** What a moderator does with one proposal. */
export function createDecisionRoutes(db: Database, origin: string): Router {
  const router = Router()
  const trace = (req: Request) => ({ requestId: getRequestId(req), origin })

  addEndpoint(router, '/proposals/:id/lease', {
    post: async (req, res) => {
      sendVersioned(res, await leaseProposal(db, requireActor(res), readId(req, 'proposal'), trace(req)))
    },
    delete: async (req, res) => {
      sendVersioned(res, await releaseProposal(db, requireActor(res), readId(req, 'proposal'), trace(req)))
    },
  })

  addEndpoint(router, '/proposals/:id/decision', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const seen = { id: readId(req, 'proposal'), version: readIfMatch(req) }
        const request = parseBody(decisionRequestSchema, req)
        sendVersioned(res, await decideProposal(db, actor, seen, request, trace(req)))
      },
    ],
  })

  return router
}
