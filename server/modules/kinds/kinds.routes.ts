import { Router } from 'express'
import { addEndpoint } from '../../http/methods'
import { createBody, sendRead } from '../../http/responses'
import { listKinds } from './kinds.service'

export function createKindRoutes(): Router {
  const router = Router()
  const body = createBody(listKinds())
  addEndpoint(router, '/kinds', { get: (req, res) => sendRead(req, res, body) })
  return router
}
