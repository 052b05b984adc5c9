import { isRouteErrorResponse, UNSAFE_ErrorResponseImpl as ErrorResponse, type HydrationState } from 'react-router-dom'
import type { DehydratedState } from '@tanstack/react-query'
import type { Preferences } from '../lib/preferences'
import type { FailureData } from './describe-failure'

interface WrittenError {
  readonly status: number
  readonly data: FailureData | null
}

/** What the server rendered from, as the page carries it to the browser. */
export interface PageState {
  readonly preferences: Preferences
  readonly queries: DehydratedState
  readonly loaderData: Record<string, unknown>
  readonly errors: Record<string, WrittenError> | null
}

/** Errors as they may be shown: a status and words, never a stack. */
export function writeErrors(errors: Record<string, unknown> | null): PageState['errors'] {
  if (!errors) return null
  return Object.fromEntries(
    Object.entries(errors).map(([id, error]) => [
      id,
      isRouteErrorResponse(error)
        ? { status: error.status, data: (error.data as FailureData | null) ?? null }
        : { status: 500, data: null },
    ]),
  )
}

export function readHydration({ loaderData, errors }: PageState): HydrationState {
  if (!errors) return { loaderData }
  const read = Object.entries(errors).map(([id, error]) => [id, new ErrorResponse(error.status, '', error.data)])
  return { loaderData, errors: Object.fromEntries(read) as Record<string, unknown> }
}
