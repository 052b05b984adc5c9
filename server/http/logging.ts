import { randomUUID } from 'node:crypto'
import type { IncomingMessage, ServerResponse } from 'node:http'
import { pinoHttp } from 'pino-http'
import type { Logger } from '../lib/logger'

const requestIdForm = /^[A-Za-z0-9_-]{8,64}$/

/** A caller's own id is kept, so that a page and the calls it makes share one; anything odd is replaced. */
function createRequestId(req: IncomingMessage, res: ServerResponse): string {
  const given = req.headers['x-request-id']
  const id = typeof given === 'string' && requestIdForm.test(given) ? given : randomUUID()
  res.setHeader('X-Request-Id', id)
  return id
}

export function getRequestId(req: IncomingMessage): string {
  return typeof req.id === 'string' ? req.id : ''
}

/** One record per request. The query is left out: it holds what somebody owns. */
export function createRequestLog(logger: Logger) {
  return pinoHttp({
    logger,
    genReqId: createRequestId,
    quietReqLogger: true,
    serializers: {
      req: (req: { method: string; url: string }) => ({
        method: req.method,
        path: req.url.split('?', 1)[0],
      }),
      res: (res: { statusCode: number }) => ({ status: res.statusCode }),
    },
    customLogLevel: (_req, res, error) => (error !== undefined || res.statusCode >= 500 ? 'error' : 'info'),
  })
}
