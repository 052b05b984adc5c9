import { Router, type Request, type Response } from 'express'
import { askRequestSchema } from '#shared/schemas/ask'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import type { Catalogue } from '../catalogue/catalogue.service'
import { createAsk } from './ask.service'

export function createAskRoutes(catalogue: Catalogue): Router {
  const router = Router()
  const ask = createAsk(catalogue)

  addEndpoint(router, '/ask', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) => sendAnswer(res, await ask(parseBody(askRequestSchema, req))),
    ],
  })

  return router
}
