import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { hash } from '@node-rs/argon2'
import { startApp, type TestApp } from '../../support/app'
import { findToken } from '../../support/letters'
import { findDemoPerson, signInAs } from '../../support/sign-in'
import { expectProblem } from '../problems'
import { addMember, inventMember, send, type Member } from './members'

let app: TestApp

beforeAll(async () => {
  app = await startApp({
    env: { TRUST_PROXY: '1' },
    app: { rateLimits: { signUpsPerHour: 500, failedSignInsPerQuarter: 8 } },
  })
})

afterAll(() => app.stop())

/** As if from another address each time. */
const from = (index: number) => ({ 'X-Forwarded-For': `198.51.${100 + Math.floor(index / 250)}.${(index % 250) + 1}` })

/** So many failures as the hundredth try would make, without waiting for a hundred hashes. */
async function failOften(email: string): Promise<void> {
  await send(app, '/session', { email, password: 'a wrong guess' }, from(0)).expect(401)
  await app.client.pool.query(`UPDATE rate_counts SET hits = 99 WHERE key LIKE 'failed-passwords:%' AND hits = 1`)
  await send(app, '/session', { email, password: 'a wrong guess' }, from(1)).expect(401)
}

const cookiesOf = (response: { headers: Record<string, unknown> }) =>
  (response.headers['set-cookie'] as string[]).map((line) => line.split(';', 1)[0] ?? '')

describe('guessing at one account from many addresses', () => {
  it('is put off after a hundred failures, for an unknown address alike, with when to come back', async () => {
    const member = await addMember(app)
    for (const email of [member.email, inventMember().email]) {
      await failOften(email)
      const refused = await send(app, '/session', { email, password: member.password }, from(2))
      expect(expectProblem(refused, 429).detail).toMatch(/ask for a new password/)
      expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0)
    }
  })

  it('does not lock its owner out of a browser that has signed in before', async () => {
    const member = await addMember(app)
    const device = cookiesOf(await send(app, '/session', credentialsOf(member), from(3)).expect(200)).find((cookie) =>
      cookie.startsWith('device='),
    )
    await failOften(member.email)
    expectProblem(await send(app, '/session', credentialsOf(member), from(4)), 429)
    const known = { ...from(5), Cookie: device ?? '' }
    await send(app, '/session', { email: member.email, password: 'a slip of the finger' }, known).expect(401)
    await send(app, '/session', credentialsOf(member), known).expect(200)
    const stolen = await addMember(app)
    await failOften(stolen.email)
    expectProblem(await send(app, '/session', credentialsOf(stolen), known), 429)
  })

  it('is over for the owner with a new password by letter', async () => {
    const member = await addMember(app)
    await failOften(member.email)
    await send(app, '/password-resets', { email: member.email }, from(6)).expect(202)
    const token = await findToken(app.client.pool, member.email)
    const password = 'urchins graze after dark'
    await send(app, '/password-resets/confirm', { token, password }, from(6)).expect(200)
    await send(app, '/session', { email: member.email, password }, from(7)).expect(200)
  })

  it('is put off by address too, which counts failures alone', async () => {
    const { email, password } = findDemoPerson('member')
    const at = { 'X-Forwarded-For': '203.0.113.77' }
    for (let time = 0; time < 10; time += 1) await send(app, '/session', { email, password }, at).expect(200)
    for (let time = 0; time < 8; time += 1) {
      await send(app, '/session', { email: inventMember().email, password: 'a wrong guess' }, at).expect(401)
    }
    expectProblem(await send(app, '/session', { email, password }, at), 429)
    await send(app, '/session', { email, password }, { 'X-Forwarded-For': '203.0.113.78' }).expect(200)
  })
})

function credentialsOf({ email, password }: Member) {
  return { email, password }
}

describe('a stored hash', () => {
  it('that is weaker than today’s is made anew at the next sign-in', async () => {
    const member = await addMember(app)
    const weak = await hash(member.password, { memoryCost: 4096, timeCost: 1 })
    await app.client.pool.query('UPDATE people SET password_hash = $1 WHERE email = $2', [weak, member.email])
    await signInAs(app, member)
    const { rows } = await app.client.pool.query<{ password_hash: string }>(
      'SELECT password_hash FROM people WHERE email = $1',
      [member.email],
    )
    expect(rows[0]?.password_hash).toMatch(/^\$argon2id\$v=19\$m=19456,t=2,p=1\$/)
    await signInAs(app, member)
  })
})

describe('the time of an answer', () => {
  it('is that of a hash, also for an address without an account', async () => {
    async function time(email: string): Promise<number> {
      const start = performance.now()
      await request(app.url).post('/api/v1/session').set(from(9)).send({ email, password: 'a wrong guess' }).expect(401)
      return performance.now() - start
    }
    const { email } = findDemoPerson('moderator')
    await time('warmup@example.com')
    const known = Math.min(await time(email), await time(email))
    const unknown = Math.min(await time('nobody1@example.com'), await time('nobody2@example.com'))
    expect(unknown).toBeGreaterThan(known / 4)
  })
})
