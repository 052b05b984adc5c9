import { data, redirect } from 'react-router-dom'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import type { App } from '../../lib/app-context'
import { requireData } from '../../lib/loading'
import { readSwapVisit } from './read-swap-visit'
import { isUnanswered, replacementsQuery } from './replacements-query'

export async function loadSwap(app: App, url: URL, itemId: string): Promise<unknown> {
  const visit = readSwapVisit(url.searchParams, itemId, app.preferences.get().system)
  if (visit.redirect !== undefined) return redirect(visit.redirect)
  const slug = visit.visit.raw['tank.gear']
  const [answer] = await Promise.all([
    requireData(app, replacementsQuery(app.api, visit.request)),
    slug === undefined ? null : app.queryClient.prefetchQuery(gearEntryQuery(app.api, slug)),
  ])
  return isUnanswered(answer) ? data(null, { status: 422 }) : null
}
