import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { adminPeopleSchema } from '../../../shared/schemas/people'
import { createApp } from '../../../server/app'
import { readEnv } from '../../../server/config/env'
import { createDatabaseClient } from '../../../server/db/client'
import { createLogger } from '../../../server/lib/logger'
import { startApp, type TestApp } from '../../support/app'
import { readLetters } from '../../support/letters'
import { findDemoPerson, signIn, signInAs, type SignedInHeaders } from '../../support/sign-in'
import { expectProblem, listPointers } from '../problems'
import { addMember, addSignedIn, send } from './members'

let app: TestApp
let admin: SignedInHeaders

beforeAll(async () => {
  app = await startApp({ app: { rateLimits: { signUpsPerHour: 500, failedSignInsPerQuarter: 500 } } })
  admin = await signIn(app, 'admin')
})

afterAll(() => app.stop())

const pathOf = (name: string) => `/api/v1/admin/people/${encodeURIComponent(name)}`
const change = (name: string, body: object, headers: Record<string, string> = admin) =>
  request(app.url).patch(pathOf(name)).set(headers).send(body)
const list = async (query: Record<string, string> = {}) =>
  adminPeopleSchema.parse((await request(app.url).get('/api/v1/admin/people').query(query).set(admin).expect(200)).body)

async function readAudit(action: string) {
  const { rows } = await app.client.pool.query<{ subject_id: string; detail: object }>(
    'SELECT subject_id, detail FROM audit_events WHERE action = $1 ORDER BY id DESC LIMIT 1',
    [action],
  )
  return rows[0]
}

describe('looking after people', () => {
  it('is for admins: visitors get 401, members and moderators 403, and nothing changes', async () => {
    const { member, headers } = await addSignedIn(app)
    const moderator = await signIn(app, 'moderator')
    expectProblem(await request(app.url).get('/api/v1/admin/people'), 401)
    expectProblem(await change(member.name, { role: 'admin' }, {}), 401)
    for (const other of [headers, moderator]) {
      expectProblem(await request(app.url).get('/api/v1/admin/people').set(other), 403)
      expectProblem(await change(member.name, { role: 'admin' }, other), 403)
    }
    expect((await list({ q: member.email })).items[0]?.role).toBe('member')
  })

  it('finds people by part of a name or address, by role and by standing, and pages through all once', async () => {
    const member = await addMember(app)
    expect((await list({ q: member.email.slice(0, -4).toUpperCase() })).items.map(({ name }) => name)).toContain(
      member.name,
    )
    expect((await list({ role: 'moderator' })).items.every(({ role }) => role === 'moderator')).toBe(true)
    for (const q of ["'", '%', '_', '\\', '" OR 1=1']) expect((await list({ q })).items).toEqual([])
    for (let more = 0; more < 26; more += 1) {
      await app.client.pool.query(`INSERT INTO people (name, email, password_hash) VALUES ($1, $2, 'none')`, [
        `Paged ${String(more).padStart(2, '0')}`,
        `paged${more}@example.com`,
      ])
    }
    const seen: string[] = []
    let cursor: string | null = ''
    while (cursor !== null) {
      const page = await list({ q: 'paged', ...(cursor !== '' && { cursor }) })
      seen.push(...page.items.map(({ name }) => name))
      cursor = page.next
    }
    expect(seen).toEqual(Array.from({ length: 26 }, (_, index) => `Paged ${String(index).padStart(2, '0')}`))
  })

  it('gives a role, which counts from the next request of a running session on, and writes it down', async () => {
    const { member, headers } = await addSignedIn(app)
    await change(member.name, { role: 'admin' }).expect(200)
    await request(app.url).get('/api/v1/admin/people').set(headers).expect(200)
    await change(member.name, { role: 'member' }).expect(200)
    expectProblem(await request(app.url).get('/api/v1/admin/people').set(headers), 403)
    expect((await readAudit('person.change-role'))?.detail).toEqual({ from: 'admin', to: 'member' })
    const letters = await readLetters(app.client.pool, member.email)
    expect(letters.filter(({ kind }) => kind === 'account.role')).toHaveLength(2)
  })

  it('suspends with a reason: all sessions end, signing in says why, and lifting it opens the account again', async () => {
    const { member, headers } = await addSignedIn(app)
    await change(member.name, { suspended: { reason: 'Numbers were made up.' } }).expect(200)
    expectProblem(await request(app.url).get('/api/v1/me').set(headers), 401)
    const refused = await send(app, '/session', { email: member.email, password: member.password })
    expect(expectProblem(refused, 403).detail).toContain('Numbers were made up.')
    expectProblem(await send(app, '/session', { email: member.email, password: 'a wrong guess' }), 401)
    expect((await list({ standing: 'suspended' })).items.map(({ name }) => name)).toContain(member.name)
    expect((await readAudit('person.suspend'))?.detail).toEqual({ reason: 'Numbers were made up.' })
    await change(member.name, { suspended: null }).expect(200)
    await signInAs(app, member)
  })

  it('cannot be turned on oneself, nor on somebody who is not there', async () => {
    const own = findDemoPerson('admin').name
    expectProblem(await change(own, { role: 'member' }), 403)
    expectProblem(await change(own, { suspended: { reason: 'Tired.' } }), 403)
    expectProblem(await change('Nobody At All', { role: 'member' }), 404)
  })

  it('names every wrong field and takes no others', async () => {
    const { name } = await addMember(app)
    const wrong = { role: 'owner', suspended: { reason: '' }, email: 'x@example.com', version: 1 }
    expect(listPointers(expectProblem(await change(name, wrong), 422))).toEqual([
      '#/email',
      '#/role',
      '#/suspended/reason',
      '#/version',
    ])
  })
})

describe('a person’s public page', () => {
  it('shows nobody an address, a hash or an inner number', async () => {
    const { name, email } = findDemoPerson('member')
    const response = await request(app.url)
      .get(`/api/v1/people/${encodeURIComponent(name)}`)
      .expect(200)
    expect(response.body).toMatchObject({ name, isDemo: true, accepted: { revisions: 0 }, can: { administer: false } })
    expect(response.text).not.toContain(email)
    expect(response.text).not.toMatch(/argon2|"id"|password|suspended|address/)
    expect(response.headers.vary).toContain('Cookie')
  })
})

describe('two processes on one database', () => {
  it('both know at once that somebody signed out or lost a role', async () => {
    const client = createDatabaseClient(app.database.databaseUrl)
    const env = readEnv({ NODE_ENV: 'test', PORT: '0', DATABASE_URL: app.database.databaseUrl })
    const second = createApp({ db: client.db, env, logger: createLogger('silent') })
    try {
      const { member, headers } = await addSignedIn(app)
      await request(second).get('/api/v1/me').set(headers).expect(200)
      await change(member.name, { role: 'admin' }).expect(200)
      await request(second).get('/api/v1/admin/people').set(headers).expect(200)
      await change(member.name, { role: 'member' }).expect(200)
      await request(second).get('/api/v1/admin/people').set(headers).expect(403)
      await request(second).delete('/api/v1/session').set(headers).expect(204)
      expectProblem(await request(app.url).get('/api/v1/me').set(headers), 401)
    } finally {
      await client.close()
    }
  })
})
