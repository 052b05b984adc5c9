import { request as httpRequest } from 'node:http'
import { gzipSync } from 'node:zlib'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createLogger } from '../../server/lib/logger'
import { startApp, type TestApp } from '../support/app'
import { expectProblem, listPointers } from './problems'
import { rearChamberSetup as setup } from './records'

let app: TestApp
const lines: string[] = []

beforeAll(async () => {
  const logger = createLogger('info', { write: (line) => void lines.push(line) })
  app = await startApp({ app: { logger } })
})

afterAll(() => app.stop())

const json = (body: string) => request(app.url).post('/api/v1/fit').set('Content-Type', 'application/json').send(body)

/** supertest normalises what it sends; this does not. */
function sendRaw(method: string, path: string): Promise<{ status: number; allow: string | undefined }> {
  const { hostname, port } = new URL(app.url)
  return new Promise((resolve, reject) => {
    const sent = httpRequest({ hostname, port, method, path }, (response) => {
      response.resume()
      response.on('end', () => resolve({ status: response.statusCode ?? 0, allow: response.headers.allow }))
    })
    sent.on('error', reject).end()
  })
}

describe('what is not there', () => {
  it.each(['/api', '/api/v1', '/api/v1/', '/api/v1/nothing', '/api/v2/gear', '/api/v1/gear/a/b/c', '/nothing', '/'])(
    'answers 404 at %s',
    async (path) => {
      expectProblem(await request(app.url).get(path), 404)
    },
  )

  it.each([
    '/.git/config',
    '/.env',
    '/a/.env',
    '/%2eenv',
    '/api/.git',
    '/assets/..%2f..%2fpackage.json',
    '/..%5cpackage.json',
  ])('answers 404 at %s', async (path) => {
    expect(await sendRaw('GET', path)).toMatchObject({ status: 404 })
  })

  it('answers 400 to a path that cannot be decoded', async () => {
    expectProblem(await request(app.url).get('/api/v1/gear/%E0%A4%A'), 400)
  })
})

describe('methods', () => {
  it.each([
    ['DELETE', '/api/v1/gear', 'GET, HEAD, OPTIONS'],
    ['PUT', '/api/v1/gear/some-piece', 'GET, HEAD, OPTIONS'],
    ['POST', '/api/v1/kinds', 'GET, HEAD, OPTIONS'],
    ['GET', '/api/v1/fit', 'POST, OPTIONS'],
    ['PATCH', '/api/v1/fit/check', 'POST, OPTIONS'],
    ['GET', '/api/v1/setups/report', 'POST, OPTIONS'],
    ['POST', '/health', 'GET, HEAD, OPTIONS'],
    ['DELETE', '/preferences', 'GET, HEAD, POST, OPTIONS'],
  ])('answers 405 to %s %s and names what does work', async (method, path, allow) => {
    expect(await sendRaw(method, path)).toEqual({ status: 405, allow })
  })

  it('answers 405 to TRACE anywhere', async () => {
    for (const path of ['/', '/api/v1/gear', '/nothing']) expect((await sendRaw('TRACE', path)).status).toBe(405)
  })

  it('names the methods to OPTIONS, and lets no other site in', async () => {
    const response = await request(app.url)
      .options('/api/v1/fit')
      .set('Origin', 'https://elsewhere.example')
      .expect(204)
    expect(response.headers.allow).toBe('POST, OPTIONS')
    expect(response.headers['access-control-allow-origin']).toBeUndefined()
  })

  it('answers HEAD as GET, without the body', async () => {
    const response = await request(app.url).head('/api/v1/kinds').expect(200)
    expect(response.text).toBeUndefined()
    expect(response.headers.etag).toBeDefined()
  })
})

describe('bodies', () => {
  it.each(['{', '{"setup":', 'not json', '{"a":1}}', "{'a':1}", '\u0000'])(
    'answers 400 to the broken JSON %j',
    async (body) => {
      expectProblem(await json(body), 400)
    },
  )

  it.each([
    'text/plain',
    'application/x-www-form-urlencoded',
    'multipart/form-data; boundary=x',
    'application/xml',
    'application/jsonp',
  ])('answers 415 to JSON sent as %s', async (type) => {
    const response = await request(app.url).post('/api/v1/fit').set('Content-Type', type).send('{}')
    expectProblem(response, 415)
  })

  it('answers 415 to JSON in another charset or an unknown encoding', async () => {
    const latin = request(app.url)
      .post('/api/v1/fit')
      .set('Content-Type', 'application/json; charset=latin1')
      .send('{}')
    expectProblem(await latin, 415)
    const encoded = request(app.url)
      .post('/api/v1/fit')
      .set('Content-Type', 'application/json')
      .set('Content-Encoding', 'zstd')
    expectProblem(await encoded.send('{}'), 415)
  })

  it('answers 413 to a body that is too large, also once unpacked', async () => {
    const large = JSON.stringify({ setup, kind: 'x'.repeat(300_000) })
    expectProblem(await json(large), 413)
    const packed = await fetch(`${app.url}/api/v1/fit`, {
      method: 'POST',
      headers: { 'Content-Type': 'application/json', 'Content-Encoding': 'gzip' },
      body: gzipSync(large),
    })
    expect(packed.status).toBe(413)
  })

  it('answers 422 to no body at all', async () => {
    expectProblem(await request(app.url).post('/api/v1/fit'), 422)
  })

  it('merges no prototype, and names the attempt where fields are known', async () => {
    const response = await json(
      `{"setup":{"tank":{"volumeL":75}},"kind":"heater","__proto__":{"polluted":1},"constructor":{"a":1}}`,
    )
    expect(listPointers(expectProblem(response, 422))).toEqual(['#/__proto__', '#/constructor'])
    const deep = await json(
      `{"setup":{"tank":{"volumeL":75,"__proto__":{"polluted":1}},"room":{"__proto__":{"polluted":1}}},"kind":"heater"}`,
    )
    expect(deep.status).toBeLessThan(500)
    expect(({} as Record<string, unknown>).polluted).toBeUndefined()
  })

  it.each(['1e999', '-1e999', '1e308', '-0', '1e-320', '99999999999999999999999999'])(
    'never fails on the number %s in any place of a setup',
    async (number) => {
      for (const place of ['volumeL', 'outerLengthMm', 'wallMm', 'waterLineMm']) {
        const body = `{"setup":{"tank":{"volumeL":75,"${place}":${number}}},"kind":"heater"}`
        expect([200, 422]).toContain((await json(body)).status)
      }
    },
  )

  it('survives texts of 10 000 characters and very deep nesting', async () => {
    const long = await json(
      JSON.stringify({ setup: { name: 'x'.repeat(10_000), tank: { volumeL: 75 } }, kind: 'heater' }),
    )
    expect(listPointers(expectProblem(long, 422))).toEqual(['#/setup/name'])
    const deep = await json(
      `{"setup":{"tank":{"chambers":${'['.repeat(20_000)}${']'.repeat(20_000)}}},"kind":"heater"}`,
    )
    expect([400, 422]).toContain(deep.status)
  })
})

describe('headers', () => {
  it.each(['/health', '/api/v1/kinds', '/nothing', '/preferences?units=us'])(
    'guards the answer at %s',
    async (path) => {
      const { headers } = await request(app.url).get(path)
      const policy = headers['content-security-policy'] ?? ''
      for (const rule of ["object-src 'none'", "base-uri 'none'", "frame-ancestors 'none'"])
        expect(policy).toContain(rule)
      expect(policy).toMatch(/script-src 'self' 'nonce-[\w+/=]{20,}'/)
      expect(policy).not.toMatch(/script-src[^;]*unsafe/)
      expect(headers['x-content-type-options']).toBe('nosniff')
      expect(headers['referrer-policy']).toBe('strict-origin-when-cross-origin')
      expect(headers['x-powered-by']).toBeUndefined()
      expect(headers['strict-transport-security']).toBeUndefined()
    },
  )

  it('gives every response a nonce of its own', async () => {
    const read = async () => (await request(app.url).get('/health')).headers['content-security-policy']
    expect(await read()).not.toBe(await read())
  })

  it('insists on HTTPS for a year where visitors come by HTTPS', async () => {
    const secure = await startApp({ env: { PUBLIC_ORIGIN: 'https://stillfits.example' } })
    try {
      const { headers } = await request(secure.url).get('/health')
      expect(headers['strict-transport-security']).toBe('max-age=31536000; includeSubDomains')
      const cookie = (await request(secure.url).get('/preferences?units=us')).headers['set-cookie']?.[0]
      expect(cookie).toMatch(/Secure/)
    } finally {
      await secure.stop()
    }
  })

  it('packs what is worth packing', async () => {
    const response = await request(app.url).get('/api/v1/kinds').set('Accept-Encoding', 'gzip')
    expect(response.headers['content-encoding']).toBe('gzip')
    expect(response.headers.vary).toMatch(/Accept-Encoding/)
  })
})

describe('request ids and the log', () => {
  it('keeps a decent id of the caller and replaces any other', async () => {
    const send = (id: string) => request(app.url).get('/health').set('X-Request-Id', id)
    expect((await send('abc-12345')).headers['x-request-id']).toBe('abc-12345')
    for (const id of ['x', 'a b c d e f g', 'x'.repeat(65), 'abc"}{"level":60}']) {
      expect((await send(id)).headers['x-request-id']).toMatch(/^[\da-f-]{36}$/)
    }
  })

  it('writes one record per request, without query, cookies or line breaks of the visitor', async () => {
    lines.length = 0
    const path = '/api/v1/gear/secret%0D%0Aforged?q=private-question'
    await request(app.url).get(path).set('Cookie', 'units=us; token=hush').set('Authorization', 'Bearer hush')
    await expect.poll(() => lines.length).toBe(1)
    const [line = ''] = lines
    expect(line.trimEnd()).not.toMatch(/[\r\n]/)
    expect(line).not.toMatch(/hush|private-question/)
    expect(JSON.parse(line)).toMatchObject({ req: { method: 'GET' }, res: { status: 404 } })
  })
})

describe('preferences', () => {
  it('keeps units and theme for a year and goes back', async () => {
    const response = await request(app.url)
      .get('/preferences?units=us&theme=dark&next=/find%3Fkind%3Dheater')
      .expect(303)
    expect(response.headers.location).toBe('/find?kind=heater')
    const cookies = response.headers['set-cookie'] as unknown as string[]
    expect(cookies.map((cookie) => cookie.split(';')[0])).toEqual(['units=us', 'theme=dark'])
    for (const cookie of cookies) expect(cookie).toMatch(/Max-Age=31536000; Path=\/;.*SameSite=Lax/)
  })

  it('takes a plain form as well', async () => {
    const response = await request(app.url)
      .post('/preferences')
      .type('form')
      .send({ theme: 'light', next: '/gear' })
      .expect(303)
    expect(response.headers.location).toBe('/gear')
  })

  it.each([
    '//evil.example',
    '/\\evil.example',
    'https://evil.example',
    'javascript:alert(1)',
    '/\t/evil.example',
    'evil',
    '',
    '/a/..//evil.example',
  ])('goes nowhere else: %j', async (next) => {
    const response = await request(app.url).get('/preferences').query({ units: 'us', next }).expect(303)
    const target = new URL(response.headers.location ?? '', 'https://stillfits.example')
    expect(target.origin).toBe('https://stillfits.example')
  })

  it('refuses what it does not know', async () => {
    const response = await request(app.url)
      .get('/preferences?units=cubits&theme=neon&colour=red&next=/')
      .set('Accept', 'application/json')
    expect(listPointers(expectProblem(response, 422))).toEqual(['#/colour', '#/theme', '#/units'])
  })
})
