import { Router } from 'express'
import { signInSchema } from '#shared/schemas/accounts'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import {
  clearSessionCookie,
  getActor,
  readDevice,
  readSessionId,
  sendDeviceCookie,
  sendSessionCookie,
} from '../../http/session'
import type { AccountContext } from './account-context'
import { presentSession } from './accounts.presenter'
import { sessionLimits } from './session-limits'
import type { Sessions } from './sessions.service'
import { checkSignIn } from './sign-in.service'

/** Signing in and out, and who is signed in. */
export function createSessionRoutes(context: AccountContext, sessions: Sessions, isHttps: boolean): Router {
  const router = Router()
  const endPresent = async (id: string | null) => (id === null ? undefined : sessions.end(id))

  addEndpoint(router, '/session', {
    get: (_req, res) => sendAnswer(res, presentSession(getActor(res))),
    post: [
      ...readJsonBody,
      async (req, res) => {
        const proven = await checkSignIn(context, parseBody(signInSchema, req), readDevice(req, isHttps))
        const id = await sessions.start(proven.personId, req.get('User-Agent') ?? null)
        await endPresent(readSessionId(req, isHttps))
        sendDeviceCookie(res, isHttps, proven.device)
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
