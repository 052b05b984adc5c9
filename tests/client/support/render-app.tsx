import { configure, render } from '@testing-library/react'
import { createMemoryRouter, RouterProvider } from 'react-router-dom'
import { vi } from 'vitest'
import { fit, fitCheck } from '#shared/engine/fit'
import type { Piece } from '#shared/engine/types'
import { isKindKey } from '#shared/kinds/index'
import { Providers } from '../../../src/app/providers'
import { createRoutes } from '../../../src/app/router'
// Imported here, so that no test waits for a page to be compiled when its route first asks for it.
import '../../../src/app/routes/find'
import { toEngineSetup } from '../../../src/components/setup/to-engine-setup'
import { createApiClient, type ApiInit } from '../../../src/lib/api-client'
import type { App } from '../../../src/lib/app-context'
import { createPreferenceStore, type Preferences } from '../../../src/lib/preferences'
import { createQueryClient } from '../../../src/lib/query-client'

// Many tests share few processors.
configure({ asyncUtilTimeout: 15_000 })
vi.setConfig({ testTimeout: 180_000 })

class StillObserver implements ResizeObserver {
  observe(): void {}
  unobserve(): void {}
  disconnect(): void {}
}

const number = (value: number) => ({ value, source: 'measured' as const })
const word = (value: unknown) => ({ value, source: 'maker' as const })

/** Invented heaters: one for a 12 in chamber and a cool room, one far too long, one of unknown length. */
export const inventedHeaters: readonly Piece[] = [
  { slug: 'invented-short-100', model: 'Short 100', lengthMm: 250, powerW: 100 },
  { slug: 'invented-long-100', model: 'Long 100', lengthMm: 520, powerW: 100 },
  { slug: 'invented-unmeasured-100', model: 'Unmeasured 100', lengthMm: undefined, powerW: 100 },
].map(({ slug, model, lengthMm, powerW }) => ({
  kind: 'heater',
  gear: { slug, brand: 'Invented', model },
  specs: {
    form: word('glass-rod'),
    ...(lengthMm !== undefined && { lengthMm: number(lengthMm) }),
    diameterMm: number(24),
    powerW: number(powerW),
    thermostat: word('built-in'),
    orientation: word('vertical'),
    volts: word([120]),
    plugType: word('A/B'),
    plugs: number(1),
  },
}))

export interface Call {
  readonly path: string
  readonly body: { readonly setup: Record<string, never>; readonly verdict?: string; readonly kind?: string }
}

const json = (status: number, body: unknown) =>
  new Response(JSON.stringify(body), { status, headers: { 'Content-Type': 'application/json' } })

/** Answers as the server does, from the engine itself and a catalogue of three. */
export function createFakeServer(pieces: readonly Piece[] = inventedHeaters) {
  const calls: Call[] = []
  let isAway = false
  const answer = (path: string, init: ApiInit = {}): Response => {
    if (isAway)
      return json(503, { type: 't', title: 'Away', status: 503, detail: 'Away.', instance: path, requestId: 'r' })
    const body = JSON.parse(init.body ?? '{}') as Call['body'] & { piece?: { gear: string } }
    calls.push({ path, body })
    const setup = toEngineSetup(body.setup as never)
    if (path === '/api/v1/fit' && body.kind && isKindKey(body.kind)) {
      const candidates = pieces.filter(({ kind }) => kind === body.kind)
      const options = { limit: 10, offset: 0, scales: true, ...(body.verdict && { verdict: body.verdict as never }) }
      return json(200, { ...fit(setup, body.kind, candidates, options), next: null })
    }
    const piece = pieces.find(({ gear }) => gear?.slug === body.piece?.gear)
    if (path === '/api/v1/fit/check' && piece) return json(200, fitCheck(setup, piece))
    return json(404, { type: 't', title: 'Not here', status: 404, detail: 'Not here.', instance: path, requestId: 'r' })
  }
  return {
    calls,
    setAway: (away: boolean) => {
      isAway = away
    },
    fetch: (path: string, init?: ApiInit) => Promise.resolve(answer(path, init)),
  }
}

export type FakeServer = ReturnType<typeof createFakeServer>

/** The whole application at an address, its HTTP answered by a fake server. */
export function renderApp(address: string, server: Pick<FakeServer, 'fetch'>, preferences: Partial<Preferences> = {}) {
  vi.stubGlobal('ResizeObserver', StillObserver)
  vi.stubGlobal('scrollTo', () => undefined)
  const app: App = {
    api: createApiClient(server.fetch),
    queryClient: createQueryClient(),
    preferences: createPreferenceStore({ system: 'us', theme: 'system', ...preferences }),
    isServer: false,
  }
  const router = createMemoryRouter(createRoutes(app), { initialEntries: [address] })
  const view = render(
    <Providers app={app}>
      <RouterProvider router={router} />
    </Providers>,
  )
  return { ...view, router, app, address: () => `${router.state.location.pathname}${router.state.location.search}` }
}
