import './styles/app.css'
import { useLayoutEffect, type ReactNode } from 'react'
import { hydrate } from '@tanstack/react-query'
import { createRoot, hydrateRoot } from 'react-dom/client'
import { createBrowserRouter, matchRoutes, RouterProvider, type RouteObject } from 'react-router-dom'
import { findHead } from './app/find-head'
import { readHydration, type PageState } from './app/page-state'
import { Providers } from './app/providers'
import { createRoutes } from './app/router'
import { createApiClient } from './lib/api-client'
import type { App } from './lib/app-context'
import { applyHead } from './lib/head'
import { createPreferenceStore, readPreferences } from './lib/preferences'
import { createQueryClient } from './lib/query-client'
import { noticeEarlyInput } from './lib/early-input'

/** Absent where the page was served without being rendered, as while developing. */
function readState(): PageState | null {
  const text = document.getElementById('state')?.textContent
  return text ? (JSON.parse(text) as PageState) : null
}

/** The first page must be at hand before it hydrates, or it would be thrown away and rendered again. */
async function loadMatched(routes: RouteObject[]): Promise<void> {
  const matches = matchRoutes(routes, location) ?? []
  for (const { route } of matches) {
    if (typeof route.lazy !== 'function') continue
    Object.assign(route, await route.lazy(), { lazy: undefined })
  }
}

/** What was typed while the scripts were on their way counts as if it were typed now; from then on the page says that it listens. */
function EarlyInput({ children }: { readonly children: ReactNode }) {
  useLayoutEffect(() => {
    const replay = noticeEarlyInput(document)
    // Not within the effect: React would set the fields back before it heard of what they hold.
    const timer = setTimeout(() => {
      replay()
      document.documentElement.dataset.live = 'yes'
    })
    return () => clearTimeout(timer)
  }, [])
  return children
}

async function start(root: HTMLElement): Promise<void> {
  const state = readState()
  const queryClient = createQueryClient()
  if (state) hydrate(queryClient, state.queries)
  const app: App = {
    api: createApiClient((path, init) => fetch(path, init)),
    queryClient,
    preferences: createPreferenceStore(state?.preferences ?? readPreferences(document.cookie)),
    isServer: false,
  }
  const routes = createRoutes(app)
  await loadMatched(routes)
  const router = createBrowserRouter(routes, state ? { hydrationData: readHydration(state) } : {})
  let shown = router.state.location.key
  router.subscribe((next) => {
    if (next.navigation.state !== 'idle' || next.location.key === shown) return
    shown = next.location.key
    applyHead(findHead(app, next, new URL(next.location.pathname + next.location.search, location.origin)))
  })
  const page = (
    <Providers app={app}>
      <RouterProvider router={router} />
    </Providers>
  )
  if (state) hydrateRoot(root, <EarlyInput>{page}</EarlyInput>)
  else createRoot(root).render(page)
}

const root = document.getElementById('root')
if (root) void start(root)
