import type { Problem } from '#shared/schemas/problem'

/** A request that did not succeed: the server's problem document, or `status` 0 where nothing answered. */
export class ApiError extends Error {
  override readonly name = 'ApiError'
  readonly status: number
  readonly title: string
  readonly requestId: string | undefined
  readonly errors: readonly { readonly pointer: string; readonly detail: string }[]
  /** Of something stale: how it stands now. */
  readonly current: unknown

  constructor(status: number, title: string, detail: string, problem: Partial<Problem> = {}) {
    super(detail)
    this.status = status
    this.title = title
    this.requestId = problem.requestId
    this.errors = problem.errors ?? []
    this.current = problem.current
  }
}

/** What was asked contradicts itself or names what is not there: as much an answer as any other, every part of it named. */
export interface Refused {
  readonly refused: ApiError['errors']
}

export const isRefused = (answer: object): answer is Refused => 'refused' in answer

/** The refusal that an error is; any other error goes on. */
export function takeRefusal(error: unknown): Refused {
  if (error instanceof ApiError && error.status === 422) return { refused: error.errors }
  throw error
}

/** Away for the moment: worth asking again without being told to. */
export function isAway(error: unknown): boolean {
  return error instanceof ApiError && (error.status === 0 || error.status === 502 || error.status === 503)
}

export function isNotFound(error: unknown): boolean {
  return error instanceof ApiError && error.status === 404
}

export function toApiError(error: unknown): ApiError {
  if (error instanceof ApiError) return error
  return new ApiError(500, 'Something went wrong on our side', 'The page could not make sense of what it was sent.')
}

/** Never throws: an answer that is no problem document, such as a proxy's own page, still becomes an error in words. */
export async function readProblem(response: Response): Promise<ApiError> {
  const text = await response.text().catch(() => '')
  try {
    const problem = JSON.parse(text) as Partial<Problem>
    if (typeof problem.title === 'string' && typeof problem.detail === 'string')
      return new ApiError(response.status, problem.title, problem.detail, problem)
  } catch {
    // Not JSON: answered below.
  }
  return new ApiError(response.status, 'The request did not succeed', `The server answered with ${response.status}.`)
}
