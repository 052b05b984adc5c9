import { ApiError, readProblem } from './problem'

export interface ApiInit {
  readonly method?: string
  readonly headers?: Readonly<Record<string, string>>
  readonly body?: string
  readonly signal?: AbortSignal
}

/** `fetch` in a browser; on the server, a call into the same process with the visitor's cookie. */
export type ApiFetch = (path: string, init?: ApiInit) => Promise<Response>

export interface ApiClient {
  get(path: string, signal?: AbortSignal): Promise<unknown>
  post(path: string, body: unknown, signal?: AbortSignal): Promise<unknown>
}

const base = '/api/v1'

/** Speaks the open API: nothing here that an outsider could not do. Rejects with an ApiError. */
export function createApiClient(fetch: ApiFetch): ApiClient {
  async function call(path: string, init: ApiInit): Promise<unknown> {
    let response: Response
    try {
      response = await fetch(`${base}${path}`, init)
    } catch (error) {
      if (init.signal?.aborted) throw error
      throw new ApiError(0, 'Nothing answered', 'Stillfits cannot be reached just now. Check the connection.')
    }
    if (!response.ok) throw await readProblem(response)
    return response.json() as Promise<unknown>
  }
  const accept = { Accept: 'application/json' }
  const withSignal = (signal?: AbortSignal) => (signal ? { signal } : {})
  return {
    get: (path, signal) => call(path, { headers: accept, ...withSignal(signal) }),
    post: (path, body, signal) =>
      call(path, {
        method: 'POST',
        headers: { ...accept, 'Content-Type': 'application/json' },
        body: JSON.stringify(body),
        ...withSignal(signal),
      }),
  }
}
