import type { Piece } from '#shared/engine/types'
import type { Filters } from '#shared/schemas/filters'

/** A value that nobody has recorded matches nothing: what is not known cannot be what was asked for. */
function matches(value: unknown, filter: Filters[string]): boolean {
  if (value === undefined) return false
  if (Array.isArray(filter)) {
    const [from, to] = filter
    return typeof value === 'number' && (from === null || value >= from) && (to === null || value <= to)
  }
  // Options are spelt as text, also where numbers are stored (mains volts).
  if (typeof filter === 'string') return [value].flat().map(String).includes(filter)
  return value === filter
}

/** The pieces of which every filtered attribute is known and matches. Without filters the very same list, not a copy. */
export function filterPieces(pieces: readonly Piece[], filters: Filters = {}): readonly Piece[] {
  const entries = Object.entries(filters)
  if (entries.length === 0) return pieces
  return pieces.filter(({ specs }) => entries.every(([key, filter]) => matches(specs[key]?.value, filter)))
}
