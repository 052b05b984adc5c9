import { data } from 'react-router-dom'
import type { EnsureQueryDataOptions, QueryKey } from '@tanstack/react-query'
import type { App } from './app-context'
import { toApiError } from './problem'

/** Throws an answer of the API on to the error page, in a form that server rendering can write down. */
export function throwFailure(error: unknown): never {
  const { status, title, message, requestId } = toApiError(error)
  // A Response of the router's own kind, not an Error: it keeps status and words through server rendering.
  // eslint-disable-next-line @typescript-eslint/only-throw-error
  throw data({ title, detail: message, ...(requestId && { requestId }) }, { status: status === 0 ? 503 : status })
}

/** Waits for what the page cannot be without. */
export async function requireData<T, Key extends QueryKey>(
  app: App,
  options: EnsureQueryDataOptions<T, Error, T, Key>,
): Promise<T> {
  try {
    return await app.queryClient.ensureQueryData(options)
  } catch (error) {
    return throwFailure(error)
  }
}

/** For a page that shows by itself that it is loading: waits on the server alone, and never shows what was fetched earlier. */
export async function loadFresh<T, Key extends QueryKey>(
  app: App,
  options: EnsureQueryDataOptions<T, Error, T, Key>,
): Promise<void> {
  if (app.isServer) await requireFresh(app, options)
  else void app.queryClient.prefetchQuery({ ...options, staleTime: 0 })
}

/** As `requireData`, never from what was fetched earlier: for forms, which change things from there. */
export async function requireFresh<T, Key extends QueryKey>(
  app: App,
  options: EnsureQueryDataOptions<T, Error, T, Key>,
): Promise<T> {
  try {
    return await app.queryClient.fetchQuery({ ...options, staleTime: 0 })
  } catch (error) {
    return throwFailure(error)
  }
}
