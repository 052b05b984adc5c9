import type { KindKey } from '../kinds/index'
import { findKindSpans, type KindSpan } from './kind-names'
import { toSingular, toTokens } from './normalise'
import { guessOptionWords } from './option-words'
import { expandMeasure, isLoneUnit } from './unit-words'

/** Grammar and pleasantries. A letter is none of them: models are called "S" and "A". */
const emptyWords: ReadonlySet<string> = new Set(
  'for the an and or of with to in on at by from my me need want looking find some any please is it that which'.split(
    ' ',
  ),
)

/** More words than any name has; the rest says nothing new. */
const mostTokens = 12
const shortestNameWord = 4
const mostNameWords = 3

/** What was typed into the search, ready to be looked up and to be held against candidates. */
export interface Search {
  readonly tokens: readonly string[]
  /** Of each token, every spelling under which a piece may have it. */
  readonly spellings: readonly (readonly string[])[]
  /** Of each token, the words of specs that it may be a slip of. */
  readonly guesses: readonly (readonly string[])[]
  readonly spans: readonly KindSpan[]
  /** Everything typed as one code: "T-90" is `t90`. */
  readonly code: string
  /** The words that may be part of a name, for trigrams; empty where all are kinds and measures. */
  readonly nameText: string
  /** The longest of them, to be looked for one by one where all together are like no name. */
  readonly nameWords: readonly string[]
  /** More words were typed than are looked for. */
  readonly isCut: boolean
}

/** `any` of the terms of each entry, `all` entries: one way in which a piece can have everything that was typed. */
export type TermReading = readonly (readonly string[])[]

const isNumeric = (token: string): boolean => /^\d/.test(token)

const pickTokens = (all: readonly string[]): readonly string[] => {
  const telling = all.filter((token) => !emptyWords.has(token) && !isLoneUnit(token))
  return telling.length > 0 ? telling : all
}

const isInExactSpan = (spans: readonly KindSpan[], index: number): boolean =>
  spans.some(({ from, to, isExact }) => isExact && index >= from && index < to)

/** "Stand for a 60 cm tank" asks for a stand: beside another kind, the tank is only where it goes. */
const dropSurroundings = (tokens: readonly string[]): readonly string[] => {
  const spans = findKindSpans(tokens)
  const isTank = ({ kinds }: KindSpan) => kinds.size === 1 && kinds.has('tank')
  const others = spans.filter((span) => span.isExact && !isTank(span))
  if (others.length === 0) return tokens
  const isDropped = (index: number) =>
    spans.some((span) => isTank(span) && index >= span.from && index < span.to) &&
    !others.some(({ from, to }) => index >= from && index < to)
  return tokens.filter((_, index) => !isDropped(index))
}

export const readSearch = (text: string): Search => {
  const all = toTokens(text)
  const tokens = dropSurroundings(pickTokens(all.slice(0, mostTokens)))
  const spans = findKindSpans(tokens)
  const nameTokens = tokens.filter((token, index) => !isNumeric(token) && !isInExactSpan(spans, index))
  const nameText = nameTokens.join(' ').replace(/\d+/g, ' ').replace(/ +/g, ' ').trim()
  return {
    tokens,
    spellings: tokens.map((token) => [...new Set([...expandMeasure(token), token, toSingular(token)])]),
    guesses: tokens.map(guessOptionWords),
    spans,
    isCut: all.length > mostTokens,
    code: all.join(''),
    nameText,
    nameWords: nameText
      .split(' ')
      .filter((word) => word.length >= shortestNameWord)
      .toSorted((a, b) => b.length - a.length)
      .slice(0, mostNameWords),
  }
}

const toKindTerms = (kinds: ReadonlySet<KindKey>): readonly string[] => [...kinds].map((kind) => `kind:${kind}`)

const withKinds = ({ spellings, guesses, spans }: Search, index: number): readonly string[] => {
  const single = spans.filter(({ from, to }) => from === index && to === index + 1)
  const words = [...(spellings[index] ?? []), ...(guesses[index] ?? [])]
  return [...words, ...words.map((word) => `~${word}`), ...single.flatMap(({ kinds }) => toKindTerms(kinds))]
}

/** Every way in which the terms of a piece can hold all that was typed: word by word, with phrases, with two words glued. */
export const listTermReadings = (search: Search): readonly TermReading[] => {
  const { tokens, spans } = search
  const plain = tokens.map((_, index) => withKinds(search, index))
  const replaced = (from: number, to: number, terms: readonly string[]): TermReading => [
    ...plain.slice(0, from),
    terms,
    ...plain.slice(to),
  ]
  const phrases = spans
    .filter(({ from, to }) => to - from > 1)
    .map(({ from, to, kinds }) => replaced(from, to, toKindTerms(kinds)))
  const glued = tokens.slice(1).map((token, index) => replaced(index, index + 2, [`${tokens[index]}${token}`]))
  return tokens.length === 0 ? [] : [plain, ...phrases, ...glued]
}
