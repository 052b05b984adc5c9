import { dehydrate } from '@tanstack/react-query'
import { renderToPipeableStream } from 'react-dom/server'
import { createStaticHandler, createStaticRouter, StaticRouterProvider } from 'react-router-dom'
import { findHead } from './app/find-head'
import { writeErrors, type PageState } from './app/page-state'
import { Providers } from './app/providers'
import { createRoutes } from './app/router'
import { createApiClient, type ApiFetch } from './lib/api-client'
import type { App } from './lib/app-context'
import { writeHead } from './lib/head'
import { createPreferenceStore, readPreferences } from './lib/preferences'
import { createQueryClient } from './lib/query-client'

export interface Visit {
  /** Path and query. */
  readonly url: string
  readonly cookie: string | undefined
  readonly nonce: string
  readonly fetch: ApiFetch
}

type Stream = ReturnType<typeof renderToPipeableStream>

export interface Rendered {
  readonly status: number
  readonly redirect?: string
  readonly head: string
  readonly state: string
  readonly htmlAttributes?: string
  pipe(writable: Parameters<Stream['pipe']>[0]): void
}

/** The router wants whole addresses; the pages never look at the origin. */
const anyOrigin = 'http://stillfits.invalid'

function redirectTo(status: number, location: string): Rendered {
  return { status, redirect: location.replace(anyOrigin, ''), head: '', state: '', pipe: () => undefined }
}

/** Runs the loaders and renders the page that they filled. Its data is all there before the first byte is sent. */
export async function render({ url, cookie, nonce, fetch }: Visit): Promise<Rendered> {
  const preferences = readPreferences(cookie)
  const queryClient = createQueryClient()
  const app: App = {
    api: createApiClient(fetch),
    queryClient,
    preferences: createPreferenceStore(preferences),
    isServer: true,
  }
  const handler = createStaticHandler(createRoutes(app))
  const pageUrl = new URL(url, anyOrigin)
  const context = await handler.query(new Request(pageUrl))
  if (context instanceof Response) return redirectTo(context.status, context.headers.get('Location') ?? '/')

  const state: PageState = {
    preferences,
    queries: dehydrate(queryClient),
    loaderData: context.loaderData,
    errors: writeErrors(context.errors),
  }
  const router = createStaticRouter(handler.dataRoutes, context)
  const stream = await new Promise<Stream>((resolve, reject) => {
    const started = renderToPipeableStream(
      <Providers app={app}>
        <StaticRouterProvider router={router} context={context} hydrate={false} />
      </Providers>,
      // Nothing is sent before all is ready, so nothing need be sent apart and put in place by a script.
      { nonce, progressiveChunkSize: Infinity, onAllReady: () => resolve(started), onShellError: reject },
    )
  })
  const head = findHead(app, context, pageUrl)
  const { theme } = preferences
  queryClient.clear()
  return {
    status: context.statusCode,
    head: writeHead(head),
    state: JSON.stringify(state),
    ...(theme !== 'system' && { htmlAttributes: `data-theme="${theme}"` }),
    pipe: (writable) => void stream.pipe(writable),
  }
}
