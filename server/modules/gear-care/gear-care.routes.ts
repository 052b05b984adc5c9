import { Router, type Request, type RequestHandler } from 'express'
import {
  careRequestSchema,
  confirmationRequestSchema,
  duplicatesQuerySchema,
  mergeRequestSchema,
  reportRequestSchema,
  restoreRequestSchema,
} from '#shared/schemas/review'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { readSlug } from '../../http/path-params'
import { parseBody, parseQuery, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { getActor, requireActor } from '../../http/session'
import { readIfMatch } from '../../http/versions'
import type { Actor } from '../../lib/actor'
import { findDuplicates } from './duplicates.service'
import { mergePiece, retirePiece, unmergePiece, unretirePiece } from './piece-state.service'
import { confirmValue, getCare, reportError } from './readers-part.service'
import { restoreRevision } from './restore.service'

type CareStep = (
  db: Database,
  actor: Actor,
  care: { readonly slug: string; readonly words: string; readonly requestId: string },
) => Promise<void>

/** What people do with a piece beside proposing: confirm and report; and what moderators do to keep the catalogue right. */
export function createGearCareRoutes(db: Database): Router {
  const router = Router()
  const trace = (req: Request) => ({ slug: readSlug(req), requestId: getRequestId(req) })

  /** Answers how the piece stands after a moderator's step. */
  const after = (step: (req: Request, actor: Actor) => Promise<void>): readonly RequestHandler[] => [
    ...readJsonBody,
    async (req, res) => {
      const actor = requireActor(res)
      await step(req, actor)
      sendAnswer(res, await getCare(db, actor, readSlug(req)))
    },
  ]
  const care = (step: CareStep) =>
    after((req, actor) => step(db, actor, { ...parseBody(careRequestSchema, req), ...trace(req) }))

  addEndpoint(router, '/gear/duplicates', {
    get: async (req, res) => sendAnswer(res, await findDuplicates(db, parseQuery(duplicatesQuerySchema, req))),
  })

  addEndpoint(router, '/gear/:slug/care', {
    get: async (req, res) => sendAnswer(res, await getCare(db, requireActor(res), readSlug(req))),
  })

  addEndpoint(router, '/gear/:slug/confirmations', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const request = parseBody(confirmationRequestSchema, req)
        const { isNew, confirmation } = await confirmValue(db, actor, { ...request, ...trace(req) })
        res.status(isNew ? 201 : 200)
        sendAnswer(res, confirmation)
      },
    ],
  })

  addEndpoint(router, '/gear/:slug/reports', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        await reportError(db, getActor(res), { ...parseBody(reportRequestSchema, req), ...trace(req) })
        res.status(201)
        sendAnswer(res, { status: 'kept' })
      },
    ],
  })

  addEndpoint(router, '/gear/:slug/restore', {
    post: after((req, actor) => {
      const seen = readIfMatch(req)
      return restoreRevision(db, actor, { ...parseBody(restoreRequestSchema, req), seen, ...trace(req) })
    }),
  })
  addEndpoint(router, '/gear/:slug/merge', {
    post: after((req, actor) => mergePiece(db, actor, { ...parseBody(mergeRequestSchema, req), ...trace(req) })),
  })
  addEndpoint(router, '/gear/:slug/unmerge', { post: care(unmergePiece) })
  addEndpoint(router, '/gear/:slug/retire', { post: care(retirePiece) })
  addEndpoint(router, '/gear/:slug/unretire', { post: care(unretirePiece) })

  return router
}
