import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { startApp, type TestApp } from '../../support/app'
import { findLink, findToken, readLetters } from '../../support/letters'
import { signInAs } from '../../support/sign-in'
import { expectProblem, listPointers } from '../problems'
import { addMember, goodPassword, inventMember, send } from './members'

const hour = 60 * 60 * 1000

let app: TestApp
let time = new Date()

beforeAll(async () => {
  app = await startApp({ app: { now: () => time, rateLimits: { signUpsPerHour: 500, failedSignInsPerQuarter: 500 } } })
})

afterAll(() => app.stop())

const lettersTo = (recipient: string) => readLetters(app.client.pool, recipient)

describe('signing up', () => {
  it('writes a letter whose link confirms the address, and only then signs in', async () => {
    const member = inventMember()
    await send(app, '/people', member).expect(202)
    expect((await lettersTo(member.email)).map(({ kind }) => kind)).toEqual(['account.confirm'])
    expectProblem(await send(app, '/session', { email: member.email, password: member.password }), 401)
    await send(app, '/people/confirm', { token: await findToken(app.client.pool, member.email) }).expect(200)
    await signInAs(app, member)
  })

  it('answers the same for an address that has an account, which only a letter to it tells', async () => {
    const known = await addMember(app)
    const fresh = inventMember()
    const again = { ...inventMember(), email: known.email.toUpperCase() }
    const answers = [await send(app, '/people', fresh), await send(app, '/people', again)]
    expect(answers.map(({ status }) => status)).toEqual([202, 202])
    expect(answers[1]?.text).toBe(answers[0]?.text)
    expect((await lettersTo(known.email)).at(-1)?.kind).toBe('account.known')
    await signInAs(app, known)
  })

  it('takes the newest of several sign-ups with an address that was never confirmed', async () => {
    const first = inventMember()
    const second = { ...first, name: `${first.name} again`, password: 'a second thought about it' }
    await send(app, '/people', first).expect(202)
    const firstToken = await findToken(app.client.pool, first.email)
    await send(app, '/people', second).expect(202)
    expectProblem(await send(app, '/people/confirm', { token: firstToken }), 422)
    await send(app, '/people/confirm', { token: await findToken(app.client.pool, first.email) }).expect(200)
    expectProblem(await send(app, '/session', { email: first.email, password: first.password }), 401)
    await signInAs(app, second)
  })

  it('refuses a name that somebody has, in whatever case, or that speaks for the site', async () => {
    const { name } = await addMember(app)
    for (const taken of [name.toUpperCase(), 'Admin', 'A former member']) {
      const problem = expectProblem(await send(app, '/people', { ...inventMember(), name: taken }), 422)
      expect(listPointers(problem), taken).toEqual(['#/name'])
    }
  })

  it('gives a name free again whose sign-up was not confirmed within two days', async () => {
    const start = time
    const slow = inventMember()
    const quick = { ...inventMember(), name: slow.name }
    await send(app, '/people', slow).expect(202)
    expectProblem(await send(app, '/people', quick), 422)
    try {
      time = new Date(start.getTime() + 49 * hour)
      expectProblem(await send(app, '/people/confirm', { token: await findToken(app.client.pool, slow.email) }), 422)
      await addMember(app, quick)
    } finally {
      time = start
    }
  })

  it('names every wrong field at once, and refuses fields that are not the visitor’s to set', async () => {
    const wrong = expectProblem(await send(app, '/people', { name: ' ', email: 'nowhere', password: 'short' }), 422)
    expect(listPointers(wrong)).toEqual(['#/email', '#/name', '#/password'])
    const more = { ...inventMember(), role: 'admin', status: 'active', ownerId: 1, version: 2, verified: true }
    const refused = expectProblem(await send(app, '/people', more), 422)
    expect(listPointers(refused)).toEqual(['#/ownerId', '#/role', '#/status', '#/verified', '#/version'])
    expect(await lettersTo(more.email)).toEqual([])
  })

  it('keeps line breaks and markup out of names, so that no letter has a header or an element of theirs', async () => {
    for (const name of ['Ledge\r\nBcc: everybody@example.com', '<img src=x>', 'Ledge\u202Eegdel']) {
      expectProblem(await send(app, '/people', { ...inventMember(), name }), 422)
    }
  })

  it('refuses JSON that is sent as something else', async () => {
    const response = await request(app.url)
      .post('/api/v1/people')
      .set('Content-Type', 'text/plain')
      .send(JSON.stringify(inventMember()))
    expectProblem(response, 415)
  })

  it('builds links from its own address, whatever Host the visitor sends', async () => {
    const member = inventMember()
    await send(app, '/people', member, { Host: 'evil.example.net', 'X-Forwarded-Host': 'evil.example.net' }).expect(202)
    const [letter] = await lettersTo(member.email)
    expect(letter?.text).not.toContain('evil')
    expect(letter?.html).not.toContain('evil')
    expect((await findLink(app.client.pool, member.email)).hostname).toBe('127.0.0.1')
  })

  it('sends one address three letters an hour, then refuses, with an account or without', async () => {
    const known = await addMember(app)
    const statuses: number[][] = []
    for (const email of [known.email, inventMember().email]) {
      const answers = []
      for (let time = 0; time < 12; time += 1) answers.push(await send(app, '/people', { ...inventMember(), email }))
      statuses.push(answers.map(({ status }) => status).slice(-4))
      expect((await lettersTo(email)).length).toBeLessThanOrEqual(3)
      expect(Number(answers.at(-1)?.headers['retry-after'])).toBeGreaterThan(0)
    }
    expect(statuses[0]?.at(-1)).toBe(429)
    expect(statuses[1]?.at(-1)).toBe(429)
  })
})

describe('a password', () => {
  const signUpWith = (password: string) => send(app, '/people', { ...inventMember(), password })

  it('has 15 characters at least: 14 are refused with the reason', async () => {
    const problem = expectProblem(await signUpWith('fourteen chars'), 422)
    expect(problem.errors).toEqual([
      { pointer: '#/password', detail: expect.stringContaining('shorter than 15 characters') as string },
    ])
    await signUpWith('fifteen charact').expect(202)
  })

  it('may be long, with spaces and emoji, or of small letters alone, and counts to its last character', async () => {
    const long = `${'seven lamps over still water '.repeat(4)}🐠🐚`
    const member = await addMember(app, { ...inventMember(), password: long })
    await signInAs(app, member)
    expectProblem(await send(app, '/session', { email: member.email, password: long.replace('🐚', '🐙') }), 401)
    await signUpWith('onlysmallletters').expect(202)
    await signUpWith('🐠🐚🐙🦀🦐🐡🐟🐬🐳🐋🦈🐊🐢🦑🦞').expect(202)
  })

  it('is refused where it is common, the site’s name, one’s own name or address, a row or a repetition', async () => {
    const member = inventMember()
    const refused = {
      passwordpassword: 'commonest',
      'Password12345678!!': 'commonest',
      iloveyouiloveyou: 'commonest',
      'stillfits forever': 'name of this site',
      [`hello ${member.name} hello`]: 'your name',
      [`hello ${member.email}`]: 'your name',
      aaaaaaaaaaaaaaaaaa: 'over and over',
      abcabcabcabcabcabc: 'over and over',
      abcdefghijklmnopqrs: 'follow each other',
      '123456789012345678': 'follow each other',
    }
    for (const [password, reason] of Object.entries(refused)) {
      const problem = expectProblem(await send(app, '/people', { ...member, password }), 422)
      expect(problem.errors?.[0], password).toEqual({
        pointer: '#/password',
        detail: expect.stringContaining(reason) as string,
      })
    }
  })

  it('is kept as argon2id of at least 19 MiB and two rounds', async () => {
    const { email } = await addMember(app)
    const { rows } = await app.client.pool.query<{ password_hash: string }>(
      'SELECT password_hash FROM people WHERE email = $1',
      [email],
    )
    const [, memory, rounds] = /^\$argon2id\$v=19\$m=(\d+),t=(\d+),p=1\$/.exec(rows[0]?.password_hash ?? '') ?? []
    expect(Number(memory)).toBeGreaterThanOrEqual(19_456)
    expect(Number(rounds)).toBeGreaterThanOrEqual(2)
    expect(rows[0]?.password_hash).not.toContain(goodPassword)
  })
})
