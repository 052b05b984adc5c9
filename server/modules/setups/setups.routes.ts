import { Router } from 'express'
import { reportRequestSchema } from '#shared/schemas/fit'
import { addEndpoint } from '../../http/methods'
import { parseBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import type { Catalogue } from '../catalogue/catalogue.service'
import { reportSetup } from './setups.service'

export function createSetupRoutes(catalogue: Catalogue): Router {
  const router = Router()
  addEndpoint(router, '/setups/report', {
    post: async (req, res) => {
      const { setup } = parseBody(reportRequestSchema, req)
      sendAnswer(res, await reportSetup(catalogue, setup))
    },
  })
  return router
}
