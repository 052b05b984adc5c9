import { readdirSync } from 'node:fs'
import { connect } from 'node:net'
import { tmpdir } from 'node:os'
import request from 'supertest'
import sharp from 'sharp'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { createJpeg, createPdf, createPng } from './files'
import { addProposal, countLeft, startEvidenceApp, upload, type EvidenceApp } from './records'

let app: EvidenceApp
let proposalId: string

beforeAll(async () => {
  app = await startEvidenceApp()
  proposalId = await addProposal(app)
})

afterAll(async () => {
  // Whatever was refused here left no row, no object and no event.
  expect(await countLeft(app)).toEqual({ rows: 0, objects: 0, events: 0 })
  await app.stop()
})

const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg"><script>alert(1)</script></svg>')
const html = Buffer.from('<!doctype html><script>alert(1)</script>')

describe('evidence that is not what it says', () => {
  it.each([
    ['an SVG named .jpg', () => svg, 'photo.jpg'],
    ['an SVG', () => svg, 'drawing.svg'],
    ['a page named .jpg', () => html, 'photo.jpg'],
    ['a page that begins as a GIF', () => Buffer.concat([Buffer.from('GIF89a'), html]), 'photo.gif'],
    ['a page that begins as a JPEG', () => Buffer.concat([Buffer.from([0xff, 0xd8, 0xff, 0xe0]), html]), 'photo.jpg'],
    ['a photo with a page behind it', async () => Buffer.concat([await createJpeg(), html]), 'photo.jpg'],
    ['a photo with a page behind it, as PNG', async () => Buffer.concat([await createPng(), html]), 'photo.png'],
    [
      'a photo with a program behind it',
      async () => Buffer.concat([await createJpeg(), Buffer.from('<?php echo 1;')]),
      'a.jpg',
    ],
    ['a PDF with a page in its head', () => createPdf('%<html><script>alert(1)</script>\n'), 'sheet.pdf'],
    ['a PDF with an archive behind it', () => Buffer.concat([createPdf(), Buffer.from('PK\x03\x04')]), 'sheet.pdf'],
    ['a JPEG named .png', createJpeg, 'photo.png'],
    ['a JPEG named .html', createJpeg, 'photo.html'],
    ['a JPEG with two endings', createJpeg, 'photo.php.jpg'],
    ['a JPEG with two endings of pictures', createJpeg, 'photo.svg.jpg'],
    ['text', () => Buffer.from('just words'), 'photo.jpg'],
  ])('is refused by its content: %s', async (_, create, name) => {
    const { body } = await upload(app, proposalId, await create(), name).expect(415)
    expect(body.detail).toMatch(/JPEG, PNG or WebP/)
  })

  it('is refused when it begins as a picture and is none', async () => {
    const cut = (await createPng(200, 200)).subarray(0, 60)
    const { body } = await upload(app, proposalId, cut, 'photo.png').expect(422)
    expect(body.errors[0]).toEqual({ pointer: '#/file', detail: 'cannot be read as a picture' })
  })

  it('is refused when it is sent as anything but a form', async () => {
    const post = request(app.url).post(`/api/v1/proposals/${proposalId}/evidence`).set(app.member)
    await post
      .set('Content-Type', 'image/jpeg')
      .send(await createJpeg())
      .expect(415)
  })
})

describe('evidence that is too large', () => {
  it('is refused by its megapixels before it is decoded', async () => {
    const bomb = await sharp({ create: { width: 14_000, height: 14_000, channels: 3, background: '#fff' } })
      .png({ compressionLevel: 9 })
      .toBuffer()
    expect(bomb.length).toBeLessThan(2_000_000)
    const before = process.memoryUsage().rss
    const { body } = await upload(app, proposalId, bomb, 'bomb.png').expect(422)
    expect(body.errors[0].detail).toMatch(/196 megapixels; 50 are the most/)
    // Decoded it would take 588 MB.
    expect(process.memoryUsage().rss - before).toBeLessThan(150_000_000)
  })

  it('is refused by what the request says of its size, and by what it turns out to be', async () => {
    const large = Buffer.alloc(27 * 1024 * 1024)
    const { body } = await upload(app, proposalId, large).expect(413)
    expect(body.detail).toMatch(/25 MB/)
    const form = new FormData()
    form.append('file', new Blob([large]), 'photo.jpg')
    const { body: stream, headers } = new Response(form)
    const path = `${app.url}/api/v1/proposals/${proposalId}/evidence`
    const sent = { method: 'POST', body: stream, duplex: 'half' } as RequestInit
    const type = headers.get('content-type') ?? ''
    const response = await fetch(path, { ...sent, headers: { ...app.member, 'Content-Type': type } })
    expect(response.status).toBe(413)
  })

  it('is refused when the form holds ten thousand parts', async () => {
    const form = new FormData()
    for (let part = 0; part < 10_000; part++) form.append(`field${part}`, 'x')
    const path = `${app.url}/api/v1/proposals/${proposalId}/evidence`
    expect((await fetch(path, { method: 'POST', body: form, headers: app.member })).status).toBe(413)
  })

  it('is refused when there are two files', async () => {
    const photo = await createJpeg()
    const response = await upload(app, proposalId, photo).attach('file', photo, 'second.jpg')
    expect(response.status).toBe(413)
  })
})

describe('an upload that is cut short', () => {
  it('leaves no row, no object and no temporary file', async () => {
    const before = readdirSync(tmpdir()).length
    const { hostname, port } = new URL(app.url)
    const socket = connect(Number(port), hostname)
    socket.on('error', () => undefined)
    const head = [
      `POST /api/v1/proposals/${proposalId}/evidence HTTP/1.1`,
      `Host: ${hostname}:${port}`,
      `Cookie: ${app.member.Cookie}`,
      'Sec-Fetch-Site: same-origin',
      'Content-Type: multipart/form-data; boundary=cut',
      'Content-Length: 1000000',
      '',
      '--cut\r\nContent-Disposition: form-data; name="file"; filename="photo.jpg"\r\n\r\n',
    ].join('\r\n')
    socket.write(head)
    socket.write((await createJpeg()).subarray(0, 200))
    await new Promise((resolve) => setTimeout(resolve, 300))
    socket.destroy()
    await new Promise((resolve) => setTimeout(resolve, 500))
    expect(await countLeft(app)).toEqual({ rows: 0, objects: 0, events: 0 })
    expect(readdirSync(tmpdir()).length).toBeLessThanOrEqual(before + 5)
    await request(app.url).get('/health').expect(200)
  })

  it('is told in words when the form ends early', async () => {
    const response = await request(app.url)
      .post(`/api/v1/proposals/${proposalId}/evidence`)
      .set(app.member)
      .set('Content-Type', 'multipart/form-data; boundary=cut')
      .send('--cut\r\nContent-Disposition: form-data; name="file"; filename="a.jpg"\r\n\r\nabc')
      .expect(400)
    expect(response.body.detail).toMatch(/broke off/)
  })
})

describe('evidence while the object store is away', () => {
  it('is refused with a 503 that keeps nothing, and taken when the store is back', async () => {
    const other = await startEvidenceApp()
    const id = await addProposal(other)
    const photo = await createJpeg()
    await other.files.pause()
    const { body, headers } = await upload(other, id, photo).expect(503)
    expect(headers['retry-after']).toBeDefined()
    expect(body.detail).toMatch(/cannot be reached/)
    await other.files.resume()
    expect(await countLeft(other)).toEqual({ rows: 0, objects: 0, events: 0 })
    await upload(other, id, photo).expect(201)
    await other.stop()
  })
})
