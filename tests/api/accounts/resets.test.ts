import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../../support/app'
import { findLink, findToken, readLetters } from '../../support/letters'
import { signInAs } from '../../support/sign-in'
import { expectProblem, listPointers } from '../problems'
import { addMember, addSignedIn, inventMember, send } from './members'

let app: TestApp
let time = new Date()
const newPassword = 'urchins graze after dark'

beforeAll(async () => {
  const rateLimits = { signUpsPerHour: 500, resetsPerHour: 500, failedSignInsPerQuarter: 500 }
  app = await startApp({ app: { now: () => time, rateLimits } })
})

afterAll(() => app.stop())

async function askFor(email: string): Promise<string> {
  await send(app, '/password-resets', { email }).expect(202)
  return findToken(app.client.pool, email)
}

describe('a new password by letter', () => {
  it('is set by the link, once, and ends every session', async () => {
    const { member, headers } = await addSignedIn(app)
    const token = await askFor(member.email)
    await send(app, '/password-resets/confirm', { token, password: newPassword }).expect(200)
    expectProblem(await send(app, '/me/password', { password: newPassword, newPassword }, headers), 401)
    expectProblem(await send(app, '/session', { email: member.email, password: member.password }), 401)
    await signInAs(app, { email: member.email, password: newPassword })
    const again = expectProblem(await send(app, '/password-resets/confirm', { token, password: newPassword }), 422)
    expect(listPointers(again)).toEqual(['#/token'])
  })

  it('is for one of many who send the same token at once', async () => {
    const member = await addMember(app)
    const token = await askFor(member.email)
    const answers = await Promise.all(
      Array.from({ length: 10 }, (_, index) =>
        send(app, '/password-resets/confirm', { token, password: `${newPassword} ${index}` }),
      ),
    )
    expect(answers.map(({ status }) => status).sort()).toEqual([200, ...Array.from({ length: 9 }, () => 422)])
  })

  it('works for an hour, and only by its newest letter', async () => {
    const start = time
    const member = await addMember(app)
    const old = await askFor(member.email)
    const newest = await askFor(member.email)
    expectProblem(await send(app, '/password-resets/confirm', { token: old, password: newPassword }), 422)
    try {
      time = new Date(start.getTime() + 61 * 60 * 1000)
      expectProblem(await send(app, '/password-resets/confirm', { token: newest, password: newPassword }), 422)
    } finally {
      time = start
    }
    await send(app, '/password-resets/confirm', { token: newest, password: newPassword }).expect(200)
  })

  it('does not take a token of another kind, nor is its own taken elsewhere', async () => {
    const member = inventMember()
    await send(app, '/people', member).expect(202)
    const confirmToken = await findToken(app.client.pool, member.email)
    expectProblem(await send(app, '/password-resets/confirm', { token: confirmToken, password: newPassword }), 422)
    await send(app, '/people/confirm', { token: confirmToken }).expect(200)
    const token = await askFor(member.email)
    expectProblem(await send(app, '/people/confirm', { token }), 422)
    await send(app, '/password-resets/confirm', { token, password: newPassword }).expect(200)
  })

  it('leaves the link good where the password is refused', async () => {
    const member = await addMember(app)
    const token = await askFor(member.email)
    const weak = await send(app, '/password-resets/confirm', { token, password: 'passwordpassword' })
    expect(listPointers(expectProblem(weak, 422))).toEqual(['#/password'])
    await send(app, '/password-resets/confirm', { token, password: newPassword }).expect(200)
  })

  it('is answered alike whether the address has an account, in words and in time', async () => {
    const member = await addMember(app)
    async function ask(email: string) {
      const from = performance.now()
      const { status, text } = await send(app, '/password-resets', { email })
      return { status, text, ms: performance.now() - from }
    }
    const known = await ask(member.email)
    const unknown = await ask(inventMember().email)
    expect([unknown.status, unknown.text]).toEqual([known.status, known.text])
    expect(known.ms).toBeGreaterThan(140)
    expect(unknown.ms).toBeGreaterThan(140)
  })

  it('links to its own address, whatever Host the visitor sends', async () => {
    const member = await addMember(app)
    await send(app, '/password-resets', { email: member.email }, { Host: 'evil.example.net' }).expect(202)
    expect((await findLink(app.client.pool, member.email)).hostname).toBe('127.0.0.1')
    const kept = await app.client.pool.query('SELECT * FROM email_tokens')
    expect(JSON.stringify(kept.rows)).not.toContain(await findToken(app.client.pool, member.email))
  })
})

describe('asking for new passwords over and over', () => {
  it('is refused after a while, and few letters go out', async () => {
    const limited = await startApp()
    try {
      const member = await addMember(limited)
      const statuses: number[] = []
      for (let asked = 0; asked < 50; asked += 1) {
        statuses.push((await send(limited, '/password-resets', { email: member.email })).status)
      }
      expect(statuses[0]).toBe(202)
      expect(statuses.at(-1)).toBe(429)
      const letters = await readLetters(limited.client.pool, member.email)
      expect(letters.filter(({ kind }) => kind === 'account.reset').length).toBeLessThanOrEqual(3)
    } finally {
      await limited.stop()
    }
  })
})
