import { data, redirect } from 'react-router-dom'
import { readSetupVisit } from '../../components/setup/read-setup-visit'
import { reportQuery } from '../../components/setup/report-query'
import { isRefused } from '../../lib/problem'
import { writeSetupHref } from '../../components/setup/setup-href'
import { paths } from '../../config/paths'
import type { App } from '../../lib/app-context'
import { requireData } from '../../lib/loading'
import { canReport } from './hooks/use-setup-report'
import { readFormVisit, writeFormHref } from './link/read-form-visit'
import { startNames } from './load-form'

const isFormOnly = ['typed', 'kind', 'find', 'findTank', 'chambers']

/** Fetches the report; a form that is sent with something still to look up goes back to look it up. */
export async function loadReport(app: App, url: URL): Promise<unknown> {
  const { system } = app.preferences.get()
  const form = readFormVisit(url.searchParams, system)
  const { find, findTank, chambers } = form
  const visit = readSetupVisit(url.searchParams, system)
  if (find !== '' || findTank !== '')
    return redirect(
      writeFormHref(visit.raw, system, {
        chambers,
        ...(find && { find, at: 'find-found' }),
        ...(findTank && { findTank, at: 'findTank-found' }),
      }),
    )
  if (!visit.isCanonical || isFormOnly.some((key) => url.searchParams.has(key)))
    return redirect(writeSetupHref(paths.setup, visit.raw, system, { undo: url.searchParams.get('undo') ?? undefined }))
  const names = startNames(app, { visit })
  if (!canReport(visit)) {
    await names
    return data(null, { status: 422 })
  }
  if (!app.isServer) {
    // The page itself says what went wrong, and keeps the setup in sight.
    await Promise.all([app.queryClient.prefetchQuery(reportQuery(app.api, visit.setup)), names])
    return null
  }
  const [report] = await Promise.all([requireData(app, reportQuery(app.api, visit.setup)), names])
  return isRefused(report) ? data(null, { status: 422 }) : null
}
