import { createHash } from 'node:crypto'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sessionSchema } from '../../../shared/schemas/accounts'
import { startApp, type TestApp } from '../../support/app'
import { findDemoPerson, signIn, signInAs, type SignedInHeaders } from '../../support/sign-in'
import { expectProblem } from '../problems'

const day = 24 * 60 * 60 * 1000

let app: TestApp
let time = new Date()

beforeAll(async () => {
  app = await startApp({ app: { now: () => time } })
})

afterAll(() => app.stop())

const readSession = async (headers: Record<string, string> = {}) =>
  sessionSchema.parse((await request(app.url).get('/api/v1/session').set(headers).expect(200)).body)

const isSignedIn = async (headers: SignedInHeaders) => (await readSession(headers)).person !== null
const idOf = (headers: SignedInHeaders) => headers.Cookie.slice('session='.length)

describe('a session', () => {
  it('says who is signed in and what that person may do, privately and unstored', async () => {
    const headers = await signIn(app, 'moderator')
    const response = await request(app.url).get('/api/v1/session').set(headers).expect(200)
    expect(response.headers['cache-control']).toBe('private, no-store')
    expect(response.body).toEqual({
      person: {
        name: findDemoPerson('moderator').name,
        role: 'moderator',
        email: 'moderator@example.org',
        isConfirmed: true,
        can: { contribute: true, review: true, administer: false },
      },
    })
    expect(await readSession()).toEqual({ person: null })
  })

  it('replaces an id that was set before signing in, and the one that signing in again leaves behind', async () => {
    const planted = { Cookie: 'session=chosenbysomebodyelse', 'Sec-Fetch-Site': 'same-origin' }
    const { email, password } = findDemoPerson('member')
    const first = await request(app.url).post('/api/v1/session').set(planted).send({ email, password }).expect(200)
    expect(String(first.headers['set-cookie'])).not.toContain('chosenbysomebodyelse')
    expect(await isSignedIn(planted)).toBe(false)

    const before = await signIn(app, 'member')
    const again = await request(app.url).post('/api/v1/session').set(before).send({ email, password }).expect(200)
    expect(String(again.headers['set-cookie'])).not.toContain(idOf(before))
    expect(await isSignedIn(before)).toBe(false)
  })

  it('has ids of 128 random bits and more, never twice the same, of which the database keeps only hashes', async () => {
    const headers = await Promise.all(Array.from({ length: 12 }, () => signIn(app, 'member')))
    const ids = headers.map(idOf)
    expect(new Set(ids).size).toBe(12)
    // Each of the 32 letters stands for five bits.
    for (const id of ids) expect(id).toMatch(/^[a-z2-7]{26,}$/)
    const { rows } = await app.client.pool.query<Record<string, unknown>>('SELECT * FROM sessions')
    const kept = JSON.stringify(rows)
    for (const id of ids) {
      expect(kept).not.toContain(id)
      expect(kept).toContain(createHash('sha256').update(id).digest('hex'))
    }
  })

  it('is over once signed out, also for whoever kept the cookie', async () => {
    const headers = await signIn(app, 'admin')
    const response = await request(app.url).delete('/api/v1/session').set(headers).expect(204)
    expect(String(response.headers['set-cookie'])).toMatch(/^session=;.*Expires=Thu, 01 Jan 1970/)
    expect(await isSignedIn(headers)).toBe(false)
  })

  it('ends after two weeks without use, and after ninety days in spite of use', async () => {
    const start = time
    const unused = await signIn(app, 'member')
    const used = await signIn(app, 'member')
    try {
      for (let days = 10; days <= 80; days += 10) {
        time = new Date(start.getTime() + days * day)
        expect(await isSignedIn(used), `after ${days} days`).toBe(true)
      }
      expect(await isSignedIn(unused)).toBe(false)
      time = new Date(start.getTime() + 89.9 * day)
      expect(await isSignedIn(used)).toBe(true)
      time = new Date(start.getTime() + 90.1 * day)
      expect(await isSignedIn(used)).toBe(false)
    } finally {
      time = start
    }
  })
})

describe('signing in', () => {
  it('answers a wrong password and an unknown address alike', async () => {
    const { email } = findDemoPerson('member')
    const send = (body: object) => request(app.url).post('/api/v1/session').send(body)
    const wrong = expectProblem(await send({ email, password: 'not the passphrase of anybody' }), 401)
    const unknown = expectProblem(
      await send({ email: 'nobody@example.org', password: 'not the passphrase of anybody' }),
      401,
    )
    expect({ ...unknown, requestId: '' }).toEqual({ ...wrong, requestId: '' })
  })

  it('takes the address in any case, and the password to its last character', async () => {
    const { email, password } = findDemoPerson('member')
    await signInAs(app, { email: email.toUpperCase(), password })
    await request(app.url)
      .post('/api/v1/session')
      .send({ email, password: password.slice(0, -1) })
      .expect(401)
  })
})
