import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../../support/app'
import { findDemoPerson, signIn, type SignedInHeaders } from '../../support/sign-in'
import { expectProblem } from '../problems'

let app: TestApp
let headers: SignedInHeaders

beforeAll(async () => {
  app = await startApp({ env: { PUBLIC_ORIGIN: 'http://stillfits.example.org' } })
  headers = await signIn(app, 'member')
})

afterAll(() => app.stop())

const patch = (sent: Record<string, string>) =>
  request(app.url).patch('/api/v1/me').set('Cookie', headers.Cookie).set(sent).send({ wantsNotices: true })

describe('a write from another site', () => {
  it('is refused by what the browser says of where it comes from, whatever else is right', async () => {
    const foreign = [
      { 'Sec-Fetch-Site': 'cross-site' },
      { 'Sec-Fetch-Site': 'same-site' },
      { Origin: 'https://evil.example.net' },
      { Origin: 'null' },
      { Origin: 'http://stillfits.example.org.evil.example.net' },
      { 'Sec-Fetch-Site': 'same-origin', Origin: 'https://evil.example.net' },
    ]
    for (const sent of foreign) expectProblem(await patch(sent), 403)
    const { email, password } = findDemoPerson('member')
    const planted = request(app.url).post('/api/v1/session').set('Origin', 'https://evil.example.net')
    expectProblem(await planted.send({ email, password }), 403)
  })

  it('is refused where a cookie comes alone, with nothing that says which page sent it', async () => {
    expectProblem(await patch({}), 403)
  })

  it('is refused before anything else is looked at', async () => {
    const response = await request(app.url).post('/api/v1/no/such/thing').set('Sec-Fetch-Site', 'cross-site').send('{')
    expectProblem(response, 403)
  })

  it('is no matter to our own pages, by either address of the site', async () => {
    for (const sent of [
      { 'Sec-Fetch-Site': 'same-origin' },
      { Origin: 'http://stillfits.example.org' },
      { Origin: app.url },
      { 'Sec-Fetch-Site': 'none' },
    ]) {
      await patch(sent as unknown as Record<string, string>).expect(200)
    }
  })

  it('is given no leave to read answers either', async () => {
    const response = await request(app.url)
      .get('/api/v1/session')
      .set({ Cookie: headers.Cookie, Origin: 'https://evil.example.net' })
    expect(response.headers['access-control-allow-origin']).toBeUndefined()
    expect(response.headers['access-control-allow-credentials']).toBeUndefined()
  })
})

describe('cookies over HTTPS', () => {
  it('are for this host alone, never read by scripts, and not sent along from elsewhere', async () => {
    const secure = await startApp({ env: { PUBLIC_ORIGIN: 'https://stillfits.example.org' } })
    try {
      const { email, password } = findDemoPerson('member')
      const response = await request(secure.url).post('/api/v1/session').send({ email, password }).expect(200)
      const cookies = response.headers['set-cookie'] as unknown as string[]
      expect(cookies.map((cookie) => cookie.split('=', 1)[0]).sort()).toEqual(['__Host-device', '__Host-session'])
      for (const cookie of cookies) {
        expect(cookie).toMatch(/; Path=\//)
        for (const part of ['Secure', 'HttpOnly', 'SameSite=Lax']) expect(cookie).toContain(`; ${part}`)
        expect(cookie).not.toMatch(/Domain=/)
      }
    } finally {
      await secure.stop()
    }
  })
})
