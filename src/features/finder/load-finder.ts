import { data, redirect } from 'react-router-dom'
import type { UnitSystem } from '#shared/units/systems'
import type { App } from '../../lib/app-context'
import { throwFailure } from '../../lib/loading'
import { readingQuery } from './api/ask'
import { fitCheckQuery } from './api/fit-check'
import { isRefused } from '../../lib/problem'
import { answersQuery, canAsk } from './api/requests'
import { gearEntryQuery } from '../../components/setup/gear-entry'
import { writeFinderState } from './link/finder-state'
import { readTypedQuestion, readVisit, type Visit } from './link/read-visit'
import { toWishes } from './link/wishes'

/** Starts everything that the page shows. */
function startQueries({ api, queryClient, preferences }: App, visit: Visit): Promise<unknown>[] {
  const { state, setup } = visit
  const slug = state.raw['tank.gear']
  const tank = slug === undefined ? [] : [queryClient.prefetchQuery(gearEntryQuery(api, slug))]
  const { system } = preferences.get()
  const reading = state.asked === '' ? [] : [queryClient.prefetchQuery(readingQuery(api, state.asked, system))]
  if (!canAsk(visit)) return [...tank, ...reading]
  const verdicts = ['changes', ...(state.opened ? [state.opened.verdict] : [])] as const
  return [
    ...tank,
    ...reading,
    queryClient.fetchInfiniteQuery(answersQuery(api, visit, 'fits')),
    ...verdicts.map((verdict) => queryClient.fetchInfiniteQuery(answersQuery(api, visit, verdict))),
    ...(state.picked === null ? [] : [queryClient.fetchQuery(fitCheckQuery(api, setup, state.picked))]),
  ]
}

function wasRefused({ api, queryClient }: App, visit: Visit): boolean {
  const first = queryClient.getQueryData(answersQuery(api, visit, 'fits').queryKey)?.pages[0]
  return first !== undefined && isRefused(first)
}

/** The address that a question leads to. A piece that it names is lit, which takes the catalogue to tell. */
async function followQuestion({ api, queryClient }: App, question: string, visit: Visit, system: UnitSystem) {
  const { redirect: address } = visit
  const read = await queryClient.fetchQuery(readingQuery(api, question, system)).catch(() => null)
  if (!read?.gear) return address
  const { slug } = read.gear
  const kind = read.kind ?? visit.state.kind
  return writeFinderState({ ...visit.state, kind, wishes: toWishes(read.filters), picked: slug }, system)
}

/** On the server the answers are waited for; in a browser the drawing changes at once and the answers follow. */
export async function loadFinder(app: App, url: URL, path: string): Promise<unknown> {
  const { system } = app.preferences.get()
  const visit = readVisit(url.searchParams, system)
  if (visit.redirect !== undefined) {
    const question = readTypedQuestion(url.searchParams)
    const address = question === '' ? visit.redirect : await followQuestion(app, question, visit, system)
    return redirect(`${path}?${address}`)
  }
  const started = startQueries(app, visit)
  if (!app.isServer) {
    // The page itself says what went wrong, beside what it could show.
    void Promise.allSettled(started)
    return null
  }
  await Promise.all(started).catch(throwFailure)
  return wasRefused(app, visit) || visit.problems.length > 0 ? data(null, { status: 422 }) : null
}
