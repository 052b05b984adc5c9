import { Router, type Response } from 'express'
import { confirmSchema, resetRequestSchema, resetSchema, signUpSchema } from '#shared/schemas/accounts'
import { addEndpoint } from '../../http/methods'
import { parseBody, readJsonBody } from '../../http/requests'
import type { AccountContext } from './account-context'
import { askForReset, resetPassword } from './resets.service'
import { confirmAddress, signUp } from './sign-up.service'

function sendMessage(res: Response, status: number, message: string): void {
  res.set('Cache-Control', 'private, no-store').status(status).json({ message })
}

/** Signing up, and the links in letters. */
export function createSignUpRoutes(context: AccountContext): Router {
  const router = Router()

  addEndpoint(router, '/people', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        await signUp(context, parseBody(signUpSchema, req))
        sendMessage(res, 202, 'A letter is on its way to this address. The link in it works for two days.')
      },
    ],
  })
  addEndpoint(router, '/people/confirm', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        const confirmed = await confirmAddress(context, parseBody(confirmSchema, req).token)
        const address = confirmed === 'account' ? 'Your address is confirmed.' : 'Your new address is confirmed.'
        sendMessage(
          res,
          200,
          `${address} ${confirmed === 'account' ? 'Sign in with it now.' : 'Sign in with it from now on.'}`,
        )
      },
    ],
  })
  addEndpoint(router, '/password-resets', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        await askForReset(context, parseBody(resetRequestSchema, req).email)
        sendMessage(res, 202, 'If this address has an account, a letter is on its way. Its link works for an hour.')
      },
    ],
  })
  addEndpoint(router, '/password-resets/confirm', {
    post: [
      ...readJsonBody,
      async (req, res) => {
        await resetPassword(context, parseBody(resetSchema, req))
        sendMessage(res, 200, 'Your new password is set, and every session has ended. Sign in with it now.')
      },
    ],
  })

  return router
}
