import { Router } from 'express'
import { addEndpoint } from '../../http/methods'
import { createBody, sendRead, type CachedBody } from '../../http/responses'
import { createOpenApiDocument } from './openapi.service'

export function createOpenApiRoutes(origin: string | undefined): Router {
  const router = Router()
  let body: CachedBody | undefined
  addEndpoint(router, '/openapi.json', {
    get: (req, res) => {
      body ??= createBody(createOpenApiDocument(origin))
      sendRead(req, res, body)
    },
  })
  return router
}
