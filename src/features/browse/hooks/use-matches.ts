import { useEffect, useState } from 'react'
import type { GearItem } from '#shared/schemas/gear'
import type { Span } from '../model/find-matches'

type Matches = ReadonlyMap<string, readonly Span[]>

interface Found {
  readonly items: readonly GearItem[]
  readonly q: string
  readonly matches: Matches
}

const none: readonly Span[] = []

/** Marks what was searched for in the names of one page. What finds the marks is fetched when there is a search. */
export function useMatches(items: readonly GearItem[], q: string): (slug: string) => readonly Span[] {
  const [found, setFound] = useState<Found | null>(null)
  useEffect(() => {
    if (q === '' || items.length === 0) return
    let isWanted = true
    void import('../model/find-matches').then(
      ({ findMatches }) => {
        const named = items.map(({ slug, brand, model }) => ({ slug, name: `${brand} ${model}` }))
        if (isWanted) setFound({ items, q, matches: findMatches(named, q) })
      },
      // Without the marks the list is as good as without scripts.
      () => undefined,
    )
    return () => {
      isWanted = false
    }
  }, [items, q])
  return (slug) => (found?.items === items && found.q === q ? (found.matches.get(slug) ?? none) : none)
}
