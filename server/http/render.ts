import { existsSync, readFileSync } from 'node:fs'
import { join } from 'node:path'
import { PassThrough, type Writable } from 'node:stream'
import { pipeline } from 'node:stream/promises'
import { pathToFileURL } from 'node:url'
import express, { Router, type Express, type Request, type RequestHandler, type Response } from 'express'
import { createErrorPage, type ErrorPage } from './error-page'
import { createPageFetch, type PageFetch } from './page-fetch'
import { createRateLimit } from './rate-limits'
import { refuseMethod } from './methods'
import { getNonce } from './security-headers'

/** What the built client is told of a visit. */
export interface PageRequest {
  /** Path and query. */
  readonly url: string
  readonly cookie: string | undefined
  /** For every script and style element. */
  readonly nonce: string
  /** Calls this very application with the visitor's cookie; takes paths such as `/api/v1/kinds`. */
  readonly fetch: PageFetch
}

/** What the built client's `render` resolves to, once the data for the page is there. */
export interface RenderedPage {
  readonly status: number
  /** Send the visitor there instead, with `status` if that is a redirect, else 302; nothing else is read then. */
  readonly redirect?: string
  /** HTML for the head: title, metadata, links. */
  readonly head: string
  /** JSON that the client starts from; reaches it as the text of `<script type="application/json" id="state">`. */
  readonly state: string
  /** Attributes for the html element, such as `data-theme="dark"`. */
  readonly htmlAttributes?: string
  /** Streams the HTML of the page and ends. */
  pipe(writable: Writable): void
}

export type Render = (request: PageRequest) => Promise<RenderedPage>

/** The built client: its server-side entry, its files, and the page that surrounds what it renders. */
export interface Pages {
  readonly render: Render
  readonly template: string
  readonly clientFolder: string
  readonly errorPage: ErrorPage
}

/** Loads what the build left in `distFolder` (`client/`, `ssr/`); null where there is no build. */
export async function loadPages(distFolder: string): Promise<Pages | null> {
  const clientFolder = join(distFolder, 'client')
  const entry = join(distFolder, 'ssr', 'entry-server.js')
  if (!existsSync(entry) || !existsSync(join(clientFolder, 'index.html'))) return null
  const { render } = (await import(/* @vite-ignore */ pathToFileURL(entry).href)) as { render: Render }
  const errorFile = join(clientFolder, 'error.html')
  return {
    render,
    template: readFileSync(join(clientFolder, 'index.html'), 'utf8'),
    clientFolder,
    errorPage: createErrorPage(existsSync(errorFile) ? readFileSync(errorFile, 'utf8') : undefined),
  }
}

function escapeForScript(json: string): string {
  return json
    .replace(/</g, '\\u003c')
    .replace(/\u2028/g, '\\u2028')
    .replace(/\u2029/g, '\\u2029')
}

interface Frame {
  readonly before: string
  readonly after: string
}

/** The page around the app, with this response's nonce on every script and style. Filled by function, so that no `$` is special. */
function fillTemplate(template: string, { head, state, htmlAttributes = '' }: RenderedPage, nonce: string): Frame {
  const withNonces = template.replace(/<(script|style)(?=[\s>])/g, (tag) => `${tag} nonce="${nonce}"`)
  const stateScript = `<script type="application/json" id="state">${escapeForScript(state)}</script>`
  const [before = '', after = ''] = withNonces.split('<!--app-->')
  return {
    before: before
      .replace('<html', () => `<html${htmlAttributes === '' ? '' : ` ${htmlAttributes}`}`)
      .replace('<!--head-->', () => head),
    after: after.replace('<!--state-->', () => stateScript),
  }
}

function isRedirect(status: number): boolean {
  return status >= 300 && status < 400
}

async function sendPage(res: Response, pages: Pages, page: RenderedPage): Promise<void> {
  const { before, after } = fillTemplate(pages.template, page, getNonce(res))
  res.status(page.status).type('html')
  if (page.status === 503) res.set('Retry-After', '5')
  res.write(before)
  const stream = new PassThrough()
  page.pipe(stream)
  await pipeline(stream, res, { end: false })
  res.end(after)
}

/** Pages of which nothing is to stay on the machine: whose they are, or what signs somebody in, stands on them. */
const leavesNoCopy = /^\/(account|admin|confirm|mailroom|proposals|reset|review|unsubscribe)(\/|$)/

function createPageHandler(app: Express, pages: Pages): RequestHandler {
  return async (req: Request, res: Response) => {
    const caching = leavesNoCopy.test(req.path) ? 'private, no-store' : 'private, no-cache'
    res.set({ 'Cache-Control': caching, Vary: 'Cookie' })
    const page = await pages.render({
      url: req.originalUrl,
      cookie: req.headers.cookie,
      nonce: getNonce(res),
      fetch: createPageFetch(app, req),
    })
    if (page.redirect !== undefined) res.redirect(isRedirect(page.status) ? page.status : 302, page.redirect)
    else if (req.method === 'HEAD') res.status(page.status).type('html').end()
    else await sendPage(res, pages, page)
  }
}

/** Files of the build, then pages. Names under `assets/` hold a hash of the content, so they never change. */
export function createPageRoutes(app: Express, pages: Pages, perMinute: number): Router {
  const router = Router()
  const files = { index: false, redirect: false, dotfiles: 'ignore' } as const
  router.use(
    '/assets',
    express.static(join(pages.clientFolder, 'assets'), { ...files, immutable: true, maxAge: '1y', fallthrough: false }),
  )
  const serveFile = express.static(pages.clientFolder, { ...files, maxAge: '1h' })
  // The templates lie among the files, and are no pages by themselves.
  router.use((req, res, next) => (req.path.endsWith('.html') ? next() : serveFile(req, res, next)))
  router.get('/{*path}', createRateLimit('pages', perMinute), createPageHandler(app, pages))
  router.all('/{*path}', refuseMethod(['GET', 'HEAD', 'OPTIONS']))
  return router
}
