import type { Token } from './token'

/** A phrase found in the text: tokens `from` to `to`, the latter not included. */
export interface Mention<T> {
  readonly from: number
  readonly to: number
  readonly means: T
}

interface Phrase<T> {
  readonly words: readonly string[]
  readonly means: T
}

export type PhraseIndex<T> = ReadonlyMap<string, readonly Phrase<T>[]>

/** Looks phrases up by their first word; longer ones win. A phrase is words with single spaces: "ro / di". */
export const indexPhrases = <T>(entries: Iterable<readonly [phrase: string, means: T]>): PhraseIndex<T> => {
  const index = new Map<string, Phrase<T>[]>()
  for (const [phrase, means] of entries) {
    const words = phrase.split(' ')
    const first = words[0] ?? ''
    index.set(first, [...(index.get(first) ?? []), { words, means }])
  }
  for (const phrases of index.values()) phrases.sort((a, b) => b.words.length - a.words.length)
  return index
}

/** "heaters" and "heater's" may stand where a table says "heater". */
const singularOf = (word: string): string => word.replace(/'?s$/, '')

const isWord = (token: Token | undefined, word: string): boolean =>
  token !== undefined && (token.text === word || (token.type === 'word' && singularOf(token.text) === word))

export const matchAt = <T>(index: PhraseIndex<T>, tokens: readonly Token[], at: number): Mention<T> | undefined => {
  const token = tokens[at]
  if (token === undefined) return undefined
  const exact = index.get(token.text)
  const singular = token.text.endsWith('s') ? index.get(singularOf(token.text)) : undefined
  if (exact === undefined && singular === undefined) return undefined
  const candidates = [...(exact ?? []), ...(singular ?? [])]
  const found = candidates
    .filter(({ words }) => words.every((word, offset) => isWord(tokens[at + offset], word)))
    .sort((a, b) => b.words.length - a.words.length)[0]
  return found === undefined ? undefined : { from: at, to: at + found.words.length, means: found.means }
}

/** Every phrase of the index in the text, from left to right, none overlapping. */
export const findPhrases = <T>(index: PhraseIndex<T>, tokens: readonly Token[]): readonly Mention<T>[] => {
  const mentions: Mention<T>[] = []
  for (let at = 0; at < tokens.length; at++) {
    const mention = matchAt(index, tokens, at)
    if (mention === undefined) continue
    mentions.push(mention)
    at = mention.to - 1
  }
  return mentions
}
