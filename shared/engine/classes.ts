import type { Rule } from './rule'
import type { Piece } from './types'

/** Pieces sorted, for one rule, by what the rule reads: two pieces of a class are alike to it. */
export interface Classes {
  readonly ofPiece: Int32Array
  /** The first piece of each class. */
  readonly first: readonly number[]
}

const known = new WeakMap<readonly Piece[], Map<string, Classes>>()

function sort(pieces: readonly Piece[], keys: readonly string[], byGear: boolean): Classes {
  const ofPiece = new Int32Array(pieces.length)
  const first: number[] = []
  const ids = new Map<string, number>()
  pieces.forEach(({ specs, gear }, index) => {
    const read = keys.map((key) => specs[key] ?? null)
    const identity = JSON.stringify(byGear ? [gear?.slug ?? index, read] : read)
    let id = ids.get(identity)
    if (id === undefined) {
      id = first.length
      ids.set(identity, id)
      first.push(index)
    }
    ofPiece[index] = id
  })
  return { ofPiece, first }
}

/**
 * The classes of a catalogue's pieces for one rule (or for any list of attribute keys). Computed once per list of pieces,
 * so that a setup asks each rule about ten thousand pieces only as often as they differ in what it reads.
 */
export function classify(pieces: readonly Piece[], key: string, reads: readonly string[], byGear = false): Classes {
  let byKey = known.get(pieces)
  if (!byKey) known.set(pieces, (byKey = new Map<string, Classes>()))
  let classes = byKey.get(key)
  if (!classes) byKey.set(key, (classes = sort(pieces, reads, byGear)))
  return classes
}

export const classifyForRule = (pieces: readonly Piece[], rule: Rule): Classes =>
  classify(pieces, rule.id, rule.reads, rule.readsGear ?? false)
