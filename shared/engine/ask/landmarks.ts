import type { KindKey } from '../../kinds/index'
import { findPhrases, indexPhrases, type Mention } from './phrases'
import type { Token } from './token'
import { kindPhrases, neverMisspelt } from './words/kind-words'
import { subjectPhrases, type Subject } from './words/subject-words'
import { isNearlyEqual } from './misspelling'

/** Something that a measure nearby may be of. */
export interface Landmark {
  readonly from: number
  readonly to: number
  readonly subject?: Subject
  readonly kind?: KindKey
}

const kindIndex = indexPhrases(kindPhrases)
const subjectIndex = indexPhrases(subjectPhrases)
const shortestGuess = 6
const longestGuess = 16
const guessable = kindPhrases.filter(([name]) => !name.includes(' ') && name.length >= shortestGuess)
const knownWords = new Set([...kindPhrases, ...subjectPhrases].flatMap(([phrase]) => phrase.split(' ')))

const guessKind = (word: string): KindKey | undefined => {
  const singular = word.replace(/s$/, '')
  if (singular.length < shortestGuess - 1 || word.length > longestGuess) return undefined
  if (neverMisspelt.has(singular) || knownWords.has(singular) || knownWords.has(word)) return undefined
  return guessable.find(([name]) => isNearlyEqual(singular, name))?.[1]
}

const findMisspelt = (tokens: readonly Token[]): readonly Mention<KindKey>[] => {
  const guesses = new Map<string, KindKey | undefined>()
  return tokens.flatMap((token, at) => {
    if (token.type !== 'word') return []
    if (!guesses.has(token.text)) guesses.set(token.text, guessKind(token.text))
    const means = guesses.get(token.text)
    return means === undefined ? [] : [{ from: at, to: at + 1, means }]
  })
}

/** Kinds and other subjects named in the text, in order; of overlapping ones the longest. "tank" is both at once. */
export const findLandmarks = (tokens: readonly Token[]): readonly Landmark[] => {
  const found: Landmark[] = [
    ...findPhrases(subjectIndex, tokens).map(({ from, to, means }) => ({ from, to, subject: means })),
    ...findPhrases(kindIndex, tokens).map(({ from, to, means }) => ({ from, to, kind: means })),
    ...findMisspelt(tokens).map(({ from, to, means }) => ({ from, to, kind: means })),
  ]
  const taken = new Map<number, Landmark>()
  for (const landmark of found.toSorted((a, b) => b.to - b.from - (a.to - a.from))) {
    const there = taken.get(landmark.from)
    const isSameSpan = there !== undefined && there.from === landmark.from && there.to === landmark.to
    const merged = isSameSpan ? { ...there, ...landmark } : landmark
    const places = Array.from({ length: landmark.to - landmark.from }, (_, offset) => landmark.from + offset)
    if (isSameSpan || places.every((at) => !taken.has(at))) for (const at of places) taken.set(at, merged)
  }
  return [...new Set(taken.values())].toSorted((a, b) => a.from - b.from)
}
