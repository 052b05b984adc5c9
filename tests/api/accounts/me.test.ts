import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { ownSessionsSchema } from '../../../shared/schemas/accounts'
import { startApp, type TestApp } from '../../support/app'
import { findToken, readLetters } from '../../support/letters'
import { signIn, signInAs, type SignedInHeaders } from '../../support/sign-in'
import { expectProblem, listPointers } from '../problems'
import { addMember, addSignedIn, inventMember, send } from './members'

let app: TestApp

beforeAll(async () => {
  app = await startApp({ app: { rateLimits: { signUpsPerHour: 500, failedSignInsPerQuarter: 500 } } })
})

afterAll(() => app.stop())

const getMe = (headers: SignedInHeaders) => request(app.url).get('/api/v1/me').set(headers)
const patchMe = (headers: SignedInHeaders, body: object) => request(app.url).patch('/api/v1/me').set(headers).send(body)
const deleteMe = (headers: SignedInHeaders, body: object) =>
  request(app.url).delete('/api/v1/me').set(headers).send(body)

async function listSessions(headers: SignedInHeaders) {
  const { body } = await request(app.url).get('/api/v1/me/sessions').set(headers).expect(200)
  return ownSessionsSchema.parse(body).items
}

describe('one’s own account', () => {
  it('is nobody else’s to see: without a session every call on it is 401', async () => {
    const calls = [
      request(app.url).get('/api/v1/me'),
      request(app.url).patch('/api/v1/me').send({ wantsNotices: false }),
      request(app.url).delete('/api/v1/me').send({ password: 'x' }),
      send(app, '/me/email', { email: 'a@example.com', password: 'x' }),
      send(app, '/me/password', { password: 'x', newPassword: 'a new one that is long' }),
      request(app.url).get('/api/v1/me/sessions'),
      request(app.url).delete('/api/v1/me/sessions/00000000-0000-4000-8000-000000000000'),
    ]
    for (const call of calls) expectProblem(await call, 401)
  })

  it('changes the name and whether notices are sent, and refuses anything else', async () => {
    const { headers, member } = await addSignedIn(app)
    const renamed = `${member.name} Renamed`
    await patchMe(headers, { name: renamed, wantsNotices: false }).expect(200)
    expect((await getMe(headers)).body).toMatchObject({ name: renamed, wantsNotices: false, role: 'member' })
    const refused = expectProblem(
      await patchMe(headers, { wantsNotices: true, role: 'admin', version: 3, email: 'x@example.com' }),
      422,
    )
    expect(listPointers(refused)).toEqual(['#/email', '#/role', '#/version'])
    const other = await addMember(app)
    expect(listPointers(expectProblem(await patchMe(headers, { name: other.name }), 422))).toEqual(['#/name'])
    expect((await getMe(headers)).body).toMatchObject({ name: renamed, role: 'member', email: member.email })
  })
})

describe('a new password', () => {
  it('needs the present one: without it 403 and nothing changes', async () => {
    const { headers, member } = await addSignedIn(app)
    const change = { password: 'not the present one', newPassword: 'barnacles hold on as well' }
    const problem = expectProblem(await send(app, '/me/password', change, headers), 403)
    expect(listPointers(problem)).toEqual(['#/password'])
    await signInAs(app, member)
  })

  it('ends the other sessions, unless they are to stay, and is told by letter', async () => {
    const { headers, member } = await addSignedIn(app)
    const elsewhere = await signInAs(app, member)
    const newPassword = 'barnacles hold on as well'
    const keep = { password: member.password, newPassword, endOthers: false }
    await send(app, '/me/password', keep, headers).expect(204)
    await getMe(elsewhere).expect(200)

    await send(app, '/me/password', { password: newPassword, newPassword: 'urchins graze after dark' }, headers).expect(
      204,
    )
    await getMe(headers).expect(200)
    expectProblem(await getMe(elsewhere), 401)
    expectProblem(await send(app, '/session', { email: member.email, password: newPassword }), 401)
    expect((await readLetters(app.client.pool, member.email)).at(-1)?.kind).toBe('account.password-changed')
  })

  it('is held to the same rules as the first, the name of its owner included', async () => {
    const { headers, member } = await addSignedIn(app)
    for (const newPassword of ['fourteen chars', `the rock of ${member.name}`, 'passwordpassword']) {
      const change = { password: member.password, newPassword }
      const problem = expectProblem(await send(app, '/me/password', change, headers), 422)
      expect(listPointers(problem), newPassword).toEqual(['#/newPassword'])
    }
  })

  it('cannot be guessed at from a borrowed session: after twenty tries even the right one is put off', async () => {
    const { headers, member } = await addSignedIn(app)
    const attempt = (password: string) =>
      send(app, '/me/password', { password, newPassword: 'urchins graze after dark' }, headers)
    for (let tries = 0; tries < 20; tries += 1) await attempt(`guess ${tries}`).expect(403)
    expectProblem(await attempt(member.password), 429)
    await signInAs(app, member)
  })
})

describe('another e-mail address', () => {
  it('counts once the link sent to it is opened, and the old one is told', async () => {
    const { headers, member } = await addSignedIn(app)
    const email = `new.${member.email}`
    expectProblem(await send(app, '/me/email', { email, password: 'not the present one' }, headers), 403)
    expect(await readLetters(app.client.pool, email)).toEqual([])
    await send(app, '/me/email', { email, password: member.password }, headers).expect(202)
    expect((await readLetters(app.client.pool, member.email)).at(-1)?.kind).toBe('account.email-change-notice')
    await signInAs(app, member)
    await send(app, '/people/confirm', { token: await findToken(app.client.pool, email) }).expect(200)
    await signInAs(app, { email, password: member.password })
    expectProblem(await send(app, '/session', { email: member.email, password: member.password }), 401)
  })

  it('answers the same where it is somebody else’s, who is told by letter', async () => {
    const { headers, member } = await addSignedIn(app)
    const other = await addMember(app)
    const free = await send(app, '/me/email', { email: inventMember().email, password: member.password }, headers)
    const taken = await send(app, '/me/email', { email: other.email, password: member.password }, headers)
    expect([taken.status, taken.text]).toEqual([free.status, free.text])
    expect((await readLetters(app.client.pool, other.email)).at(-1)?.kind).toBe('account.known')
    await signInAs(app, other)
  })
})

describe('one’s sessions', () => {
  it('are listed without their ids, and one that is ended signs nobody in any more', async () => {
    const { headers, member } = await addSignedIn(app)
    const elsewhere = await signInAs(app, member)
    const sessions = await listSessions(headers)
    expect(sessions.map(({ isThis }) => isThis).sort()).toEqual([false, true])
    expect(JSON.stringify(sessions)).not.toContain(elsewhere.Cookie.split('=')[1])
    const other = sessions.find(({ isThis }) => !isThis)
    await request(app.url).delete(`/api/v1/me/sessions/${other?.id}`).set(headers).expect(204)
    expectProblem(await getMe(elsewhere), 401)
    await getMe(headers).expect(200)
  })

  it('are ended by their owner alone: to everybody else they are not there', async () => {
    const { headers } = await addSignedIn(app)
    const [session] = await listSessions(headers)
    const stranger = await signIn(app, 'admin')
    for (const id of [session?.id ?? '', 'nonsense']) {
      expectProblem(await request(app.url).delete(`/api/v1/me/sessions/${id}`).set(stranger), 404)
    }
    await getMe(headers).expect(200)
  })
})

describe('deleting one’s account', () => {
  it('needs the password, leaves a number alone, ends every session and takes the letters away', async () => {
    const { headers, member } = await addSignedIn(app)
    const elsewhere = await signInAs(app, member)
    expectProblem(await deleteMe(headers, { password: 'not the present one' }), 403)
    await deleteMe(headers, { password: member.password }).expect(204)
    expectProblem(await getMe(headers), 401)
    expectProblem(await getMe(elsewhere), 401)
    expectProblem(await send(app, '/session', { email: member.email, password: member.password }), 401)
    expectProblem(await request(app.url).get(`/api/v1/people/${encodeURIComponent(member.name)}`), 404)
    const everything = await app.client.pool.query(
      `SELECT (SELECT json_agg(p)::text FROM people p) AS people, (SELECT json_agg(a)::text FROM audit_events a) AS audit`,
    )
    expect(JSON.stringify(everything.rows)).not.toContain(member.name)
    expect(JSON.stringify(everything.rows)).not.toContain(member.email)
    expect((await readLetters(app.client.pool, member.email)).map(({ kind }) => kind)).toEqual(['account.deleted'])
  })

  it('gives name and address free for somebody new', async () => {
    const { headers, member } = await addSignedIn(app)
    await deleteMe(headers, { password: member.password }).expect(204)
    await addMember(app, member)
  })

  it('is refused to the only admin', async () => {
    const headers = await signIn(app, 'admin')
    expectProblem(await deleteMe(headers, { password: 'every ruler starts at zero' }), 409)
    await getMe(headers).expect(200)
  })
})
