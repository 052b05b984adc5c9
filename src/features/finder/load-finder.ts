import { data, redirect } from 'react-router-dom'
import type { App } from '../../lib/app-context'
import { throwFailure } from '../../lib/loading'
import { fitCheckQuery } from './api/fit-check'
import { isRefusal } from './api/fit'
import { answersQuery, canAsk } from './api/requests'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import { readVisit, type Visit } from './link/read-visit'

/** Starts everything that the page shows. */
function startQueries({ api, queryClient }: App, visit: Visit): Promise<unknown>[] {
  const { state, setup } = visit
  const slug = state.raw['tank.gear']
  const tank = slug === undefined ? [] : [queryClient.prefetchQuery(gearEntryQuery(api, slug))]
  if (!canAsk(visit)) return tank
  const verdicts = ['changes', ...(state.opened ? [state.opened.verdict] : [])] as const
  return [
    ...tank,
    queryClient.fetchInfiniteQuery(answersQuery(api, visit, 'fits')),
    ...verdicts.map((verdict) => queryClient.fetchInfiniteQuery(answersQuery(api, visit, verdict))),
    ...(state.picked === null ? [] : [queryClient.fetchQuery(fitCheckQuery(api, setup, state.picked))]),
  ]
}

function isRefused({ api, queryClient }: App, visit: Visit): boolean {
  const first = queryClient.getQueryData(answersQuery(api, visit, 'fits').queryKey)?.pages[0]
  return first !== undefined && isRefusal(first)
}

/** On the server the answers are waited for; in a browser the drawing changes at once and the answers follow. */
export async function loadFinder(app: App, url: URL, path: string): Promise<unknown> {
  const visit = readVisit(url.searchParams, app.preferences.get().system)
  if (visit.redirect !== undefined) return redirect(`${path}?${visit.redirect}`)
  const started = startQueries(app, visit)
  if (!app.isServer) {
    // The page itself says what went wrong, beside what it could show.
    void Promise.allSettled(started)
    return null
  }
  await Promise.all(started).catch(throwFailure)
  return isRefused(app, visit) || visit.problems.length > 0 ? data(null, { status: 422 }) : null
}
