import { vi } from 'vitest'

interface Sent {
  readonly path: string
  readonly form: FormData
  readonly progress: (loaded: number, total: number) => void
  readonly answer: (status: number, body: unknown) => void
  readonly breakOff: () => void
  isAborted: boolean
}

/** Stands in for XMLHttpRequest: what was sent, and how the other side behaves. */
export function stubUploads(): readonly Sent[] {
  const uploads: Sent[] = []
  class FakeRequest {
    readonly upload: { onprogress?: (event: object) => void } = {}
    status = 0
    responseText = ''
    onload = () => undefined
    onabort = () => undefined
    onerror = () => undefined
    #path = ''
    #sent: Sent | undefined
    open(_method: string, path: string) {
      this.#path = path
    }
    setRequestHeader() {}
    abort() {
      if (this.#sent) this.#sent.isAborted = true
      this.onabort()
    }
    send(form: FormData) {
      this.#sent = {
        path: this.#path,
        form,
        progress: (loaded, total) => this.upload.onprogress?.({ lengthComputable: true, loaded, total }),
        answer: (status, body) => {
          this.status = status
          this.responseText = body === null ? '' : JSON.stringify(body)
          this.onload()
        },
        breakOff: () => this.onerror(),
        isAborted: false,
      }
      uploads.push(this.#sent)
    }
  }
  vi.stubGlobal('XMLHttpRequest', FakeRequest)
  return uploads
}
