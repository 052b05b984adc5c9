import type { Report, Verdict } from '#shared/engine/types'

const countOf = (count: number, one: string, many: string): string => `${count} ${count === 1 ? one : many}`

const list = (parts: readonly string[]): string =>
  parts.length <= 1 ? (parts[0] ?? '') : `${parts.slice(0, -1).join(', ')} and ${parts.at(-1)}`

/** The whole report in one sentence. */
export function describeReport({ verdict, items, missing }: Report): string {
  const count = (wanted: Verdict) => items.filter((item) => item.verdict === wanted).length
  const [no, unknown, changes] = [count('no'), count('unknown'), count('changes')]
  const parts = [
    ...(no > 0 ? [countOf(no, 'piece does not fit', 'pieces do not fit')] : []),
    ...(unknown > 0 ? [`for ${countOf(unknown, 'piece', 'pieces')} a number is missing`] : []),
    ...(changes > 0 ? [countOf(changes, 'piece asks for a change', 'pieces ask for a change')] : []),
    ...(missing.length > 0 ? [countOf(missing.length, 'essential is missing', 'essentials are missing')] : []),
  ]
  if (verdict === 'fits') return 'Everything in it fits together, and nothing essential is missing.'
  const sentence = list(parts)
  return `${sentence[0]?.toUpperCase() ?? ''}${sentence.slice(1)}.`
}
