import pg from 'pg'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { auditListSchema } from '../../shared/schemas/admin'
import { recordAudit } from '../../server/lib/audit'
import { startApp, type TestApp } from '../support/app'
import { findDemoPerson, signIn, type SignedInHeaders } from '../support/sign-in'

let app: TestApp
let admin: SignedInHeaders
let adminId: number

beforeAll(async () => {
  app = await startApp()
  const { rows } = await app.client.pool.query<{ id: number }>(`select id from people where role = 'admin' and is_demo`)
  adminId = rows[0]!.id
  for (let index = 1; index <= 5; index++) {
    await recordAudit(app.client.db, {
      actorId: index % 2 === 0 ? adminId : null,
      action: index === 5 ? 'tests_only.run' : 'testing.done',
      subjectType: 'test',
      subjectId: index,
      detail: { index },
      requestId: 'request-1234',
    })
  }
  const { rows: proposals } = await app.client.pool.query<{ id: string }>(
    `insert into proposals (kind, author_id) values ('heater', $1) returning id`,
    [adminId],
  )
  await app.client.pool.query(
    `insert into proposal_messages (proposal_id, kind, words) values ($1, 'words', 'Hello')`,
    [proposals[0]?.id],
  )
  admin = await signIn(app, 'admin')
})

afterAll(() => app.stop())

const search = async (query: string) =>
  auditListSchema.parse((await request(app.url).get(`/api/v1/admin/audit?${query}`).set(admin).expect(200)).body)

describe('what is only ever added to', () => {
  const tables = ['audit_events', 'proposal_messages', 'gear_revisions', 'gear_values'] as const
  const column = { audit_events: 'action', proposal_messages: 'words', gear_revisions: 'summary', gear_values: 'key' }

  const statements = tables.flatMap((table) => [
    [table, `update ${table} set ${column[table]} = 'changed'`],
    [table, `delete from ${table}`],
    [table, `truncate ${table} cascade`],
  ])

  async function run(url: string, statement: string): Promise<string> {
    const client = new pg.Client({ connectionString: url })
    await client.connect()
    try {
      await client.query(statement)
      return 'done'
    } catch (error) {
      return String((error as { code?: string }).code)
    } finally {
      await client.end()
    }
  }

  const countRows = async (table: string) =>
    (await app.client.pool.query<{ count: number }>(`select count(*)::int as count from ${table}`)).rows[0]?.count ?? 0

  it.each(statements)(
    'in %s: the application’s role is refused "%s" for want of the right',
    async (table, statement) => {
      const before = await countRows(table)
      expect(before).toBeGreaterThan(0)
      expect(await run(app.database.databaseUrl, statement)).toBe('42501')
      expect(await countRows(table)).toBe(before)
    },
  )

  it.each(statements)('in %s: the owner is refused "%s" by a trigger', async (table, statement) => {
    const before = await countRows(table)
    expect(await run(app.database.ownerUrl, statement)).toMatch(/^(23001|P0001)$/)
    expect(await countRows(table)).toBe(before)
  })

  it('cannot be freed of its triggers by the application’s role', async () => {
    for (const table of tables) {
      expect(await run(app.database.databaseUrl, `alter table ${table} disable trigger all`)).toBe('42501')
    }
  })
})

describe('GET /api/v1/admin/audit', () => {
  it('is for admins alone', async () => {
    await request(app.url).get('/api/v1/admin/audit').expect(401)
    for (const role of ['member', 'moderator'] as const) {
      await request(app.url)
        .get('/api/v1/admin/audit')
        .set(await signIn(app, role))
        .expect(403)
    }
    const { headers } = await request(app.url).get('/api/v1/admin/audit').set(admin).expect(200)
    expect(headers['cache-control']).toBe('private, no-store')
  })

  it('finds events by who, what, about what and when, newest first', async () => {
    const { name } = findDemoPerson('admin')
    const about = (list: { items: readonly { subject: { id: string } }[] }) =>
      list.items.map(({ subject }) => subject.id)
    expect(about(await search('action=testing'))).toEqual(['4', '3', '2', '1'])
    expect(about(await search('action=testing.done&actor=system'))).toEqual(['3', '1'])
    expect(about(await search(`action=testing&actor=${encodeURIComponent(name.toUpperCase())}`))).toEqual(['4', '2'])
    expect(about(await search('subject=test:3'))).toEqual(['3'])
    expect(about(await search('subject=test&action='))).toEqual(['5', '4', '3', '2', '1'])
    expect(about(await search('subject=test&to=2001-01-01'))).toEqual([])
    const today = new Date().toISOString().slice(0, 10)
    expect(about(await search(`subject=test&from=${today}&to=${today}`))).toHaveLength(5)
  })

  it('takes _ and % in an action for themselves', async () => {
    expect((await search('action=tests%25')).items).toEqual([])
    expect((await search('action=tests_only')).items).toHaveLength(1)
  })

  it('tells who acted by name, and nothing else of them', async () => {
    const { items } = await search('subject=test:4')
    expect(items).toMatchObject([
      { actor: findDemoPerson('admin').name, action: 'testing.done', detail: { index: 4 }, requestId: 'request-1234' },
    ])
    expect(JSON.stringify(items)).not.toContain('@')
  })

  it('goes on where the page before ended, and refuses a cursor of another question', async () => {
    const first = await search('subject=test&limit=2')
    const cursor = encodeURIComponent(first.next ?? '')
    const second = await search(`subject=test&limit=2&cursor=${cursor}`)
    expect([...first.items, ...second.items].map(({ subject }) => subject.id)).toEqual(['5', '4', '3', '2'])
    await request(app.url).get(`/api/v1/admin/audit?subject=other&cursor=${cursor}`).set(admin).expect(422)
  })

  it('names every wrong key at once', async () => {
    const { body } = await request(app.url)
      .get('/api/v1/admin/audit?from=yesterday&to=x&limit=0&role=admin')
      .set(admin)
      .expect(422)
    const pointers = body.errors.map(({ pointer }: { pointer: string }) => pointer).sort()
    expect(pointers).toEqual(expect.arrayContaining(['#/from', '#/limit', '#/to']))
    expect(JSON.stringify(body.errors)).toContain('role')
  })
})
