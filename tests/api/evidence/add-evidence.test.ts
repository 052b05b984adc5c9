import { createHash } from 'node:crypto'
import request from 'supertest'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { evidenceLimits, evidenceSchema } from '../../../shared/schemas/evidence'
import { createGpsJpeg, createJpeg, createPdf, createPng, createWebp } from './files'
import { addProposal, countLeft, readBytes, startEvidenceApp, upload, type EvidenceApp } from './records'

let app: EvidenceApp

beforeAll(async () => {
  app = await startEvidenceApp()
})

afterAll(() => app.stop())

describe('POST /api/v1/proposals/:id/evidence', () => {
  it.each([
    ['photo.jpg', 'image/jpeg', createJpeg],
    ['photo.png', 'image/png', createPng],
    ['photo.webp', 'image/webp', createWebp],
  ])('keeps %s with a small copy and an audit event', async (name, contentType, create) => {
    const id = await addProposal(app)
    const response = await upload(app, id, await create(), name)
      .field('caption', ' The calipers ')
      .expect(201)
    const evidence = evidenceSchema.parse(response.body)
    expect(evidence).toMatchObject({
      kind: 'photo',
      contentType,
      width: 64,
      height: 48,
      caption: 'The calipers',
      isPublished: false,
      can: { remove: true },
    })
    expect(response.headers.location).toBe(evidence.url)
    const whole = await readBytes(app, evidence.url, app.member)
    expect(
      createHash('sha256')
        .update(whole.body as Buffer)
        .digest('hex'),
    ).toBe(
      (
        await app.client.pool.query<{ sha256: string }>('select sha256 from evidence_files where id = $1', [
          evidence.id,
        ])
      ).rows[0]?.sha256,
    )
    const small = await readBytes(app, evidence.thumbnailUrl ?? '', app.member)
    expect((await sharp(small.body as Buffer).metadata()).format).toBe('webp')
    const { rows } = await app.client.pool.query(`select action from audit_events where subject_id = $1`, [evidence.id])
    expect(rows).toEqual([{ action: 'evidence.add' }])
  })

  it('keeps a PDF byte for byte', async () => {
    const { body } = await upload(app, await addProposal(app), createPdf(), 'sheet.pdf').expect(201)
    expect(body).toMatchObject({ kind: 'document', contentType: 'application/pdf', thumbnailUrl: null })
    expect(((await readBytes(app, body.url, app.member)).body as Buffer).equals(createPdf())).toBe(true)
  })

  it('draws a photo anew: upright, and without the place and the person that the camera wrote into it', async () => {
    const photo = await createGpsJpeg()
    expect((await sharp(photo).metadata()).exif).toBeDefined()
    const { body } = await upload(app, await addProposal(app), photo).expect(201)
    expect(body).toMatchObject({ width: 40, height: 80 })
    const kept = (await readBytes(app, body.url, app.member)).body as Buffer
    const { exif, xmp, iptc, orientation, width } = await sharp(kept).metadata()
    expect({ exif, xmp, iptc, width }).toEqual({ exif: undefined, xmp: undefined, iptc: undefined, width: 40 })
    expect(orientation ?? 1).toBe(1)
    expect(kept.includes('Somebody Invented')).toBe(false)
    expect(kept.includes('Exif')).toBe(false)
  })

  it.each(['../../../etc/passwd.jpg', 'a%00b.jpg', `${'x'.repeat(300)}.jpg`, '..\\..\\a.jpg', 'nothing'])(
    'gives a file a name of its own instead of %j',
    async (name) => {
      const { body } = await upload(app, await addProposal(app), await createJpeg(), name).expect(201)
      expect(await app.files.listKeys()).toContain(`evidence/${body.id}`)
      const { headers } = await readBytes(app, body.url, app.member)
      expect(headers['content-disposition']).toBe(`inline; filename="evidence-${body.id}.jpeg"`)
    },
  )

  it('cannot read a form whose file is named with a NUL', async () => {
    await upload(app, await addProposal(app), await createJpeg(), 'a\0b.jpg').expect(400)
  })

  it('keeps the same file sent twice once, also at the same time', async () => {
    const id = await addProposal(app)
    const photo = await createJpeg(70, 70)
    const before = (await app.files.listKeys()).length
    const answers = await Promise.all([1, 2, 3].map(() => upload(app, id, photo).expect(201)))
    expect(new Set(answers.map(({ body }) => String(body.id))).size).toBe(1)
    expect((await app.files.listKeys()).length - before).toBe(2)
  })

  it('refuses visitors, strangers, moderators, and proposals that are decided', async () => {
    const photo = await createJpeg()
    const id = await addProposal(app)
    const before = await countLeft(app)
    await request(app.url).post(`/api/v1/proposals/${id}/evidence`).attach('file', photo, 'a.jpg').expect(401)
    await upload(app, id, photo, 'a.jpg', app.moderator).expect(403)
    await upload(app, '00000000-0000-4000-8000-000000000000', photo).expect(404)
    await upload(app, 'not-an-id', photo).expect(404)
    for (const status of ['approved', 'declined', 'withdrawn'] as const) {
      await upload(app, await addProposal(app, status), photo).expect(409)
    }
    expect(await countLeft(app)).toEqual(before)
  })

  it('names a field that it does not know, and a file that is missing', async () => {
    const id = await addProposal(app)
    const { body } = await upload(app, id, await createJpeg())
      .field('status', 'approved')
      .expect(422)
    expect(body.errors).toEqual([expect.objectContaining({ pointer: expect.stringContaining('status') })])
    const without = await request(app.url)
      .post(`/api/v1/proposals/${id}/evidence`)
      .set(app.member)
      .field('caption', 'a')
      .expect(422)
    expect(without.body.errors[0].pointer).toBe('#/file')
  })

  it('takes a proposal as full when it holds as many files as it may', async () => {
    const id = await addProposal(app)
    await app.client.pool.query(
      `insert into evidence_files (proposal_id, uploader_id, kind, content_type, bytes, sha256, storage_key)
       select $1, author_id, 'photo', 'image/png', 1, 'x', 'full/' || n from proposals, generate_series(1, $2) n where proposals.id = $1`,
      [id, evidenceLimits.perProposal],
    )
    await upload(app, id, await createJpeg()).expect(409)
    await app.client.pool.query(`delete from evidence_files where storage_key like 'full/%'`)
  })
})
