import { isRouteErrorResponse } from 'react-router-dom'
import type { Head } from '../lib/head'
import { ApiError } from '../lib/problem'

export interface Failure {
  readonly status: number
  /** Over the page; `title` and `detail` say more. */
  readonly heading: string
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

const signedOut = {
  heading: 'For people who are signed in',
  title: 'Who you are is not known here',
  detail: 'Sign in, and you come straight back to it.',
}

const forbidden = {
  heading: 'Not open to you',
  title: 'Your account has no part in this page',
  detail: 'Roles are given by the people who run this site. If you had one a moment ago, it was changed since.',
}

const gone = {
  heading: 'Taken out of the record',
  title: 'This was retired',
  detail: 'It is no longer shown. What was said of it is kept.',
}

const broken = {
  title: 'Something went wrong on our side',
  detail: 'Nothing you typed is lost: it is in the address of this page. Trying again often helps.',
}

const unshown = 'This page could not be shown'

/** Whatever a page threw, in words. */
export function describeFailure(error: unknown): Failure {
  const status = error instanceof ApiError ? error.status : isRouteErrorResponse(error) ? error.status : 500
  const given = isRouteErrorResponse(error) ? ((error.data ?? {}) as FailureData) : {}
  const requestId = error instanceof ApiError ? error.requestId : given.requestId
  const withRequest = requestId === undefined ? {} : { requestId }
  const isAway = status === 503 || status === 502 || status === 0
  if (isAway) return { status: 503, heading: 'Away for a moment', ...away, isAway, ...withRequest }
  if (status === 401) return { status, ...signedOut, isAway }
  if (status === 403) return { status, ...forbidden, ...(given.detail && { detail: given.detail }), isAway }
  if (status === 404) return { status, heading: 'Not found', ...notFound, isAway }
  if (status === 410) return { status, ...gone, ...(given.detail && { detail: given.detail }), isAway }
  if (status >= 400 && status < 500 && given.title && given.detail)
    return { status, heading: unshown, title: given.title, detail: given.detail, isAway, ...withRequest }
  return { status: status >= 400 ? status : 500, heading: unshown, ...broken, isAway, ...withRequest }
}

export function describeFailureHead(error: unknown): Head {
  const { title, detail, isAway } = describeFailure(error)
  return { title, description: detail, isUnlisted: true, ...(isAway && { refreshSeconds: 8 }) }
}
