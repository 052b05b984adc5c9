import { useEffect, useState } from 'react'
import { emptyDraft, type DecisionDraft } from '../model/decision-draft'

const storageKey = (id: string): string => `stillfits.decision.${id}`

function attempt<T>(access: () => T): T | null {
  try {
    return access()
  } catch {
    return null
  }
}

function readKept(id: string): Partial<DecisionDraft> | null {
  const text = attempt(() => sessionStorage.getItem(storageKey(id)))
  const value = text === null ? null : attempt(() => JSON.parse(text) as unknown)
  return typeof value === 'object' ? value : null
}

export interface KeptDraft {
  readonly draft: DecisionDraft
  readonly change: (change: Partial<DecisionDraft>) => void
  /** Once it is sent. */
  readonly drop: () => void
}

/** A decision in the making outlives a reload of the tab, and whatever others do meanwhile. */
export function useKeptDraft(id: string): KeptDraft {
  const [draft, setDraft] = useState(emptyDraft)
  useEffect(() => {
    const kept = readKept(id)
    // Storage is there in the browser alone: the server rendered an empty form.
    if (kept) setDraft((now) => ({ ...now, ...kept }))
  }, [id])
  const change = (wanted: Partial<DecisionDraft>) => {
    const next = { ...draft, ...wanted }
    setDraft(next)
    attempt(() => sessionStorage.setItem(storageKey(id), JSON.stringify(next)))
  }
  const drop = () => {
    setDraft(emptyDraft)
    attempt(() => sessionStorage.removeItem(storageKey(id)))
  }
  return { draft, change, drop }
}
