import { Router, type Request, type Response } from 'express'
import type { z } from 'zod'
import { fitCheckRequestSchema, fitRequestSchema } from '#shared/schemas/fit'
import { replacementsRequestSchema } from '#shared/schemas/replacements'
import { addEndpoint } from '../../http/methods'
import { parseBodyOnce, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import type { Catalogue } from '../catalogue/catalogue.service'
import { findSetupIssues } from '../setups/find-setup-issues'
import { checkFit, findFits } from './fit.service'
import { findReplacements } from './replacements.service'

export function createFitRoutes(catalogue: Catalogue): Router {
  const router = Router()
  const parse = <Schema extends z.ZodType>(schema: Schema, req: Request) =>
    parseBodyOnce(schema, req, (body) => findSetupIssues(catalogue, body))

  addEndpoint(router, '/fit', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) =>
        sendAnswer(res, await findFits(catalogue, await parse(fitRequestSchema, req))),
    ],
  })

  addEndpoint(router, '/fit/check', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) =>
        sendAnswer(res, await checkFit(catalogue, await parse(fitCheckRequestSchema, req))),
    ],
  })

  addEndpoint(router, '/replacements', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) =>
        sendAnswer(res, await findReplacements(catalogue, await parse(replacementsRequestSchema, req))),
    ],
  })

  return router
}
