import { isRouteErrorResponse } from 'react-router-dom'
import type { Head } from '../lib/head'
import { ApiError } from '../lib/problem'

export interface Failure {
  readonly status: number
  readonly title: string
  readonly detail: string
  readonly isAway: boolean
  readonly requestId?: string
}

/** What a loader throws for an answer of the API: survives server rendering, unlike an error object. */
export interface FailureData {
  readonly title?: string
  readonly detail?: string
  readonly requestId?: string
}

const notFound = {
  title: 'There is nothing at this address',
  detail: 'The link may be mistyped, or what it pointed at was moved. The finder and the method page are above.',
}

const away = {
  title: 'The catalogue cannot be reached just now',
  detail:
    'Your setup is safe: it lives in the address of this page. This page tries again by itself every few seconds and comes back on its own.',
}

const broken = {
  title: 'Something went wrong on our side',
  detail: 'Nothing you typed is lost: it is in the address of this page. Trying again often helps.',
}

/** Whatever a page threw, in words. */
export function describeFailure(error: unknown): Failure {
  const status = error instanceof ApiError ? error.status : isRouteErrorResponse(error) ? error.status : 500
  const given = isRouteErrorResponse(error) ? ((error.data ?? {}) as FailureData) : {}
  const requestId = error instanceof ApiError ? error.requestId : given.requestId
  const withRequest = requestId === undefined ? {} : { requestId }
  if (status === 404) return { status, ...notFound, isAway: false }
  if (status === 503 || status === 502 || status === 0) return { status: 503, ...away, isAway: true, ...withRequest }
  if (status >= 400 && status < 500 && given.title && given.detail)
    return { status, title: given.title, detail: given.detail, isAway: false, ...withRequest }
  return { status: status >= 400 ? status : 500, ...broken, isAway: false, ...withRequest }
}

export function describeFailureHead(error: unknown): Head {
  const { title, detail, isAway } = describeFailure(error)
  return { title, description: detail, isUnlisted: true, ...(isAway && { refreshSeconds: 8 }) }
}
