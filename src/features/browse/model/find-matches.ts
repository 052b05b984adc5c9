import Fuse from 'fuse.js'

/** `end` is the first place that does not belong any more. */
export interface Span {
  readonly start: number
  readonly end: number
}

export interface Named {
  readonly slug: string
  readonly name: string
}

const least = 2
const mostWords = 8

function mergeSpans(spans: readonly Span[]): Span[] {
  const merged: Span[] = []
  for (const span of spans.toSorted((a, b) => a.start - b.start)) {
    const last = merged.at(-1)
    if (last && span.start <= last.end) merged[merged.length - 1] = { ...last, end: Math.max(last.end, span.end) }
    else merged.push(span)
  }
  return merged
}

/** Which stretches of the names resemble the words that were searched for, wherever those stand. */
export function findMatches(named: readonly Named[], text: string): ReadonlyMap<string, readonly Span[]> {
  const fuse = new Fuse(named, {
    keys: ['name'],
    includeMatches: true,
    ignoreLocation: true,
    ignoreDiacritics: true,
    minMatchCharLength: least,
    threshold: 0.34,
  })
  const words = text.split(/\s+/).filter((word) => word.length >= least)
  const found = new Map<string, Span[]>()
  for (const word of words.slice(0, mostWords)) {
    for (const { item, matches = [] } of fuse.search(word)) {
      const shortest = Math.max(least, Math.ceil(word.length / 2))
      const spans = matches
        .flatMap(({ indices }) => indices.map(([start, last]) => ({ start, end: last + 1 })))
        .filter(({ start, end }) => end - start >= shortest)
      found.set(item.slug, [...(found.get(item.slug) ?? []), ...spans])
    }
  }
  return new Map([...found].map(([slug, spans]) => [slug, mergeSpans(spans)]))
}
