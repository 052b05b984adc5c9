import { describe, expect, it } from 'vitest'
import { createApiClient, type ApiInit } from '../../../src/lib/api-client'
import { isAway, isNotFound, toApiError } from '../../../src/lib/problem'

const clientOf = (answer: () => Response) => createApiClient(() => Promise.resolve(answer()))

describe('speaking to the API', () => {
  it('turns a problem document (RFC 9457) into an error with every named field', async () => {
    const problem = {
      type: 'urn:x',
      title: 'Some fields need another look',
      status: 422,
      detail: 'Two fields.',
      instance: '/api/v1/fit',
      requestId: 'abc',
      errors: [{ pointer: '#/setup/tank/wallMm', detail: 'must be a number' }],
    }
    const client = clientOf(() => new Response(JSON.stringify(problem), { status: 422 }))
    const error = toApiError(await client.post('/fit', {}).catch((caught: unknown) => caught))
    expect(error).toMatchObject({ status: 422, title: problem.title, requestId: 'abc', errors: problem.errors })
  })

  it('makes an error in words of a page that a proxy sent instead', async () => {
    const client = clientOf(() => new Response('<html>Bad gateway</html>', { status: 502 }))
    const error = await client.get('/kinds').catch((caught: unknown) => caught)
    expect(isAway(error)).toBe(true)
    expect(toApiError(error).message).not.toContain('<html>')
  })

  it('counts a connection that fails as away, and a missing piece as not found', async () => {
    const offline = createApiClient(() => Promise.reject(new TypeError('failed to fetch')))
    expect(isAway(await offline.get('/kinds').catch((caught: unknown) => caught))).toBe(true)
    const missing = clientOf(() => new Response('', { status: 404 }))
    expect(isNotFound(await missing.get('/gear/none').catch((caught: unknown) => caught))).toBe(true)
  })

  it('sends a change with the version that it starts from, and hands on the version that came of it', async () => {
    const sent: [string, ApiInit | undefined][] = []
    const client = createApiClient((path, init) => {
      sent.push([path, init])
      return Promise.resolve(new Response('{"ok":true}', { status: 200, headers: { ETag: '"8"' } }))
    })
    const answer = await client.send('PATCH', '/proposals/1', { summary: 'x' }, { ifMatch: '"7"', idempotencyKey: 'k' })
    expect(answer).toEqual({ body: { ok: true }, etag: '"8"' })
    const [path, init] = sent[0]!
    expect(path).toBe('/api/v1/proposals/1')
    expect(init).toMatchObject({ method: 'PATCH', body: '{"summary":"x"}' })
    expect(init?.headers).toMatchObject({ 'If-Match': '"7"', 'Idempotency-Key': 'k' })
  })

  it('hands on what something stale looks like now', async () => {
    const problem = { title: 'Changed meanwhile', detail: 'Somebody was quicker.', current: { version: 9 } }
    const client = clientOf(() => new Response(JSON.stringify(problem), { status: 412 }))
    const error = toApiError(await client.patch('/proposals/1', {}).catch((caught: unknown) => caught))
    expect(error).toMatchObject({ status: 412, current: { version: 9 } })
  })

  it('takes an answer without a body for nothing', async () => {
    expect(await clientOf(() => new Response(null, { status: 204 })).delete('/evidence/1')).toBeNull()
  })
})
