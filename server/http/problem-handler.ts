import type { ErrorRequestHandler, Request, RequestHandler, Response } from 'express'
import type { Problem } from '#shared/schemas/problem'
import { AppError } from '../lib/errors'
import type { ErrorPage } from './error-page'
import { getRequestId } from './logging'
import { problemKinds } from './problems'
import { toAppError } from './to-app-error'

const internalDetail = 'The request was fine; we failed it. The request id below helps us find out why.'

function toProblem(req: Request, error: AppError | null): Problem {
  const code = error?.code ?? 'internal'
  const { status, title } = problemKinds[code]
  return {
    ...error?.extra,
    type: `urn:stillfits:problem:${code}`,
    title,
    status,
    detail: error?.message ?? internalDetail,
    instance: req.originalUrl.split('?', 1)[0] ?? '/',
    requestId: getRequestId(req),
    ...(error !== null && error.issues.length > 0 && { errors: [...error.issues] }),
  }
}

/** Programs get the problem document; only a person's browser outside the API gets a page. */
function wantsPage(req: Request): boolean {
  const isPage = !/^\/(api|health|ready)(\/|$)/.test(req.path)
  return isPage && req.accepts(['application/problem+json', 'text/html']) === 'text/html'
}

function sendProblem(req: Request, res: Response, problem: Problem, errorPage: ErrorPage): void {
  res.status(problem.status)
  res.removeHeader('ETag')
  res.set('Cache-Control', 'no-store')
  if (wantsPage(req)) res.type('html').send(errorPage(problem))
  else res.type('application/problem+json').send(JSON.stringify(problem))
}

function findRetryAfter(error: AppError | null): number | undefined {
  if (error?.retryAt === undefined) return problemKinds[error?.code ?? 'internal'].retryAfterSeconds
  return Math.max(1, Math.ceil((error.retryAt.getTime() - Date.now()) / 1000))
}

/** Turns whatever was thrown into an RFC 9457 document, or into a page for people. What nobody foresaw is logged, never shown. */
export function createProblemHandler(errorPage: ErrorPage): ErrorRequestHandler {
  return (error: unknown, req, res, next) => {
    const known = toAppError(error)
    if (known === null || known.code === 'unavailable')
      res.err = error instanceof Error ? error : new Error(String(error))
    if (res.headersSent) return next(error)
    const problem = toProblem(req, known)
    const retryAfter = findRetryAfter(known)
    if (retryAfter !== undefined) res.set('Retry-After', String(retryAfter))
    sendProblem(req, res, problem, errorPage)
  }
}

export const refuseUnknownPath: RequestHandler = (req) => {
  throw new AppError('not-found', `Nothing is kept at ${req.path.slice(0, 200)}.`)
}
