import { data, redirect } from 'react-router-dom'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import type { App } from '../../lib/app-context'
import { requireData } from '../../lib/loading'
import { readSwapVisit } from './read-swap-visit'
import { isRefused } from '../../lib/problem'
import { replacementsQuery } from './replacements-query'

export async function loadSwap(app: App, url: URL, itemId: string): Promise<unknown> {
  const visit = readSwapVisit(url.searchParams, itemId, app.preferences.get().system)
  if (visit.redirect !== undefined) return redirect(visit.redirect)
  const slug = visit.visit.raw['tank.gear']
  const asked = replacementsQuery(app.api, visit.request)
  const tank = slug === undefined ? null : app.queryClient.prefetchQuery(gearEntryQuery(app.api, slug))
  if (!app.isServer) {
    // The page itself says what went wrong, and keeps the setup in sight.
    await Promise.all([app.queryClient.prefetchQuery(asked), tank])
    return null
  }
  const [answer] = await Promise.all([requireData(app, asked), tank])
  return isRefused(answer) ? data(null, { status: 422 }) : null
}
