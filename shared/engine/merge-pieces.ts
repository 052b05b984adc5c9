import { getKind, type KindKey } from '../kinds/index'
import type { Attribute } from '../kinds/types'
import type { Piece, Source, Value } from './types'

const isNumber = (value: unknown): value is number => typeof value === 'number'

/** What several pieces have in common; of a number the least, as that one runs out first. Undefined where they disagree. */
function share(attribute: Attribute, values: readonly unknown[]): unknown {
  if (attribute.type === 'set')
    return (values as (readonly unknown[])[]).reduce((shared, set) => shared.filter((one) => set.includes(one)))
  if (attribute.type === 'measure' && values.every(isNumber)) return Math.min(...values)
  const [first] = values
  return values.every((value) => JSON.stringify(value) === JSON.stringify(first)) ? first : undefined
}

const weakness: Readonly<Record<Source, number>> = { measured: 0, maker: 1, estimate: 2 }

/** Several pieces as if they were one: what they do under `key` added up, of the rest what holds for all of them. */
export function mergePieces(kind: KindKey, pieces: readonly Piece[], key: string): Piece {
  const specs: Record<string, Value> = {}
  for (const attribute of getKind(kind).attributes) {
    const entries = pieces.map((piece) => piece.specs[attribute.key])
    const known = entries.filter((entry) => entry !== undefined)
    if (known.length < pieces.length) continue
    const values = known.map(({ value }) => value)
    const value =
      attribute.key === key ? [...new Set((values as (readonly unknown[])[]).flat())] : share(attribute, values)
    const { source } = known.reduce((a, b) => (weakness[b.source] > weakness[a.source] ? b : a))
    if (value !== undefined) specs[attribute.key] = { value, source }
  }
  return { kind, specs }
}
