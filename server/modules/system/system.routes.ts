import { Router } from 'express'
import type { Database } from '../../db/database'
import type { Lifecycle } from '../../http/lifecycle'
import { addEndpoint } from '../../http/methods'
import type { Catalogue } from '../catalogue/catalogue.service'
import { checkReadiness } from './system.service'

export function createSystemRoutes(db: Database, catalogue: Catalogue, lifecycle: Lifecycle): Router {
  const router = Router()

  addEndpoint(router, '/health', {
    get: (_req, res) => {
      res.set('Cache-Control', 'no-store').json({ status: 'ok' })
    },
  })

  addEndpoint(router, '/ready', {
    get: async (_req, res) => {
      await checkReadiness(db, catalogue, lifecycle.isDraining)
      res.set('Cache-Control', 'no-store').json({ status: 'ready' })
    },
  })

  return router
}
