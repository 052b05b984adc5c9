import { useSyncExternalStore } from 'react'

const storageKey = 'stillfits.last-setup'
/** Longer than any link that is written. */
const longest = 8_192

/** Storage can be full or forbidden; then the setup is simply not remembered. */
function attempt<T>(access: () => T): T | null {
  try {
    return access()
  } catch {
    return null
  }
}

/** Remembers, in this browser alone, the setup that somebody last described: as its link spells it. */
export function keepLastSetup(query: string): void {
  if (query === '' || query.length > longest) return
  attempt(() => localStorage.setItem(storageKey, query))
}

function readLastSetup(): string | null {
  return attempt(() => localStorage.getItem(storageKey))
}

function subscribe(listener: () => void): () => void {
  // Described in another tab.
  window.addEventListener('storage', listener)
  return () => window.removeEventListener('storage', listener)
}

/** The setup that the visitor last described; null where there is none, and on the server. */
export function useLastSetup(): string | null {
  return useSyncExternalStore(subscribe, readLastSetup, () => null)
}
