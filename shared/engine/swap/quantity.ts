import type { Item, Piece } from '../types'
import { readNumber } from '../values'
import type { KindKey } from '../../kinds/index'

/** What a pack of a kind holds: so much as is gone is to be there again. */
const contentKeys: Partial<Record<KindKey, string>> = { rock: 'packKg', sand: 'packKg', 'salt-mix': 'makesL' }

const most = 99

/**
 * How many of a piece take the place of what is gone, where that goes by what a pack holds: at least as much as there
 * was. Undefined for other kinds: as many as there were, or what the checks settle on.
 */
export function findPackCount({ piece, quantity }: Item): ((replacement: Piece) => number) | undefined {
  const key = contentKeys[piece.kind]
  if (key === undefined) return undefined
  const held = readNumber(piece.specs, key)
  return (replacement) => {
    const content = readNumber(replacement.specs, key)
    if (held === undefined || content === undefined || content <= 0) return quantity
    return Math.min(most, Math.max(1, Math.ceil((quantity * held) / content - 1e-9)))
  }
}
