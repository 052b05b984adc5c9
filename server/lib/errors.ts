/** One wrong field: where it is (a JSON pointer such as `#/setup/tank/wallMm`) and what is wrong with it. */
export interface Issue {
  readonly pointer: string
  readonly detail: string
}

export type ErrorCode =
  | 'malformed'
  | 'unauthenticated'
  | 'forbidden'
  | 'not-found'
  | 'method-not-allowed'
  | 'conflict'
  | 'gone'
  | 'stale'
  | 'precondition-required'
  | 'too-large'
  | 'unsupported-media-type'
  | 'invalid'
  | 'too-many-requests'
  | 'unavailable'

interface AppErrorOptions extends ErrorOptions {
  readonly extra?: Readonly<Record<string, unknown>>
  readonly retryAt?: Date
}

/** What a service throws when it cannot do what was asked. It knows no HTTP: one table in server/http turns codes into statuses. */
export class AppError extends Error {
  readonly code: ErrorCode
  readonly issues: readonly Issue[]
  /** Members that the problem document carries beside the usual ones, such as `current` of something stale. */
  readonly extra: Readonly<Record<string, unknown>>
  /** When it is worth trying again. */
  readonly retryAt: Date | undefined

  constructor(code: ErrorCode, detail: string, issues: readonly Issue[] = [], options: AppErrorOptions = {}) {
    super(detail, options)
    this.name = 'AppError'
    this.code = code
    this.issues = issues
    this.extra = options.extra ?? {}
    this.retryAt = options.retryAt
  }
}

/** Every wrong field of one request in one error. */
export function createInvalidError(issues: readonly Issue[]): AppError {
  const [first, ...others] = issues
  const detail =
    first !== undefined && others.length === 0
      ? `${first.pointer} ${first.detail}.`
      : `${issues.length} fields need another look.`
  return new AppError('invalid', detail, issues)
}
