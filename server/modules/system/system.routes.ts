import { Router } from 'express'
import type { Database } from '../../db/database'
import type { Lifecycle } from '../../http/lifecycle'
import { addEndpoint } from '../../http/methods'
import { AppError } from '../../lib/errors'
import { pingDatabase } from './system.queries'

export function createSystemRoutes(db: Database, lifecycle: Lifecycle): Router {
  const router = Router()

  addEndpoint(router, '/health', {
    get: (_req, res) => {
      res.set('Cache-Control', 'no-store').json({ status: 'ok' })
    },
  })

  addEndpoint(router, '/ready', {
    get: async (_req, res) => {
      if (lifecycle.isDraining) throw new AppError('unavailable', 'This process is shutting down.')
      await pingDatabase(db)
      res.set('Cache-Control', 'no-store').json({ status: 'ready' })
    },
  })

  return router
}
