import type { Span } from './draft'
import type { Token } from './token'
import type { CatalogueName } from './types'

const longestName = 14
const shortestModel = 4

/** "Ember T-90", "ember t90" and "EMBER T 90" are one name. */
const squash = (name: string): string =>
  name
    .normalize('NFKD')
    .replace(/\p{M}/gu, '')
    .toLowerCase()
    .replace(/[^\p{L}\p{N}]/gu, '')

/** A model stands for its piece without the brand if it is long enough and says more than one word of English. */
const isTelling = (model: string): boolean => squash(model).length >= shortestModel && /[\s\d-]/.test(model.trim())

type Names = ReadonlyMap<string, CatalogueName | null>

/** By squashed name; null where two pieces share it. */
const indexNames = (catalogue: readonly CatalogueName[]): Names => {
  const names = new Map<string, CatalogueName | null>()
  const add = (name: string, piece: CatalogueName) => {
    const key = squash(name)
    if (key !== '') names.set(key, names.has(key) && names.get(key) !== piece ? null : piece)
  }
  for (const piece of catalogue) {
    add(`${piece.brand} ${piece.model}`, piece)
    if (isTelling(piece.model)) add(piece.model, piece)
  }
  return names
}

/** Catalogues are long and the same from question to question. */
const indexed = new WeakMap<readonly CatalogueName[], Names>()

const namesOf = (catalogue: readonly CatalogueName[]): Names => {
  const names = indexed.get(catalogue) ?? indexNames(catalogue)
  indexed.set(catalogue, names)
  return names
}

/** The longest name of a catalogue piece in the text. */
export const findGear = (
  tokens: readonly Token[],
  catalogue: readonly CatalogueName[],
): { readonly piece: CatalogueName; readonly span: Span } | undefined => {
  const names = namesOf(catalogue)
  const words = tokens.map(({ text }) => squash(text))
  let best: { piece: CatalogueName; span: Span; length: number } | undefined
  for (let from = 0; from < tokens.length && names.size > 0; from++) {
    let name = ''
    for (let to = from + 1; to <= Math.min(tokens.length, from + longestName); to++) {
      const word = words[to - 1] ?? ''
      name += word
      const piece = word === '' ? undefined : names.get(name)
      if (piece && name.length > (best?.length ?? 0)) best = { piece, span: { from, to }, length: name.length }
    }
  }
  return best
}
