import { useRef, useState } from 'react'
import { evidenceRefSchema } from '#shared/schemas/gear'
import { toApiError } from '../../../lib/problem'
import { uploadFile } from '../../../lib/upload-file'
import { refuseFile } from '../model/check-file'
import type { TypedFile } from '../model/typed-form'

export interface Upload {
  readonly key: number
  readonly name: string
  /** How much of it is sent, from 0 to 1. */
  readonly share: number
  /** Why it was not taken; undefined while it is on its way. */
  readonly failure?: string
  readonly stop: () => void
}

export interface UploadsOptions {
  /** The proposal that files are attached to; saves it first where there is none. Null: it could not be saved. */
  readonly findProposalId: () => Promise<string | null>
  readonly onTaken: (file: TypedFile) => void
}

const isStopped = (error: unknown): boolean => error instanceof DOMException && error.name === 'AbortError'

/** Files on their way: each with its progress, and a way to stop it. */
export function useUploads({ findProposalId, onTaken }: UploadsOptions) {
  const [uploads, setUploads] = useState<readonly Upload[]>([])
  const nextKey = useRef(1)

  const change = (key: number, with_: Partial<Upload>) =>
    setUploads((all) => all.map((one) => (one.key === key ? { ...one, ...with_ } : one)))
  const drop = (key: number) => setUploads((all) => all.filter((one) => one.key !== key))

  async function send(key: number, file: File, signal: AbortSignal): Promise<void> {
    try {
      const id = await findProposalId()
      if (id === null)
        return change(key, { failure: 'It waits until what you typed can be saved. Choose it again then.' })
      const answer = await uploadFile(`/proposals/${encodeURIComponent(id)}/evidence`, file, {
        signal,
        onProgress: (share) => change(key, { share }),
      })
      const { id: fileId, kind } = evidenceRefSchema.parse(answer)
      drop(key)
      onTaken({ id: fileId, kind, name: file.name, only: null })
    } catch (error) {
      if (isStopped(error)) return drop(key)
      const { message } = toApiError(error)
      change(key, { failure: message })
    }
  }

  const add = (files: Iterable<File>) => {
    for (const file of files) {
      const key = nextKey.current++
      const controller = new AbortController()
      const failure = refuseFile(file)
      const stop = () => {
        controller.abort()
        drop(key)
      }
      setUploads((all) => [...all, { key, name: file.name, share: 0, stop, ...(failure !== undefined && { failure }) }])
      if (failure === undefined) void send(key, file, controller.signal)
    }
  }
  return { uploads, add, isSending: uploads.some(({ failure }) => failure === undefined) }
}
