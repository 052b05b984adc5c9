import { useSyncExternalStore } from 'react'

const storageKey = 'stillfits.review-keys'
const listeners = new Set<() => void>()

/** Storage can be full or forbidden; then the choice holds for as long as the page does. */
let chosen: boolean | null = null

function read(): boolean {
  if (chosen !== null) return chosen
  try {
    return localStorage.getItem(storageKey) !== 'off'
  } catch {
    return true
  }
}

function choose(isOn: boolean): void {
  chosen = isOn
  try {
    localStorage.setItem(storageKey, isOn ? 'on' : 'off')
  } catch {
    // Kept in `chosen` alone.
  }
  for (const listener of listeners) listener()
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}

/** Whether single letters act on the page: speech input and slips of the hand are reasons to turn them off. */
export function useKeysChoice(): readonly [boolean, (isOn: boolean) => void] {
  return [useSyncExternalStore(subscribe, read, () => true), choose]
}
