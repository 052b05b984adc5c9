import { kindPhrases, neverMisspelt } from '../engine/ask/words/kind-words'
import { getKind, kindKeys, type KindKey } from '../kinds/index'
import { measureDistance } from './edit-distance'
import { toSingular, toTokens } from './normalise'
import { optionWordsOf } from './option-words'

const squashPhrase = (words: readonly string[]): string => words.map(toSingular).join('')

/** By what they are called, singular and without spaces: "wave maker" and "wavemakers" are `wavemaker`. */
const indexNames = (): ReadonlyMap<string, ReadonlySet<KindKey>> => {
  const labels = kindKeys.map((key) => [getKind(key).label, key] as const)
  const phrases = [...labels, ...kindPhrases].map(([phrase, kind]) => ({ words: toTokens(phrase), kind }))
  const singles = new Set(phrases.flatMap(({ words, kind }) => (words.length === 1 ? [`${kind} ${words[0]}`] : [])))
  const names = new Map<string, Set<KindKey>>()
  for (const { words, kind } of phrases) {
    // "Titanium heater" is not another name of all heaters: both of its words are read for themselves.
    const isQualified =
      words.length > 1 &&
      words.some((word) => singles.has(`${kind} ${word}`)) &&
      words.every((word) => singles.has(`${kind} ${word}`) || optionWordsOf.get(kind)?.has(word))
    if (isQualified) continue
    const key = squashPhrase(words)
    names.set(key, (names.get(key) ?? new Set()).add(kind))
  }
  return names
}

const names = indexNames()
const longestPhrase = 5
const shortestGuess = 5

const guessable = [...names.keys()].filter((name) => name.length >= shortestGuess)

export interface NamedKinds {
  readonly kinds: ReadonlySet<KindKey>
  /** What they are called, singular and without spaces. */
  readonly name: string
  /** False where a slip of the finger was looked past. */
  readonly isExact: boolean
}

const guess = (name: string): NamedKinds | undefined => {
  if (name.length < shortestGuess || /\d/.test(name) || neverMisspelt.has(name)) return undefined
  const most = name.length < 9 ? 1 : 2
  for (let slips = 1; slips <= most; slips++) {
    const found = guessable.find((known) => measureDistance(known, name, slips) <= slips)
    const kinds = found === undefined ? undefined : names.get(found)
    if (found !== undefined && kinds !== undefined) return { kinds, name: found, isExact: false }
  }
  return undefined
}

export interface KindSpan extends NamedKinds {
  /** First token, and the one after the last. */
  readonly from: number
  readonly to: number
}

/** Every stretch of the tokens that names kinds, glued, split, plural or slightly misspelt. */
export const findKindSpans = (tokens: readonly string[]): readonly KindSpan[] => {
  const spans: KindSpan[] = []
  for (let from = 0; from < tokens.length; from++) {
    for (let to = from + 1; to <= Math.min(tokens.length, from + longestPhrase); to++) {
      const name = squashPhrase(tokens.slice(from, to))
      const exact = names.get(name)
      const named =
        exact !== undefined ? { kinds: exact, name, isExact: true } : to - from <= 2 ? guess(name) : undefined
      if (named !== undefined) spans.push({ from, to, ...named })
    }
  }
  return spans
}
