import type { Request, RequestHandler } from 'express'
import { AppError } from '../lib/errors'
import { readSessionId } from './session'

const reading = new Set(['GET', 'HEAD', 'OPTIONS'])

const refusal =
  'This was sent from another site, so nothing was changed. Do it on the page of this site that offers it.'

/** The configured origin, or the host that was asked: the one that a script elsewhere cannot choose is the Origin. */
function isOwnOrigin(origin: string, req: Request, publicOrigin: string | undefined): boolean {
  if (!URL.canParse(origin)) return false
  const { origin: given, host } = new URL(origin)
  return given === publicOrigin || host === req.headers.host
}

/**
 * Refuses writes that another site makes a browser send. `same-site` is refused too: a neighbour under one domain is not
 * this site. A session's cookie alone, with neither header, proves no page of ours; programs have keys instead.
 */
export function createOriginCheck(isHttps: boolean, publicOrigin: string | undefined): RequestHandler {
  return (req, _res, next) => {
    if (reading.has(req.method)) return next()
    const site = req.get('Sec-Fetch-Site')
    const origin = req.get('Origin')
    if (site !== undefined && site !== 'same-origin' && site !== 'none') throw new AppError('forbidden', refusal)
    if (origin !== undefined && !isOwnOrigin(origin, req, publicOrigin)) throw new AppError('forbidden', refusal)
    if (site === undefined && origin === undefined && readSessionId(req, isHttps) !== null) {
      throw new AppError('forbidden', 'A cookie alone signs no change: send the header Origin or Sec-Fetch-Site too.')
    }
    next()
  }
}
