import { Router, type Request } from 'express'
import { decisionRequestSchema } from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { requireActor } from '../../http/session'
import { readIfMatch, sendVersioned } from '../../http/versions'
import { decideProposal } from './decide.service'
import { leaseProposal, releaseProposal } from './lease.service'
import { readProposalId } from './proposals.routes'

/** What a moderator does with one proposal. */
export function createDecisionRoutes(db: Database, origin: string): Router {
  const router = Router()
  const trace = (req: Request) => ({ requestId: getRequestId(req), origin })

  addEndpoint(router, '/proposals/:id/lease', {
    post: async (req, res) => {
      sendVersioned(res, await leaseProposal(db, requireActor(res), readProposalId(req), trace(req)))
    },
    delete: async (req, res) => {
      sendVersioned(res, await releaseProposal(db, requireActor(res), readProposalId(req), trace(req)))
    },
  })

  addEndpoint(router, '/proposals/:id/decision', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const seen = { id: readProposalId(req), version: readIfMatch(req) }
        const request = parseBody(decisionRequestSchema, req)
        sendVersioned(res, await decideProposal(db, actor, seen, request, trace(req)))
      },
    ],
  })

  return router
}
