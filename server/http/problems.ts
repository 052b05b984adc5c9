import type { ErrorCode } from '../lib/errors'

interface ProblemKind {
  readonly status: number
  readonly title: string
  readonly retryAfterSeconds?: number
}

/** The one place where an error's code becomes an HTTP status. */
export const problemKinds: Readonly<Record<ErrorCode | 'internal', ProblemKind>> = {
  malformed: { status: 400, title: 'The request could not be read' },
  unauthenticated: { status: 401, title: 'Please sign in first' },
  forbidden: { status: 403, title: 'That is not yours to do' },
  'not-found': { status: 404, title: 'There is nothing here' },
  'method-not-allowed': { status: 405, title: 'That method does not work here' },
  conflict: { status: 409, title: 'The present state forbids it' },
  gone: { status: 410, title: 'This was taken out of the catalogue' },
  stale: { status: 412, title: 'Somebody changed it meanwhile' },
  'too-large': { status: 413, title: 'The request is too large' },
  'unsupported-media-type': { status: 415, title: 'That media type is not read here' },
  invalid: { status: 422, title: 'Some fields need another look' },
  'precondition-required': { status: 428, title: 'Say which version you are changing' },
  'too-many-requests': { status: 429, title: 'Too many requests' },
  internal: { status: 500, title: 'Something went wrong on our side' },
  unavailable: { status: 503, title: 'The catalogue cannot be reached just now', retryAfterSeconds: 5 },
}
