import { ApiError, readProblem } from './problem'

export interface ApiInit {
  readonly method?: string
  readonly headers?: Readonly<Record<string, string>>
  readonly body?: string
  readonly signal?: AbortSignal
}

/** `fetch` in a browser; on the server, a call into the same process with the visitor's cookie. */
export type ApiFetch = (path: string, init?: ApiInit) => Promise<Response>

export interface SendOptions {
  /** ETag of what the change starts from: anything newer answers 412 with `current`. */
  readonly ifMatch?: string
  /** The same key again answers as the first time did: for creating requests that may be sent twice. */
  readonly idempotencyKey?: string
  readonly signal?: AbortSignal
}

/** An answer with the version that it is of. */
export interface Tagged {
  /** Null where the answer has none. */
  readonly body: unknown
  readonly etag: string | null
}

export type WritingMethod = 'POST' | 'PUT' | 'PATCH' | 'DELETE'

export interface ApiClient {
  get(path: string, signal?: AbortSignal): Promise<unknown>
  post(path: string, body: unknown, signal?: AbortSignal): Promise<unknown>
  patch(path: string, body: unknown, options?: SendOptions): Promise<unknown>
  delete(path: string, body?: unknown, options?: SendOptions): Promise<unknown>
  /** As `get`, with the version. */
  getTagged(path: string, signal?: AbortSignal): Promise<Tagged>
  /** Any write, with the version that came of it. */
  send(method: WritingMethod, path: string, body?: unknown, options?: SendOptions): Promise<Tagged>
}

export const apiBase = '/api/v1'

const accept = { Accept: 'application/json' }

const withSignal = (signal?: AbortSignal) => (signal ? { signal } : {})

async function readBody(response: Response): Promise<unknown> {
  if (response.status === 204) return null
  const text = await response.text()
  return text === '' ? null : (JSON.parse(text) as unknown)
}

/** Speaks the open API: nothing here that an outsider could not do. Rejects with an ApiError. */
export function createApiClient(fetch: ApiFetch): ApiClient {
  async function call(path: string, init: ApiInit): Promise<Tagged> {
    let response: Response
    try {
      response = await fetch(`${apiBase}${path}`, init)
    } catch (error) {
      if (init.signal?.aborted) throw error
      throw new ApiError(0, 'Nothing answered', 'Stillfits cannot be reached just now. Check the connection.')
    }
    if (!response.ok) throw await readProblem(response)
    return { body: await readBody(response), etag: response.headers.get('ETag') }
  }
  const getTagged: ApiClient['getTagged'] = (path, signal) => call(path, { headers: accept, ...withSignal(signal) })
  const send: ApiClient['send'] = (method, path, body, { ifMatch, idempotencyKey, signal } = {}) =>
    call(path, {
      method,
      headers: {
        ...accept,
        ...(body !== undefined && { 'Content-Type': 'application/json' }),
        ...(ifMatch !== undefined && { 'If-Match': ifMatch }),
        ...(idempotencyKey !== undefined && { 'Idempotency-Key': idempotencyKey }),
      },
      ...(body !== undefined && { body: JSON.stringify(body) }),
      ...withSignal(signal),
    })
  const sendBare = async (...request: Parameters<ApiClient['send']>) => (await send(...request)).body
  return {
    get: async (path, signal) => (await getTagged(path, signal)).body,
    post: (path, body, signal) => sendBare('POST', path, body, withSignal(signal)),
    patch: (path, body, options) => sendBare('PATCH', path, body, options),
    delete: (path, body, options) => sendBare('DELETE', path, body, options),
    getTagged,
    send,
  }
}
