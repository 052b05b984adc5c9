import { Router, type Request, type Response } from 'express'
import { isKindKey } from '#shared/kinds/index'
import {
  createProposalPatchSchema,
  messageRequestSchema,
  proposalPatchSchema,
  proposalRequestSchema,
  proposalsQuerySchema,
} from '#shared/schemas/proposals'
import type { Database } from '../../db/database'
import { createIdempotency } from '../../http/idempotency'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { readId } from '../../http/path-params'
import { parseBody, parseQuery, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { requireActor } from '../../http/session'
import { readIfMatch, sendVersioned } from '../../http/versions'
import { addMessage, submitProposal, withdrawProposal } from './proposal-turns.service'
import { getMine, getProposal } from './read-proposal.service'
import { amendProposal, createProposal } from './write-proposal.service'

export function createProposalRoutes(db: Database, origin: string): Router {
  const router = Router()
  const trace = (req: Request) => ({ requestId: getRequestId(req), origin })
  const readSeen = (req: Request) => ({ id: readId(req, 'proposal'), version: readIfMatch(req) })

  addEndpoint(router, '/proposals', {
    get: async (req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, await getMine(db, actor, parseQuery(proposalsQuerySchema, req)))
    },
    post: [
      ...readJsonBody,
      createIdempotency(db),
      async (req, res) => {
        const actor = requireActor(res)
        const proposal = await createProposal(db, actor, parseBody(proposalRequestSchema, req), trace(req))
        res.location(`/api/v1/proposals/${proposal.id}`)
        sendVersioned(res, proposal, 201)
      },
    ],
  })

  async function amend(req: Request, res: Response) {
    const actor = requireActor(res)
    const seen = readSeen(req)
    const { kind } = await getProposal(db, actor, seen.id)
    const schema = isKindKey(kind) ? createProposalPatchSchema(kind) : proposalPatchSchema
    sendVersioned(res, await amendProposal(db, actor, seen, parseBody(schema, req), trace(req)))
  }

  addEndpoint(router, '/proposals/:id', {
    get: async (req, res) => sendVersioned(res, await getProposal(db, requireActor(res), readId(req, 'proposal'))),
    patch: [...readJsonBody, amend],
  })

  addEndpoint(router, '/proposals/:id/submit', {
    post: async (req, res) => {
      const actor = requireActor(res)
      sendVersioned(res, await submitProposal(db, actor, readSeen(req), trace(req)))
    },
  })

  addEndpoint(router, '/proposals/:id/withdraw', {
    post: async (req, res) => {
      const actor = requireActor(res)
      sendVersioned(res, await withdrawProposal(db, actor, readSeen(req), trace(req)))
    },
  })

  addEndpoint(router, '/proposals/:id/messages', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const { words } = parseBody(messageRequestSchema, req)
        sendVersioned(res, await addMessage(db, actor, readId(req, 'proposal'), words, trace(req)), 201)
      },
    ],
  })

  return router
}
