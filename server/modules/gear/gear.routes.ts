import { Router, type Request } from 'express'
import { slugSchema } from '#shared/schemas/gear'
import type { Database } from '../../db/database'
import { addEndpoint } from '../../http/methods'
import { createBody, sendRead } from '../../http/responses'
import { AppError } from '../../lib/errors'
import type { Catalogue } from '../catalogue/catalogue.service'
import { searchGear } from './gear-list.service'
import { parseGearQuery } from './gear-query'
import { getGear, getRevision, getRevisions } from './gear.service'

/** Text that cannot be a slug names nothing: it is not there, rather than wrongly asked. */
function readSlug(req: Request): string {
  const parsed = slugSchema.safeParse(req.params.slug)
  if (!parsed.success) throw new AppError('not-found', 'There is no piece of gear by that name.')
  return parsed.data
}

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

  addEndpoint(router, '/gear/:slug', {
    get: async (req, res) => sendRead(req, res, createBody(await getGear(db, readSlug(req)))),
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
