import type { RouteConfig } from '@asteasolutions/zod-to-openapi'
import type { z } from 'zod'
import { problemSchema } from '#shared/schemas/problem'

const problemTexts = {
  400: 'The body is not JSON, or a header is malformed',
  401: 'Nobody is signed in',
  403: 'Whoever is signed in may not do this, or it was sent from another site',
  404: 'There is nothing by that name',
  409: 'The present state forbids it',
  410: 'It was taken out of the catalogue',
  412: 'Somebody changed it meanwhile; `current` is how it stands',
  413: 'The body is too large',
  415: 'The body is not sent as application/json',
  422: 'Some fields are wrong; `errors` names each of them',
  428: 'Say with `If-Match` which version is changed',
  429: 'Too many requests; `Retry-After` says when there is room again',
  503: 'The database does not answer; `Retry-After` says when to try again',
} as const

export type ProblemStatus = keyof typeof problemTexts

export function describeProblems(...statuses: ProblemStatus[]): RouteConfig['responses'] {
  const content = { 'application/problem+json': { schema: problemSchema } }
  return Object.fromEntries(statuses.map((status) => [status, { description: problemTexts[status], content }]))
}

/** Who may call: anybody, whoever is signed in, or only those with a role. */
export type Access = 'anyone' | 'member' | 'moderator' | 'admin'

export interface CallDescription {
  readonly method: 'get' | 'post' | 'put' | 'patch' | 'delete'
  readonly path: string
  readonly summary: string
  readonly tag: string
  readonly access: Access
  readonly params?: z.ZodObject
  readonly query?: z.ZodObject
  readonly headers?: z.ZodObject
  readonly body?: z.ZodType
  readonly example?: unknown
  /** The status of success, with what it answers; nothing: an empty body. */
  readonly success: readonly [status: number, answer?: z.ZodType]
  readonly problems?: readonly ProblemStatus[]
}

const problemsOfAccess: Readonly<Record<Access, readonly ProblemStatus[]>> = {
  anyone: [],
  member: [401],
  moderator: [401, 403],
  admin: [401, 403],
}

/** A call of the kind that knows who is signed in; `x-access` says who may make it. */
export function describeCall(call: CallDescription): RouteConfig {
  const { method, path, summary, tag, access, params, query, headers, body, example, success, problems = [] } = call
  const [status, answer] = success
  const isWrite = method !== 'get'
  const named: ProblemStatus[] = [
    ...problemsOfAccess[access],
    ...(isWrite ? ([403] as const) : []),
    ...(body === undefined ? [] : ([400, 413, 415, 422] as const)),
    ...problems,
    429,
    503,
  ]
  return {
    method,
    path,
    summary,
    tags: [tag],
    'x-access': access,
    ...(access !== 'anyone' && { security: [{ session: [] }] }),
    request: {
      ...(params !== undefined && { params }),
      ...(query !== undefined && { query }),
      ...(headers !== undefined && { headers }),
      ...(body !== undefined && {
        body: {
          required: true,
          content: { 'application/json': { schema: body, ...(example !== undefined && { example }) } },
        },
      }),
    },
    responses: {
      [status]: {
        description: summary,
        ...(answer !== undefined && { content: { 'application/json': { schema: answer } } }),
      },
      ...describeProblems(...new Set(named)),
    },
  }
}
