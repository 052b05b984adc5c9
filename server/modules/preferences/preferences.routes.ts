import express, { Router, type Request, type RequestHandler, type Response } from 'express'
import { preferencesSchema, type Preferences } from '#shared/schemas/preferences'
import { addEndpoint } from '../../http/methods'
import { parseBody, parseQuery, refuseRepeatedKeys } from '../../http/requests'
import { readSafeNext } from '../../http/safe-next'

const millisecondsPerYear = 365 * 24 * 60 * 60 * 1000

/** Chooses units and theme by a plain form or link, so that both switches work without a script. */
export function createPreferenceRoutes(isHttps: boolean): Router {
  const router = Router()

  function keep(res: Response, { units, theme, next }: Preferences): void {
    const options = { maxAge: millisecondsPerYear, sameSite: 'lax', secure: isHttps, path: '/' } as const
    if (units !== undefined) res.cookie('units', units, options)
    if (theme !== undefined) res.cookie('theme', theme, options)
    res.set('Cache-Control', 'no-store').redirect(303, readSafeNext(next))
  }

  const readForm: RequestHandler = express.urlencoded({ extended: false, limit: '16kb' })

  addEndpoint(router, '/preferences', {
    get: [refuseRepeatedKeys, (req: Request, res: Response) => keep(res, parseQuery(preferencesSchema, req))],
    post: [readForm, (req: Request, res: Response) => keep(res, parseBody(preferencesSchema, req))],
  })

  return router
}
