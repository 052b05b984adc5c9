import { Router } from 'express'
import type { AccountContext } from './account-context'
import { createMeRoutes } from './me.routes'
import { createSessionRoutes } from './session.routes'
import type { Sessions } from './sessions.service'
import { createSignUpRoutes } from './sign-up.routes'

export function createAccountRoutes(context: AccountContext, sessions: Sessions, isHttps: boolean): Router {
  const router = Router()
  router.use(createSessionRoutes(context, sessions, isHttps))
  router.use(createSignUpRoutes(context))
  router.use(createMeRoutes(context, sessions, isHttps))
  return router
}
