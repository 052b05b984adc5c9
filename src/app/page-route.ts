import type { ComponentType } from 'react'
import type { LoaderFunctionArgs, RouteObject } from 'react-router-dom'
import type { App } from '../lib/app-context'
import type { Head } from '../lib/head'

export interface HeadInput {
  readonly app: App
  readonly url: URL
  readonly params: Readonly<Record<string, string | undefined>>
}

/** What a page's module exports. */
export interface Page {
  readonly Component: ComponentType
  /** Prefetches what the page shows, or redirects. */
  readonly load?: (app: App, args: LoaderFunctionArgs) => unknown
  readonly head: (input: HeadInput) => Head
}

export interface PageHandle {
  readonly head: Page['head']
}

/** The page as a route fetches it, when it is first visited. */
export function createLazy(app: App, load: () => Promise<{ readonly page: Page }>): NonNullable<RouteObject['lazy']> {
  return async () => {
    const { page } = await load()
    const loader = page.load
    return {
      Component: page.Component,
      handle: { head: page.head } satisfies PageHandle,
      loader: async (args: LoaderFunctionArgs) => (await loader?.(app, args)) ?? null,
    }
  }
}
