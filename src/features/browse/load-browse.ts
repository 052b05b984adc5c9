import { data, redirect } from 'react-router-dom'
import { paths } from '../../config/paths'
import type { App } from '../../lib/app-context'
import { throwFailure } from '../../lib/loading'
import { comparedPieceQuery } from './api/compared-piece'
import { gearPageQuery } from './api/gear-list'
import { readVisit } from './link/read-visit'

/** On the server the list is waited for; in a browser the page changes at once and its rows follow. */
export async function loadBrowse(app: App, url: URL): Promise<unknown> {
  const { api, queryClient, preferences, isServer } = app
  const { state, problems, redirect: address } = readVisit(url.searchParams, preferences.get().system)
  if (address !== undefined) return redirect(address === '' ? paths.gearList : `${paths.gearList}?${address}`)
  const page = queryClient.fetchQuery(gearPageQuery(api, state))
  // A piece that is gone is left out of the comparison; the list is none the worse for it.
  const compared = state.compare.map((slug) => queryClient.prefetchQuery(comparedPieceQuery(api, slug)))
  if (!isServer) {
    // The page itself says what went wrong.
    void Promise.allSettled([page, ...compared])
    return null
  }
  const [{ isRestarted }] = await Promise.all([page, ...compared]).catch(throwFailure)
  return problems.length > 0 || isRestarted ? data(null, { status: 422 }) : null
}
