import { Router } from 'express'
import { z } from 'zod'
import { emailChangeSchema, goodbyeSchema, meChangeSchema, passwordChangeSchema } from '#shared/schemas/accounts'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import { sendAnswer } from '../../http/responses'
import { clearSessionCookie, getSessionPublicId, requireActor } from '../../http/session'
import { AppError } from '../../lib/errors'
import type { AccountContext } from './account-context'
import { presentMe, presentSessions } from './accounts.presenter'
import { changeEmail, changeMe, changePassword, deleteMe, getMe } from './me.service'
import type { Sessions } from './sessions.service'

const uuidSchema = z.uuid()

/** One's own account. */
export function createMeRoutes(context: AccountContext, sessions: Sessions, isHttps: boolean): Router {
  const router = Router()

  addEndpoint(router, '/me', {
    get: async (_req, res) => sendAnswer(res, presentMe(await getMe(context, requireActor(res)))),
    patch: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        await changeMe(context, actor, parseBody(meChangeSchema, req))
        sendAnswer(res, presentMe(await getMe(context, actor)))
      },
    ],
    delete: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        await deleteMe(context, actor, parseBody(goodbyeSchema, req).password)
        clearSessionCookie(res, isHttps)
        res.status(204).end()
      },
    ],
  })
  addEndpoint(router, '/me/email', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        await changeEmail(context, actor, parseBody(emailChangeSchema, req))
        res.status(202)
        sendAnswer(res, { message: 'A letter is on its way to the new address, which counts once its link is opened.' })
      },
    ],
  })
  addEndpoint(router, '/me/password', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const actor = requireActor(res)
        const change = parseBody(passwordChangeSchema, req)
        await changePassword(context, actor, change, getSessionPublicId(res))
        res.status(204).end()
      },
    ],
  })
  addEndpoint(router, '/me/sessions', {
    get: async (_req, res) => {
      const actor = requireActor(res)
      sendAnswer(res, presentSessions(await sessions.list(actor.id), getSessionPublicId(res)))
    },
  })
  addEndpoint(router, '/me/sessions/:id', {
    delete: async (req, res) => {
      const actor = requireActor(res)
      const { id } = req.params as { id: string }
      const isEnded = uuidSchema.safeParse(id).success && (await sessions.endOwn(actor.id, id))
      if (!isEnded) throw new AppError('not-found', 'You have no such session.')
      res.status(204).end()
    },
  })

  return router
}
