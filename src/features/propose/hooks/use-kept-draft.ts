import { useEffect, useEffectEvent, useRef, useState } from 'react'
import { dropDraft, keepDraft, readDraft, type Draft } from '../model/drafts'
import type { UnitSystem } from '#shared/units/systems'
import { isUntouched } from '../model/compare-typed'
import { pickTouched } from '../model/touched'
import type { FormBase, TypedForm } from '../model/typed-form'

export interface KeptDraftOptions {
  /** What the draft is about: a piece's slug, or "new". */
  readonly place: string
  readonly base: FormBase
  readonly typed: TypedForm
  readonly system: UnitSystem
  readonly proposalId: string | null
  /** It was sent: there is nothing left to keep. */
  readonly isOver: boolean
  readonly onRestore: (draft: Draft) => void
}

const restMs = 500

/** Keeps what is typed in this browser, and brings it back on the next visit. */
export function useKeptDraft({ place, base, typed, system, proposalId, isOver, onRestore }: KeptDraftOptions) {
  const [restored, setRestored] = useState<Draft | null>(null)
  const [keptAt, setKeptAt] = useState<string | null>(null)
  const hasLooked = useRef(false)
  const look = useEffectEvent(() => {
    hasLooked.current = true
    const draft = readDraft(place)
    if (!draft || draft.kind !== base.kind) return
    // Another proposal's draft is not this one's.
    if (proposalId !== null && draft.proposalId !== proposalId) return
    setRestored(draft)
    onRestore(draft)
  })
  // Before what was typed while the scripts were on their way is played in: that is newer.
  useEffect(() => queueMicrotask(() => look()), [])

  const write = () => {
    if (!hasLooked.current || isOver || isUntouched(typed, base.typed)) return
    const at = new Date().toISOString()
    const touched = pickTouched(base, typed, system)
    const draft = { kind: base.kind, baseRevision: base.gear?.revision ?? null, proposalId, typed: touched, at }
    if (keepDraft(place, draft)) setKeptAt(at)
  }
  const keep = useEffectEvent(write)
  useEffect(() => {
    const timer = setTimeout(() => keep(), restMs)
    return () => clearTimeout(timer)
  }, [typed, proposalId])
  // Leaving at once after typing loses nothing either.
  useEffect(() => {
    const leave = () => keep()
    window.addEventListener('pagehide', leave)
    return () => window.removeEventListener('pagehide', leave)
  }, [])

  return {
    restored,
    keptAt,
    drop: () => {
      dropDraft(place)
      setRestored(null)
      setKeptAt(null)
    },
  }
}
