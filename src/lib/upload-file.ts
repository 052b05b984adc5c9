import { apiBase } from './api-client'
import { createKey } from './create-key'
import { ApiError, readProblem } from './problem'

export interface UploadOptions {
  /** Fields beside the file. */
  readonly fields?: Readonly<Record<string, string>>
  /** From 0 to 1; 1 is when all is sent, not yet when it is taken. */
  readonly onProgress?: (share: number) => void
  readonly signal?: AbortSignal
}

const statusesWithoutBody = new Set([204, 205, 304])

async function readAnswer({ status, responseText }: XMLHttpRequest): Promise<unknown> {
  const isGood = status >= 200 && status < 300
  if (isGood) return responseText === '' ? null : (JSON.parse(responseText) as unknown)
  throw await readProblem(new Response(statusesWithoutBody.has(status) ? null : responseText, { status }))
}

/** Sends one file of a person's choice. Not by `fetch`, which tells of no progress. Rejects with an ApiError, or when stopped. */
export async function uploadFile(path: string, file: File, { fields = {}, onProgress, signal }: UploadOptions = {}) {
  signal?.throwIfAborted()
  return new Promise<unknown>((resolve, reject) => {
    const request = new XMLHttpRequest()
    const stop = () => request.abort()
    const settle = (finish: () => void) => {
      signal?.removeEventListener('abort', stop)
      finish()
    }
    request.upload.onprogress = ({ lengthComputable, loaded, total }) => {
      if (lengthComputable && total > 0) onProgress?.(loaded / total)
    }
    request.onload = () => settle(() => void readAnswer(request).then(resolve, reject))
    request.onabort = () => settle(() => reject(new DOMException('The upload was stopped.', 'AbortError')))
    request.onerror = () =>
      settle(() =>
        reject(
          new ApiError(
            0,
            'The upload broke off',
            'The connection was lost. What you typed is kept; choose the file again.',
          ),
        ),
      )
    request.open('POST', `${apiBase}${path}`)
    request.setRequestHeader('Accept', 'application/json')
    request.setRequestHeader('Idempotency-Key', createKey())
    signal?.addEventListener('abort', stop)
    const form = new FormData()
    // Fields first: a reader of the stream knows them before the file arrives.
    for (const [name, value] of Object.entries(fields)) form.append(name, value)
    form.append('file', file)
    request.send(form)
  })
}
