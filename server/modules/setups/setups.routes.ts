import { Router, type Request, type Response } from 'express'
import { reportRequestSchema } from '#shared/schemas/fit'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import type { Catalogue } from '../catalogue/catalogue.service'
import { reportSetup } from './setups.service'

export function createSetupRoutes(catalogue: Catalogue): Router {
  const router = Router()
  addEndpoint(router, '/setups/report', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) => {
        const { setup } = parseBody(reportRequestSchema, req)
        sendAnswer(res, await reportSetup(catalogue, setup))
      },
    ],
  })
  return router
}
