import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { sweepEvidence } from '../../../server/modules/evidence/evidence-sweep.service'
import { signIn, type SignedInHeaders } from '../../support/sign-in'
import { createJpeg, createPdf } from './files'
import { addProposal, countLeft, publish, readBytes, startEvidenceApp, upload, type EvidenceApp } from './records'

let app: EvidenceApp
let admin: SignedInHeaders

beforeAll(async () => {
  app = await startEvidenceApp()
  admin = await signIn(app, 'admin')
})

afterAll(() => app.stop())

async function addPhoto(status: 'draft' | 'pending' = 'draft') {
  const proposalId = await addProposal(app, status)
  const { body } = await upload(app, proposalId, await createJpeg()).expect(201)
  return { proposalId, id: String(body.id), url: String(body.url), thumbnailUrl: String(body.thumbnailUrl) }
}

describe('GET /api/v1/evidence/:id', () => {
  it('shows what nobody has approved to its uploader and to moderators alone, and lets nobody keep it', async () => {
    const { url, thumbnailUrl } = await addPhoto()
    for (const path of [url, thumbnailUrl]) {
      const { headers, body } = await request(app.url).get(path).expect(404)
      expect(headers['cache-control']).toContain('no-store')
      expect(body.detail).toMatch(/not public yet/)
      for (const by of [app.member, app.moderator, admin]) {
        const seen = await readBytes(app, path, by)
        expect(seen.status).toBe(200)
        expect(seen.headers['cache-control']).toBe('private, no-store')
      }
    }
  })

  it('hides one person’s file from another member', async () => {
    const { id, url } = await addPhoto()
    await app.client.pool.query(
      `update evidence_files set uploader_id = (select id from people where role = 'admin' limit 1) where id = $1`,
      [id],
    )
    await request(app.url).get(url).set(app.member).expect(404)
    await request(app.url).delete(url).set(app.member).expect(404)
  })

  it('shows everybody what was approved, answers 304 to whoever has it, and lets the file do nothing', async () => {
    const { id, url } = await addPhoto()
    await publish(app, id)
    const { headers } = await request(app.url).get(url).expect(200)
    expect(headers).toMatchObject({
      'content-type': 'image/jpeg',
      'x-content-type-options': 'nosniff',
      'cache-control': 'public, max-age=3600',
    })
    expect(headers['content-security-policy']).toMatch(/default-src 'none'.*sandbox/)
    await request(app.url)
      .get(url)
      .set('If-None-Match', headers.etag ?? '')
      .expect(304)
  })

  it('gives a document as a download', async () => {
    const { body } = await upload(app, await addProposal(app), createPdf(), 'sheet.pdf').expect(201)
    const { headers } = await readBytes(app, body.url, app.member)
    expect(headers['content-disposition']).toMatch(/^attachment; filename="evidence-[0-9a-f-]+\.pdf"$/)
    expect(headers['x-content-type-options']).toBe('nosniff')
    await request(app.url).get(`${body.url}/thumbnail`).set(app.member).expect(404)
  })

  it('answers 404 to names of nothing', async () => {
    for (const id of ['nothing', '00000000-0000-4000-8000-000000000000', '..%2f..%2fetc']) {
      await request(app.url).get(`/api/v1/evidence/${id}`).set(app.moderator).expect(404)
    }
  })
})

describe('GET /api/v1/proposals/:id/evidence', () => {
  it('lists the files to the author and to moderators, with what each may do', async () => {
    const { proposalId, id } = await addPhoto('pending')
    const path = `/api/v1/proposals/${proposalId}/evidence`
    const own = await request(app.url).get(path).set(app.member).expect(200)
    expect(own.body.items).toMatchObject([{ id, can: { remove: true } }])
    const theirs = await request(app.url).get(path).set(app.moderator).expect(200)
    expect(theirs.body.items).toMatchObject([{ id, can: { remove: false } }])
    await request(app.url).get(path).expect(401)
  })
})

describe('DELETE /api/v1/evidence/:id', () => {
  it('removes row and bytes while the proposal is open, and tells the trail', async () => {
    const before = await countLeft(app)
    const { id, url } = await addPhoto('pending')
    await request(app.url).delete(url).set('Sec-Fetch-Site', 'same-origin').expect(401)
    await request(app.url).delete(url).set(app.moderator).expect(403)
    await request(app.url).delete(url).set(app.member).expect(204)
    expect(await countLeft(app)).toMatchObject({ rows: before.rows, objects: before.objects })
    await request(app.url).get(url).set(app.member).expect(404)
    const { rows } = await app.client.pool.query('select action from audit_events where subject_id = $1 order by id', [
      id,
    ])
    expect(rows).toEqual([{ action: 'evidence.add' }, { action: 'evidence.remove' }])
  })

  it('leaves what backs a decided proposal', async () => {
    const published = await addPhoto()
    await publish(app, published.id)
    await request(app.url).delete(published.url).set(app.member).expect(409)
    const declined = await addPhoto()
    await app.client.pool.query(`update proposals set status = 'declined', decided_by = author_id where id = $1`, [
      declined.proposalId,
    ])
    await request(app.url).delete(declined.url).set(app.member).expect(409)
    await readBytes(app, declined.url, app.member)
  })
})

describe('the sweep of evidence', () => {
  const later = () => new Date(Date.now() + 2 * 24 * 60 * 60 * 1000)

  it('removes bytes without a row after a day, as a process leaves them that ends in mid-upload', async () => {
    const { url } = await addPhoto()
    await app.files.store.put('evidence/left-behind', Buffer.from('bytes'), 'image/jpeg')
    await sweepEvidence(app.client.db, app.files.store)
    expect(await app.files.listKeys()).toContain('evidence/left-behind')
    await sweepEvidence(app.client.db, app.files.store, later())
    expect(await app.files.listKeys()).not.toContain('evidence/left-behind')
    expect((await readBytes(app, url, app.member)).status).toBe(200)
  })

  it('removes files without a proposal or of a withdrawn one after a day, and never what is public', async () => {
    const [loose, withdrawn, fresh, open, shown] = await Promise.all([1, 2, 3, 4, 5].map(() => addPhoto()))
    const age = `created_at = now() - interval '2 days'`
    const run = (sql: string, id: string | undefined) => app.client.pool.query(sql, [id])
    await run(`update evidence_files set proposal_id = null, ${age} where id = $1`, loose?.id)
    await run(`update evidence_files set ${age} where id = $1`, withdrawn?.id)
    await run(
      `update proposals set status = 'withdrawn', updated_at = now() - interval '2 days' where id = $1`,
      withdrawn?.proposalId,
    )
    await run(`update evidence_files set proposal_id = null where id = $1`, fresh?.id)
    await run(`update evidence_files set ${age} where id = $1`, open?.id)
    await run(`update evidence_files set proposal_id = null, published_at = now(), ${age} where id = $1`, shown?.id)
    await sweepEvidence(app.client.db, app.files.store, later())
    const keys = await app.files.listKeys()
    const isKept = (id: string | undefined) => keys.includes(`evidence/${id}`)
    expect([loose, withdrawn, fresh, open, shown].map((file) => isKept(file?.id))).toEqual([
      false,
      false,
      true,
      true,
      true,
    ])
    await request(app.url)
      .get(loose?.url ?? '')
      .set(app.member)
      .expect(404)
  })
})
