import { Router, type Request, type Response } from 'express'
import { fitCheckRequestSchema, fitRequestSchema } from '#shared/schemas/fit'
import { replacementsRequestSchema } from '#shared/schemas/replacements'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import type { Catalogue } from '../catalogue/catalogue.service'
import { checkFit, findFits } from './fit.service'
import { findReplacements } from './replacements.service'

export function createFitRoutes(catalogue: Catalogue): Router {
  const router = Router()

  addEndpoint(router, '/fit', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) =>
        sendAnswer(res, await findFits(catalogue, parseBody(fitRequestSchema, req))),
    ],
  })

  addEndpoint(router, '/fit/check', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) =>
        sendAnswer(res, await checkFit(catalogue, parseBody(fitCheckRequestSchema, req))),
    ],
  })

  addEndpoint(router, '/replacements', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) =>
        sendAnswer(res, await findReplacements(catalogue, parseBody(replacementsRequestSchema, req))),
    ],
  })

  return router
}
