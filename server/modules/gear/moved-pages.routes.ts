import { Router } from 'express'
import type { Database } from '../../db/database'
import { readSlug } from '../../http/path-params'
import { AppError } from '../../lib/errors'
import { resolveGear } from './gear.service'

/** Leads from the pages of a merged piece to those of the one that it was merged into. */
export function createMovedPageRoutes(db: Database): Router {
  const router = Router()
  router.get(['/gear/:slug', '/gear/:slug/:page'], async (req, res, next) => {
    const found = await resolveGear(db, readSlug(req)).catch((error: unknown) => {
      // The page itself says what is wrong with a piece that is not there.
      if (error instanceof AppError) return null
      throw error
    })
    if (found === null || !('movedTo' in found)) return next()
    const page = typeof req.params.page === 'string' ? `/${encodeURIComponent(req.params.page)}` : ''
    res.redirect(301, `/gear/${found.movedTo}${page}`)
  })
  return router
}
