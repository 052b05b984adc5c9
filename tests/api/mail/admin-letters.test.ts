import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { letterListSchema } from '../../../shared/schemas/admin'
import { queueLetter, queueNotice } from '../../../server/modules/mail/mail.service'
import { startApp, type TestApp } from '../../support/app'
import { startTestMail, type TestMail } from '../../support/fakes'
import { signIn, type SignedInHeaders } from '../../support/sign-in'

let app: TestApp
let admin: SignedInHeaders

beforeAll(async () => {
  app = await startApp()
  admin = await signIn(app, 'admin')
})

afterAll(() => app.stop())

async function addLetter(status: 'waiting' | 'sent' | 'dead', subject: string): Promise<string> {
  const letter = {
    recipient: 'reader@example.org',
    kind: 'test',
    textBody: 'A secret link',
    htmlBody: '<p>A secret link</p>',
  }
  await queueLetter(app.client.db, { ...letter, subject })
  const { rows } = await app.client.pool.query<{ id: string }>(
    `update outbox set status = $1, attempts = 12, last_error = 'refused' where subject = $2 returning id`,
    [status, subject],
  )
  return rows[0]!.id
}

describe('GET /api/v1/admin/letters', () => {
  it('is for admins alone', async () => {
    await request(app.url).get('/api/v1/admin/letters').expect(401)
    for (const role of ['member', 'moderator'] as const) {
      const headers = await signIn(app, role)
      await request(app.url).get('/api/v1/admin/letters').set(headers).expect(403)
      await request(app.url)
        .post(`/api/v1/admin/letters/${await addLetter('dead', `By ${role}`)}/retry`)
        .set(headers)
        .expect(403)
    }
  })

  it('lists letters that were given up, page by page, without their words', async () => {
    for (const subject of ['Dead 1', 'Dead 2', 'Dead 3']) await addLetter('dead', subject)
    await addLetter('sent', 'Sent')
    const ask = async (query: string) =>
      letterListSchema.parse((await request(app.url).get(`/api/v1/admin/letters?${query}`).set(admin).expect(200)).body)
    const first = await ask('status=dead&limit=2')
    expect(first.items.map(({ subject }) => subject)).toEqual(['Dead 3', 'Dead 2'])
    expect(first.items[0]).toMatchObject({ status: 'dead', attempts: 12, lastError: 'refused', can: { retry: true } })
    expect(JSON.stringify(first)).not.toContain('secret')
    expect(first.counts).toMatchObject({ sent: 1 })
    const second = await ask(`status=dead&limit=2&cursor=${encodeURIComponent(first.next ?? '')}`)
    expect(second.items[0]?.subject).toBe('Dead 1')
  })
})

describe('POST /api/v1/admin/letters/:id/retry', () => {
  it('gives a dead letter its tries again, once, and tells the trail', async () => {
    const id = await addLetter('dead', 'Again')
    const retry = () => request(app.url).post(`/api/v1/admin/letters/${id}/retry`).set(admin)
    const { body } = await retry().expect(200)
    expect(body).toMatchObject({ id, status: 'waiting', attempts: 0 })
    await retry().expect(409)
    const { rows } = await app.client.pool.query(`select action from audit_events where subject_id = $1`, [id])
    expect(rows).toEqual([{ action: 'letter.retry' }])
    const jobs = await app.client.pool.query(`select 1 from jobs.job where data->>'id' = $1`, [id])
    expect(jobs.rowCount).toBe(2)
  })

  it('answers 404 to names of nothing', async () => {
    for (const id of ['nothing', '00000000-0000-4000-8000-000000000000']) {
      await request(app.url).post(`/api/v1/admin/letters/${id}/retry`).set(admin).expect(404)
    }
  })
})

describe('a notice', () => {
  async function sendNotice() {
    const { rows } = await app.client.pool.query<{ id: number }>(
      `update people set email_confirmed_at = now(), wants_notices = true where role = 'member' and is_demo returning id`,
    )
    const personId = rows[0]!.id
    const content = { subject: 'Your proposal was approved', paragraphs: ['It was.'] }
    await queueNotice(app.client.db, { personId, kind: 'test.notice', content, origin: 'https://fits.example' })
    const { rows: letters } = await app.client.pool.query<{ unsubscribe_url: string; text_body: string }>(
      `select * from outbox where kind = 'test.notice' order by created_at desc, id limit 1`,
    )
    return { personId, url: new URL(letters[0]!.unsubscribe_url), text: letters[0]!.text_body }
  }

  const wantsNotices = async (id: number) =>
    (await app.client.pool.query<{ wants_notices: boolean }>('select wants_notices from people where id = $1', [id]))
      .rows[0]?.wants_notices

  it('can be unsubscribed from in one click, as mail programs do it, and again without harm', async () => {
    const { personId, url, text } = await sendNotice()
    expect(url.origin).toBe('https://fits.example')
    expect(text).toContain(`https://fits.example/unsubscribe?token=${url.searchParams.get('token')}`)
    const post = () =>
      request(app.url).post(`${url.pathname}${url.search}`).type('form').send('List-Unsubscribe=One-Click').expect(204)
    await post()
    expect(await wantsNotices(personId)).toBe(false)
    await post()
  })

  it('is not sent to whoever wants none, and reading its link changes nothing', async () => {
    const { personId, url } = await sendNotice()
    await request(app.url).get(`${url.pathname}${url.search}`).expect(405)
    expect(await wantsNotices(personId)).toBe(true)
    await app.client.pool.query('update people set wants_notices = false where id = $1', [personId])
    const content = { subject: 'Unwanted', paragraphs: [] }
    await queueNotice(app.client.db, { personId, kind: 'test.notice', content, origin: 'https://fits.example' })
    const { rowCount } = await app.client.pool.query(`select 1 from outbox where subject = 'Unwanted'`)
    expect(rowCount).toBe(0)
  })

  it('keeps only the hash of its token, and refuses one that nobody was sent', async () => {
    const { url } = await sendNotice()
    const { rows } = await app.client.pool.query(`select token_hash from email_tokens where purpose = 'unsubscribe'`)
    expect(JSON.stringify(rows)).not.toContain(url.searchParams.get('token'))
    await request(app.url).post('/api/v1/unsubscribe?token=made-up').expect(404)
    await request(app.url).post('/api/v1/unsubscribe').expect(422)
  })
})

describe('the mailroom', () => {
  let mail: TestMail
  beforeAll(async () => {
    mail = await startTestMail()
  })
  afterAll(() => mail.stop())

  it('is there only in demo mode, with a stand-in for the mail server', async () => {
    for (const path of ['/mailroom.json', '/api/v1/mailroom']) await request(app.url).get(path).expect(404)
    const without = await startApp({ env: { DEMO: '0', MAILROOM_FOLDER: mail.folder } })
    for (const path of ['/mailroom.json', '/api/v1/mailroom']) await request(without.url).get(path).expect(404)
    await without.stop()
    const demo = await startApp({ env: { MAILROOM_FOLDER: mail.folder } })
    for (const path of ['/mailroom.json', '/api/v1/mailroom']) {
      const { headers, body } = await request(demo.url).get(path).expect(200)
      expect(headers['cache-control']).toContain('no-store')
      expect(body).toEqual({ items: [] })
    }
    await demo.stop()
  })
})
