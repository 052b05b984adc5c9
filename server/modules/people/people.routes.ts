import { Router } from 'express'
import { adminPeopleQuerySchema, personChangeSchema } from '#shared/schemas/people'
import type { Database } from '../../db/database'
import { getRequestId } from '../../http/logging'
import { addEndpoint } from '../../http/methods'
import { parseBody, parseQuery, readJsonBody } from '../../http/requests'
import { createBody, sendAnswer, sendRead } from '../../http/responses'
import { getActor, requireAdmin } from '../../http/session'
import { changePerson, findPeople } from './admin-people.service'
import { getPerson } from './people.service'

/** People as everybody sees them, and as admins look after them. */
export function createPeopleRoutes(db: Database, origin: string): Router {
  const router = Router()

  addEndpoint(router, '/people/:name', {
    get: async (req, res) => {
      const { name } = req.params as { name: string }
      const actor = getActor(res)
      const person = await getPerson(db, name, actor)
      res.vary('Cookie')
      if (actor === null) sendRead(req, res, createBody(person))
      else sendAnswer(res, person)
    },
  })
  addEndpoint(router, '/admin/people', {
    get: async (req, res) => {
      const people = await findPeople(db, requireAdmin(res), parseQuery(adminPeopleQuerySchema, req))
      if (people.next !== null) {
        const query = new URLSearchParams({ ...(req.query as Record<string, string>), cursor: people.next })
        res.set('Link', `<${req.baseUrl}${req.path}?${query.toString()}>; rel="next"`)
      }
      sendAnswer(res, people)
    },
  })
  addEndpoint(router, '/admin/people/:name', {
    patch: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireAdmin(res)
        const { name } = req.params as { name: string }
        const request = { name, change: parseBody(personChangeSchema, req), origin, requestId: getRequestId(req) }
        sendAnswer(res, await changePerson(db, actor, request))
      },
    ],
  })

  return router
}
