import { useMemo, useSyncExternalStore } from 'react'
import { emptyDraft, type DecisionDraft } from '../model/decision-draft'

const storageKey = (id: string): string => `stillfits.decision.${id}`
const listeners = new Set<() => void>()
/** Where storage is full or forbidden. */
const unstored = new Map<string, string>()

function attempt<T>(access: () => T): T | null {
  try {
    return access()
  } catch {
    return null
  }
}

function readText(id: string): string | null {
  return unstored.get(id) ?? attempt(() => sessionStorage.getItem(storageKey(id)))
}

function writeText(id: string, text: string | null): void {
  unstored.delete(id)
  if (text === null) attempt(() => sessionStorage.removeItem(storageKey(id)))
  else if (!attempt(() => (sessionStorage.setItem(storageKey(id), text), true))) unstored.set(id, text)
  for (const listener of listeners) listener()
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener)
  return () => listeners.delete(listener)
}

function parseDraft(text: string | null): DecisionDraft {
  const kept = text === null ? null : attempt(() => JSON.parse(text) as Partial<DecisionDraft> | null)
  return { ...emptyDraft, ...kept }
}

export interface KeptDraft {
  readonly draft: DecisionDraft
  readonly change: (change: Partial<DecisionDraft>) => void
  /** Once it is sent, or thrown away. */
  readonly drop: () => void
}

/** A decision in the making outlives a reload of the tab, and whatever others do meanwhile. */
export function useKeptDraft(id: string): KeptDraft {
  const text = useSyncExternalStore(
    subscribe,
    () => readText(id),
    () => null,
  )
  const draft = useMemo(() => parseDraft(text), [text])
  return {
    draft,
    change: (change) => writeText(id, JSON.stringify({ ...parseDraft(readText(id)), ...change })),
    drop: () => writeText(id, null),
  }
}
