import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs'
import { tmpdir } from 'node:os'
import { join } from 'node:path'
import request from 'supertest'
import { afterAll, beforeAll, describe, expect, it } from 'vitest'
import { loadPages } from '../../server/http/render'
import { createLogger } from '../../server/lib/logger'
import { startApp, type TestApp } from '../support/app'
import { addHeaters } from './records'

const template = `<!doctype html><html lang="en"><head><!--head--><script type="module" src="/assets/a.js"></script></head>
<body><div id="root"><!--app--></div><!--state--></body></html>`

/** A small client of the same make as the built one: what it renders depends on its address. */
const entry = `
import { Readable } from 'node:stream'
const chunks = (parts) => (writable) => void Readable.from(parts).pipe(writable)
export async function render({ url, cookie, nonce, fetch }) {
  const page = { status: 200, head: '<title>$& page</title>', state: '{}', pipe: chunks(['<p>', 'one', 'two', '</p>']) }
  if (url === '/data') {
    const response = await fetch('/api/v1/gear?q=quillmoor')
    const text = await response.text()
    return { ...page, status: response.status, state: JSON.stringify({ text, close: '</script><script>' }) }
  }
  if (url === '/mirror') {
    const response = await fetch('/api/v1/fit', { method: 'POST', headers: { 'content-type': 'application/json' }, body: '{}' })
    return { ...page, state: JSON.stringify({ cookie, nonce, status: response.status, id: response.headers.get('x-request-id') }) }
  }
  if (url.startsWith('/old')) return { ...page, status: 301, redirect: '/new?a=1' }
  if (url === '/missing') return { ...page, status: 404 }
  if (url === '/broken') throw new Error('secret reason')
  if (url === '/torn') return { ...page, pipe: (writable) => void Readable.from((async function* () { yield '<p>'; throw new Error('torn') })()).on('error', (error) => writable.destroy(error)).pipe(writable) }
  if (url === '/dark') return { ...page, htmlAttributes: 'data-theme="dark"' }
  return page
}`

let app: TestApp
let folder: string
const lines: string[] = []

beforeAll(async () => {
  folder = mkdtempSync(join(tmpdir(), 'pages-'))
  for (const name of ['client/assets', 'ssr']) mkdirSync(join(folder, name), { recursive: true })
  writeFileSync(join(folder, 'package.json'), '{"type":"module"}')
  writeFileSync(join(folder, 'ssr/entry-server.js'), entry)
  writeFileSync(join(folder, 'client/index.html'), template)
  writeFileSync(
    join(folder, 'client/error.html'),
    '<h1><!--title--></h1><p><!--detail--></p><b><!--status--></b><i><!--request-id--></i>',
  )
  writeFileSync(join(folder, 'client/assets/a.js'), 'export {}')
  writeFileSync(join(folder, 'client/favicon.svg'), '<svg xmlns="http://www.w3.org/2000/svg"/>')
  writeFileSync(join(folder, 'client/.secret'), 'hush')
  const logger = createLogger('info', { write: (line) => void lines.push(line) })
  app = await startApp({ app: { pages: await loadPages(folder), logger } })
  await addHeaters(app.client.db)
})

afterAll(async () => {
  await app.stop()
  rmSync(folder, { recursive: true })
})

const get = (path: string) => request(app.url).get(path).set('Accept', 'text/html')

function readState(html: string): Record<string, unknown> {
  const text = /<script type="application\/json" id="state">(.*?)<\/script>/s.exec(html)?.[1] ?? ''
  return JSON.parse(text) as Record<string, unknown>
}

describe('pages', () => {
  it('are rendered into the template, with the nonce of the policy on every script', async () => {
    const { text, headers } = await get('/').expect(200)
    expect(headers['content-type']).toMatch(/^text\/html/)
    expect(headers['cache-control']).toBe('private, no-cache')
    expect(text).toContain('<title>$& page</title>')
    expect(text).toContain('<div id="root"><p>onetwo</p></div>')
    const nonce = /'nonce-([^']+)'/.exec(headers['content-security-policy'] ?? '')?.[1]
    expect(text).toContain(`<script nonce="${nonce}" type="module" src="/assets/a.js">`)
    expect(text.endsWith('</html>')).toBe(true)
  })

  it('get their data from the API in process, and no text of it ends the script', async () => {
    const { text } = await get('/data').expect(200)
    const state = readState(text)
    expect(JSON.parse(String(state.text))).toMatchObject({ total: 3 })
    expect(state.close).toBe('</script><script>')
    expect(text).not.toContain('</script><script>')
  })

  it('pass on the cookie and the request id of the visit', async () => {
    const { text, headers } = await get('/mirror').set('Cookie', 'units=us').expect(200)
    const state = readState(text)
    expect(state).toMatchObject({ cookie: 'units=us', status: 422, id: headers['x-request-id'] })
    expect(headers['content-security-policy']).toContain(String(state.nonce))
  })

  it('redirect, are missing, and set attributes as the client says', async () => {
    expect((await get('/old?x=1').expect(301)).headers.location).toBe('/new?a=1')
    expect((await get('/missing').expect(404)).text).toContain('<p>onetwo</p>')
    expect((await get('/dark')).text).toContain('<html data-theme="dark" lang="en">')
  })

  it('answer HEAD without a body and refuse other methods', async () => {
    const head = await request(app.url).head('/').expect(200)
    expect(head.text).toBeUndefined()
    const post = await request(app.url).post('/find').expect(405)
    expect(post.headers.allow).toBe('GET, HEAD, OPTIONS')
  })

  it('show a page of their own when rendering fails, and log why', async () => {
    const { text, headers } = await get('/broken').expect(500)
    expect(text).toContain('<b>500</b>')
    expect(text).toContain(`<i>${headers['x-request-id']}</i>`)
    expect(text).not.toContain('secret reason')
    expect(lines.some((line) => line.includes('secret reason'))).toBe(true)
  })

  it('break off when rendering breaks halfway, and serve the next visitor', async () => {
    await expect(get('/torn')).rejects.toThrow()
    await get('/').expect(200)
  })
})

describe('files of the build', () => {
  it('never change once named after their content', async () => {
    const { headers } = await request(app.url).get('/assets/a.js').expect(200)
    expect(headers['cache-control']).toBe('public, max-age=31536000, immutable')
    expect(headers['x-content-type-options']).toBe('nosniff')
  })

  it('are kept an hour under a plain name', async () => {
    const { headers } = await request(app.url).get('/favicon.svg').expect(200)
    expect(headers['cache-control']).toBe('public, max-age=3600')
  })

  it.each(['/assets/missing.js', '/assets/', '/assets', '/.secret', '/assets/../../ssr/entry-server.js'])(
    'are not to be had at %s',
    async (path) => {
      const { status, text } = await get(path)
      expect(status === 404 || text.includes('onetwo')).toBe(true)
      expect(text).not.toMatch(/hush|export async/)
    },
  )

  it('do not include the templates', async () => {
    for (const path of ['/index.html', '/error.html']) {
      expect((await get(path)).text).not.toMatch(/<!--(head|app|title)-->/)
    }
  })
})

describe('without a build', () => {
  it('there are no pages to load', async () => {
    expect(await loadPages(join(folder, 'nowhere'))).toBeNull()
  })
})
