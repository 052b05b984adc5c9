import { Router, type Request, type Response } from 'express'
import { reportRequestSchema } from '#shared/schemas/fit'
import { addEndpoint } from '../../http/methods'
import { parseBodyOnce, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import type { Catalogue } from '../catalogue/catalogue.service'
import { findSetupIssues } from './find-setup-issues'
import { reportSetup } from './setups.service'

export function createSetupRoutes(catalogue: Catalogue): Router {
  const router = Router()
  addEndpoint(router, '/setups/report', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) => {
        const { setup } = await parseBodyOnce(reportRequestSchema, req, (body) => findSetupIssues(catalogue, body))
        sendAnswer(res, await reportSetup(catalogue, setup))
      },
    ],
  })
  return router
}
