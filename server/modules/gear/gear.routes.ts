import { Router, type Request, type RequestHandler } from 'express'
import type { Database } from '../../db/database'
import { addEndpoint } from '../../http/methods'
import { readSlug } from '../../http/path-params'
import { createBody, sendRead, type CachedBody } from '../../http/responses'
import { AppError } from '../../lib/errors'
import type { Catalogue } from '../catalogue/catalogue.service'
import { searchGear } from './gear-list.service'
import { parseGearQuery } from './gear-query'
import { getGear, getRevision, getRevisions, getSources, resolveGear } from './gear.service'
import type { GearRow } from './gear.types'

function readRevisionNumber(req: Request): number {
  const text = String(req.params.number)
  if (!/^[1-9][0-9]{0,5}$/.test(text)) throw new AppError('not-found', 'Revisions are numbered from 1.')
  return Number(text)
}

/** RFC 8288: the same question, further on. */
function createNextLink(req: Request, next: string): string {
  const query = new URLSearchParams(req.query as Record<string, string>)
  query.set('cursor', next)
  return `<${req.baseUrl}${req.path}?${query.toString()}>; rel="next"`
}

export function createGearRoutes(db: Database, catalogue: Catalogue): Router {
  const router = Router()

  addEndpoint(router, '/gear', {
    get: async (req, res) => {
      const list = await searchGear(db, catalogue, parseGearQuery({ ...req.query } as Record<string, string>))
      if (list.next !== null) res.set('Link', createNextLink(req, list.next))
      sendRead(req, res, createBody(list))
    },
  })

  /** Answers about a piece, or leads to the one that it was merged into. */
  const about = (suffix: string, answer: (row: GearRow, req: Request) => Promise<CachedBody>): RequestHandler => {
    return async (req, res) => {
      const found = await resolveGear(db, readSlug(req))
      if ('movedTo' in found) res.redirect(301, `/api/v1/gear/${found.movedTo}${suffix}`)
      else sendRead(req, res, await answer(found, req))
    }
  }

  addEndpoint(router, '/gear/:slug', {
    get: about('', async (row) => createBody(await getGear(db, row), `r${row.headRevision}`)),
  })

  addEndpoint(router, '/gear/:slug/sources/:key', {
    get: about('', async (row, req) => createBody(await getSources(db, row, String(req.params.key)))),
  })

  addEndpoint(router, '/gear/:slug/revisions', {
    get: async (req, res) => sendRead(req, res, createBody(await getRevisions(db, readSlug(req)))),
  })

  addEndpoint(router, '/gear/:slug/revisions/:number', {
    get: async (req, res) => {
      const revision = await getRevision(db, readSlug(req), readRevisionNumber(req))
      sendRead(req, res, createBody(revision))
    },
  })

  return router
}
