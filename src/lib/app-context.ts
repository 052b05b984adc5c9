import { createContext, useContext, useSyncExternalStore } from 'react'
import type { QueryClient } from '@tanstack/react-query'
import type { ApiClient } from './api-client'
import type { Preferences, PreferenceStore } from './preferences'

/** What pages and their loaders work with; made once per browser tab, and once per visit on the server. */
export interface App {
  readonly api: ApiClient
  readonly queryClient: QueryClient
  readonly preferences: PreferenceStore
  /** On the server a page waits for its data; in a browser it shows itself and fills in. */
  readonly isServer: boolean
}

const AppContext = createContext<App | null>(null)

export const AppProvider = AppContext.Provider

export function useApp(): App {
  const app = useContext(AppContext)
  if (!app) throw new Error('The page stands outside of its providers.')
  return app
}

export function usePreferences(): Preferences {
  const { preferences } = useApp()
  return useSyncExternalStore(preferences.subscribe, preferences.get, preferences.get)
}
