import type { RequestListener } from 'node:http'
import type { Express, Request } from 'express'
import inject from 'light-my-request'
import { getRequestId } from './logging'

export interface PageFetchInit {
  readonly method?: string
  readonly headers?: Readonly<Record<string, string>>
  readonly body?: string
}

/** The part of `fetch` that a page's loaders use. */
export type PageFetch = (path: string, init?: PageFetchInit) => Promise<globalThis.Response>

const withoutBody = new Set([204, 304])

/** Headers of the visit that the page's own calls carry on. The address goes as the connection's own, so it cannot be made up. */
function carryHeaders(req: Request): Record<string, string> {
  const { cookie } = req.headers
  return { 'x-request-id': getRequestId(req), 'sec-fetch-site': 'same-origin', ...(cookie !== undefined && { cookie }) }
}

/**
 * Express gives every request and response its own prototypes, which would take away how an in-process answer is
 * collected. Given the application itself, the library would change those prototypes for real visitors too.
 */
function keepOwnMethods(message: object): void {
  const prototype = Object.getPrototypeOf(message) as Record<string, unknown>
  for (const name of Object.getOwnPropertyNames(prototype)) {
    if (name === 'constructor' || Object.hasOwn(message, name)) continue
    Object.defineProperty(message, name, { value: prototype[name], writable: true, configurable: true })
  }
}

function dispatchTo(app: Express): RequestListener {
  return (req, res) => {
    keepOwnMethods(req)
    keepOwnMethods(res)
    app(req, res)
  }
}

/** Calls the application in process, as the visitor: same cookie, same address, same limits, no socket. */
export function createPageFetch(app: Express, req: Request): PageFetch {
  const dispatch = dispatchTo(app)
  return async (path, init = {}) => {
    if (!path.startsWith('/') || path.startsWith('//'))
      throw new TypeError(`A page calls its own site only, not ${path}`)
    const answer = await inject(dispatch, {
      method: init.method ?? 'GET',
      url: path,
      headers: { ...init.headers, ...carryHeaders(req) },
      remoteAddress: req.ip ?? '127.0.0.1',
      ...(init.body !== undefined && { payload: init.body }),
    })
    const headers = new Headers()
    for (const [name, value] of Object.entries(answer.headers)) {
      if (value !== undefined) headers.set(name, String(value))
    }
    const body = withoutBody.has(answer.statusCode) ? null : new Uint8Array(answer.rawPayload)
    return new Response(body, { status: answer.statusCode, headers })
  }
}
