import { Writable } from 'node:stream'
import request from 'supertest'
import { afterAll, beforeAll, expect, it } from 'vitest'
import { createLogger } from '../../../server/lib/logger'
import { startApp, type TestApp } from '../../support/app'
import { findToken } from '../../support/letters'
import { findDemoPerson, signIn } from '../../support/sign-in'
import { addMember, send } from './members'

const lines: string[] = []
let app: TestApp

beforeAll(async () => {
  const sink = new Writable({
    write(chunk: Buffer, _encoding, done) {
      lines.push(...chunk.toString().split('\n').filter(Boolean))
      done()
    },
  })
  app = await startApp({ app: { logger: createLogger('trace', sink) } })
})

afterAll(() => app.stop())

it('changes nothing for whoever only reads, signed in as anybody', async () => {
  const { body } = await request(app.url).get('/api/v1/openapi.json').expect(200)
  const { paths } = body as { paths: Record<string, Record<string, unknown>> }
  const readings = Object.entries(paths).flatMap(([path, methods]) => ('get' in methods ? [path] : []))
  const everyone = [{}, await signIn(app, 'member'), await signIn(app, 'moderator'), await signIn(app, 'admin')]
  const count = async () => {
    const { rows } = await app.client.pool.query<{ state: string }>(`
      SELECT md5(string_agg(t, '')) AS state FROM (
        SELECT (SELECT json_agg(p ORDER BY id)::text FROM people p) || (SELECT json_agg(s ORDER BY id_hash)::text FROM sessions s)
          || (SELECT count(*)::text FROM audit_events) || (SELECT count(*)::text FROM outbox)
          || (SELECT count(*)::text FROM rate_counts) || (SELECT count(*)::text FROM proposals)
          || (SELECT version::text FROM catalogue_version)) AS whole(t)`)
    return rows[0]?.state
  }
  const before = await count()
  expect(readings.length).toBeGreaterThan(10)
  for (const headers of everyone) {
    for (const path of readings) {
      const name = encodeURIComponent(findDemoPerson('member').name)
      await request(app.url)
        .get(path.replace('{name}', name).replace(/\{\w+\}/g, '1'))
        .set(headers)
    }
  }
  expect(await count()).toBe(before)
})

it('logs one record for one request, without a password, a token or a cookie, whatever line breaks come along', async () => {
  const member = await addMember(app)
  await send(app, '/password-resets', { email: member.email }).expect(202)
  const token = await findToken(app.client.pool, member.email)
  const from = lines.length
  const signedIn = await send(app, '/session', { email: member.email, password: member.password }).expect(200)
  await send(app, '/session', { email: 'a@example.com\r\n{"level":60}', password: 'wrong\nguess' }).expect(422)
  await request(app.url).get(`/api/v1/people/x%0D%0A%7B%22level%22%3A60%7D?token=${token}`).expect(404)
  const records = lines.slice(from)
  expect(records).toHaveLength(3)
  for (const record of records) expect(() => JSON.parse(record) as unknown).not.toThrow()
  const cookie = String(signedIn.headers['set-cookie']).split(';')[0]?.split('=')[1] ?? ''
  for (const secret of [member.password, token, cookie]) expect(lines.join('\n')).not.toContain(secret)
})
