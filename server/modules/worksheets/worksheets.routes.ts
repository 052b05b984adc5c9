import { Router, type Request, type Response } from 'express'
import { createWorksheetSchema } from '#shared/schemas/worksheets'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { createBody, sendAnswer, sendRead, type CachedBody } from '../../http/responses'
import type { Catalogue } from '../catalogue/catalogue.service'
import { listWorksheets, requireWorksheet, workSheet } from './worksheets.service'

export function createWorksheetRoutes(catalogue: Catalogue): Router {
  const router = Router()
  let list: CachedBody | undefined

  addEndpoint(router, '/worksheets', {
    get: (req, res) => {
      list ??= createBody(listWorksheets())
      sendRead(req, res, list)
    },
  })

  addEndpoint(router, '/worksheets/:name', {
    post: [
      ...readJsonBody,
      async (req: Request, res: Response) => {
        const sheet = requireWorksheet(String(req.params.name))
        sendAnswer(res, await workSheet(catalogue, sheet, parseBody(createWorksheetSchema(sheet), req)))
      },
    ],
  })

  return router
}
