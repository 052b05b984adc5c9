import { Router } from 'express'
import { signInSchema } from '#shared/schemas/accounts'
import type { Database } from '../../db/database'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { clearSessionCookie, getActor, readSessionId, sendSessionCookie } from '../../http/session'
import { presentSession } from './accounts.presenter'
import { sessionLimits } from './session-limits'
import type { Sessions } from './sessions.service'
import { checkSignIn } from './sign-in.service'

/** Signing in and out, and who is signed in. */
export function createSessionRoutes(db: Database, sessions: Sessions, isHttps: boolean): Router {
  const router = Router()
  const endPresent = async (id: string | null) => (id === null ? undefined : sessions.end(id))

  addEndpoint(router, '/session', {
    get: (_req, res) => sendAnswer(res, presentSession(getActor(res))),
    post: [
      ...readJsonBody,
      async (req, res) => {
        const person = await checkSignIn(db, parseBody(signInSchema, req))
        const id = await sessions.start(person.id, req.get('User-Agent') ?? null)
        await endPresent(readSessionId(req, isHttps))
        sendSessionCookie(res, isHttps, id, sessionLimits.absoluteMs)
        sendAnswer(res, presentSession((await sessions.find(id))?.actor ?? null))
      },
    ],
    delete: async (req, res) => {
      await endPresent(readSessionId(req, isHttps))
      clearSessionCookie(res, isHttps)
      res.set('Cache-Control', 'private, no-store').status(204).end()
    },
  })

  return router
}
