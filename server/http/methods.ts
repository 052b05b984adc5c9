import type { RequestHandler, Router } from 'express'
import { AppError } from '../lib/errors'

type Method = 'get' | 'post' | 'put' | 'patch' | 'delete'
type Handlers = Partial<Record<Method, RequestHandler | readonly RequestHandler[]>>

/** Throws a 405 that names what does work. */
export function refuseMethod(allowed: readonly string[]): RequestHandler {
  return (req, res) => {
    res.set('Allow', allowed.join(', '))
    if (req.method === 'OPTIONS') {
      res.status(204).end()
      return
    }
    throw new AppError('method-not-allowed', `${req.method} does not work here; ${allowed.join(', ')} does.`)
  }
}

/** Registers a path with its handlers, and a clear 405 for every other method on it. */
export function addEndpoint(router: Router, path: string, handlers: Handlers): void {
  const allowed: string[] = []
  for (const method of ['get', 'post', 'put', 'patch', 'delete'] as const) {
    const handler = handlers[method]
    if (handler === undefined) continue
    router[method](path, ...[handler].flat())
    allowed.push(...(method === 'get' ? ['GET', 'HEAD'] : [method.toUpperCase()]))
  }
  router.all(path, refuseMethod([...allowed, 'OPTIONS']))
}

/** Methods that nothing here answers, and that some servers echo or tunnel. */
export const refuseOddMethods: RequestHandler = (req, res, next) => {
  if (req.method === 'TRACE' || req.method === 'TRACK' || req.method === 'CONNECT') {
    refuseMethod(['GET', 'HEAD', 'POST', 'OPTIONS'])(req, res, next)
    return
  }
  next()
}

/** Names that begin with a dot are the business of the machine (`.git`, `.env`). */
export const refuseDotFiles: RequestHandler = (req, _res, next) => {
  if (/(^|\/|%2f)(\.|%2e)/i.test(req.path)) throw new AppError('not-found', 'There is nothing here.')
  next()
}
