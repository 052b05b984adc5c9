import type { UnitSystem } from '#shared/units/systems'

export type Theme = 'light' | 'dark' | 'system'

/** What a visitor chose without an account; lives in two cookies that the server reads too. */
export interface Preferences {
  readonly system: UnitSystem
  readonly theme: Theme
}

export interface PreferenceStore {
  readonly get: () => Preferences
  readonly set: (change: Partial<Preferences>) => void
  readonly subscribe: (listener: () => void) => () => void
}

function readCookie(cookies: string, name: string): string | undefined {
  const found = cookies.split(';').find((pair) => pair.trim().startsWith(`${name}=`))
  return found?.trim().slice(name.length + 1)
}

export function readPreferences(cookies = ''): Preferences {
  const theme = readCookie(cookies, 'theme')
  return {
    system: readCookie(cookies, 'units') === 'metric' ? 'metric' : 'us',
    theme: theme === 'light' || theme === 'dark' ? theme : 'system',
  }
}

export function createPreferenceStore(initial: Preferences): PreferenceStore {
  let current = initial
  const listeners = new Set<() => void>()
  return {
    get: () => current,
    set: (change) => {
      current = { ...current, ...change }
      for (const listener of listeners) listener()
    },
    subscribe: (listener) => {
      listeners.add(listener)
      return () => listeners.delete(listener)
    },
  }
}

const secondsPerYear = 31_536_000

/** The same cookies as `/preferences` sets. */
export function keepPreferences({ system, theme }: Preferences): void {
  const rest = `; Path=/; Max-Age=${secondsPerYear}; SameSite=Lax${location.protocol === 'https:' ? '; Secure' : ''}`
  document.cookie = `units=${system}${rest}`
  document.cookie = `theme=${theme}${rest}`
}
