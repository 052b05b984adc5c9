import { afterEach, describe, expect, it, vi } from 'vitest'
import { toApiError } from '../../../src/lib/problem'
import { uploadFile } from '../../../src/lib/upload-file'
import { stubUploads } from '../support/fake-upload'

const photo = new File(['bytes'], 'calipers.jpg', { type: 'image/jpeg' })
const catchError = (promise: Promise<unknown>) => promise.then(() => null).catch((error: unknown) => error)

describe('sending a file', () => {
  afterEach(() => vi.unstubAllGlobals())

  it('tells how far it is, and hands on the answer', async () => {
    const uploads = stubUploads()
    const shares: number[] = []
    const done = uploadFile('/proposals/1/evidence', photo, {
      fields: { caption: 'Calipers' },
      onProgress: (share) => shares.push(share),
    })
    const [sent] = uploads
    sent!.progress(5, 10)
    sent!.progress(10, 10)
    sent!.answer(201, { id: 'file-1' })
    expect(await done).toEqual({ id: 'file-1' })
    expect(shares).toEqual([0.5, 1])
    expect(sent!.path).toBe('/api/v1/proposals/1/evidence')
    expect([...sent!.form.keys()]).toEqual(['caption', 'file'])
  })

  it('can be stopped half-way', async () => {
    const uploads = stubUploads()
    const stop = new AbortController()
    const error = catchError(uploadFile('/proposals/1/evidence', photo, { signal: stop.signal }))
    stop.abort()
    expect(await error).toMatchObject({ name: 'AbortError' })
    expect(uploads[0]?.isAborted).toBe(true)
  })

  it('fails in the words of the server, or in its own where the connection broke', async () => {
    const uploads = stubUploads()
    const refused = catchError(uploadFile('/x', photo))
    uploads[0]!.answer(413, { title: 'Too large', detail: 'At most 25 MB.' })
    expect(toApiError(await refused)).toMatchObject({ status: 413, message: 'At most 25 MB.' })
    const broken = catchError(uploadFile('/x', photo))
    uploads[1]!.breakOff()
    expect(toApiError(await broken)).toMatchObject({ status: 0, title: 'The upload broke off' })
  })
})
