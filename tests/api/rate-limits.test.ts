import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../support/app'
import { expectProblem } from './problems'

const rateLimits = { readsPerMinute: 3, calculationsPerMinute: 2, pagesPerMinute: 3 }

describe('limits on one address', () => {
  let app: TestApp

  beforeAll(async () => {
    app = await startApp({ app: { rateLimits } })
  })

  afterAll(() => app.stop())

  it('says how many are left, then refuses with a reason and when to come back', async () => {
    const read = () => request(app.url).get('/api/v1/gear?limit=1')
    const first = await read().expect(200)
    expect(first.headers['ratelimit-policy']).toMatch(/^"reads"; q=3; w=60/)
    expect(first.headers.ratelimit).toMatch(/^"reads"; r=2; t=\d+$/)
    await read().expect(200)
    await read().expect(200)
    const refused = await read()
    const { detail } = expectProblem(refused, 429)
    expect(detail).toMatch(/3 requests \(reads\) a minute/)
    expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0)
    expect(Number(refused.headers['retry-after'])).toBeLessThanOrEqual(60)
  })

  it('believes no address that the visitor made up', async () => {
    const post = (address: string) =>
      request(app.url)
        .post('/api/v1/fit')
        .set('X-Forwarded-For', address)
        .send({ setup: { tank: { volumeL: 75 } }, kind: 'net' })
    await post('192.0.2.1').expect(200)
    await post('192.0.2.2').expect(200)
    expectProblem(await post('192.0.2.3'), 429)
  })

  it('lets health and readiness be asked without end', async () => {
    for (let time = 0; time < 10; time += 1) await request(app.url).get('/ready').expect(200)
  })
})

describe('limits behind one proxy', () => {
  it('tells visitors apart by the address that the proxy saw', async () => {
    const app = await startApp({ app: { rateLimits }, env: { TRUST_PROXY: '1' } })
    try {
      const read = (forwarded: string) => request(app.url).get('/api/v1/gear?limit=1').set('X-Forwarded-For', forwarded)
      for (let time = 0; time < 3; time += 1) await read(`203.0.113.${time}, 192.0.2.1`).expect(200)
      expectProblem(await read('203.0.113.9, 192.0.2.1'), 429)
      await read('203.0.113.9, 192.0.2.2').expect(200)
    } finally {
      await app.stop()
    }
  })
})
