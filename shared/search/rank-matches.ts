import type { KindKey } from '../kinds/index'
import { allowedSlips, measureDistance } from './edit-distance'
import type { KindSpan } from './kind-names'
import type { Search } from './read-search'
import { toSingular } from './normalise'

/** A piece that may be meant. */
export interface Candidate {
  readonly id: number
  readonly kind: KindKey
  /** Brand and model in search tokens. */
  readonly name: readonly string[]
  readonly code: string
  readonly gtin: string | null
  readonly terms: ReadonlySet<string>
}

/** How well one word of the question is met, from what is certain to what is likely. */
const worth = {
  nameWord: 1,
  gluedName: 0.98,
  kind: 0.97,
  sameNumber: 0.96,
  term: 0.98,
  sameMeasure: 0.93,
  beginning: 0.9,
  label: 0.85,
  guessedTerm: 0.82,
  guessedKind: 0.8,
  numberOfMeasure: 0.8,
} as const

/**
 * Under this share of what was typed, a piece is not an answer. A name that is met vouches for its piece, and the other
 * sizes of a family are worth showing; a kind with half of what was asked of it is not.
 */
const leastShare = { named: 0.52, unnamed: 0.75 } as const
const longestGlue = 3
const shortestBeginning = 2

const digitsOf = (text: string): string => text.replace(/\D+/g, ' ').trim()

/** 1 for the same word, less for each slip; 0 for another word. Numbers have no slips: 100 is not 150. */
const compareWords = (typed: string, known: string): number => {
  if (typed === known || toSingular(typed) === toSingular(known)) return 1
  if (digitsOf(typed) !== digitsOf(known)) return 0
  const length = Math.max(typed.length, known.length)
  const slips = allowedSlips(Math.min(length, typed.length + 1))
  const distance = measureDistance(typed, known, slips)
  return distance > slips ? 0 : 1 - (1.25 * distance) / length
}

const compareBeginning = (typed: string, known: string): number => {
  if (typed.length < shortestBeginning || typed.length >= known.length || /^\d/.test(typed)) return 0
  return known.startsWith(typed) ? worth.beginning - 0.02 * Math.min(5, known.length - typed.length) : 0
}

interface Met {
  readonly worth: number
  /** Which tokens of the name met it: from, and the one after the last. */
  readonly from: number
  readonly to: number
}

const unmet: Met = { worth: 0, from: 0, to: 0 }

const better = (a: Met, b: Met): Met => (b.worth > a.worth ? b : a)

const meetByName = (typed: string, name: readonly string[]): Met => {
  let best = unmet
  for (let from = 0; from < name.length; from++) {
    let known = ''
    for (let to = from + 1; to <= Math.min(name.length, from + longestGlue); to++) {
      known += name[to - 1] ?? ''
      const isGlued = to - from > 1
      const value = Math.max(
        compareWords(typed, known) * (isGlued ? worth.gluedName : 1),
        compareBeginning(typed, known),
      )
      if (value > 0) best = better(best, { worth: value, from, to })
      if (known.length > typed.length + 3) break
    }
  }
  return best
}

const numberOf = (token: string): string | undefined => /^(\d+(?:\.\d+)?)[a-z]*$/.exec(token)?.[1]

const meetByNumber = (typed: string, name: readonly string[]): Met => {
  const number = numberOf(typed)
  if (number === undefined) return unmet
  const from = name.findIndex((token) => numberOf(token) === number && (token === number || typed === number))
  return from === -1 ? unmet : { worth: worth.sameNumber, from, to: from + 1 }
}

const meetByTerms = (search: Search, index: number, { terms }: Candidate): number => {
  const typed = search.tokens[index] ?? ''
  if (terms.has(typed)) return worth.term
  const spellings = search.spellings[index] ?? []
  if (spellings.some((spelling) => terms.has(spelling))) return worth.sameMeasure
  if (spellings.some((spelling) => terms.has(`~${spelling}`))) return worth.label
  if (search.guesses[index]?.some((guess) => terms.has(guess))) return worth.guessedTerm
  if (/^\d+(?:\.\d+)?$/.test(typed)) {
    for (const term of terms) if (numberOf(term) === typed) return worth.numberOfMeasure
    return 0
  }
  return 0
}

/** "Refractometer" names the kind of all salinity meters, and is what some of them are. */
const meetByKind = ({ kinds, name, isExact }: KindSpan, { kind, terms }: Candidate): number => {
  if (!kinds.has(kind)) return 0
  if (terms.has(name)) return isExact ? worth.term : worth.guessedTerm
  return isExact ? worth.kind : worth.guessedKind
}

/** Long words say more, and numbers more than their length. */
const weigh = (token: string): number =>
  /^\d+(?:\.\d+)?$/.test(token) ? 3 : /^\d/.test(token) ? 4 : Math.max(1.5, Math.min(8, token.length))

interface Step {
  readonly sum: number
  readonly names: readonly Met[]
}

/** The best way to meet all that was typed, word by word, in phrases or with split words put together again. */
const align = (search: Search, candidate: Candidate): Step => {
  const { tokens, spans } = search
  const steps: Step[] = [{ sum: 0, names: [] }]
  const offer = (to: number, from: number, share: number, weight: number, met: Met): void => {
    const before = steps[from]
    if (before === undefined) return
    const sum = before.sum + share * weight
    const known = steps[to]
    if (known === undefined || sum > known.sum) {
      steps[to] = { sum, names: met.to > met.from ? [...before.names, met] : before.names }
    }
  }
  const weights = tokens.map(weigh)
  const weightOf = (from: number, to: number) => weights.slice(from, to).reduce((sum, weight) => sum + weight, 0)
  tokens.forEach((token, index) => {
    const named = better(meetByName(token, candidate.name), meetByNumber(token, candidate.name))
    const byTerms = meetByTerms(search, index, candidate)
    const met = byTerms > named.worth ? { ...unmet, worth: byTerms } : named
    offer(index + 1, index, met.worth, weights[index] ?? 0, met)
    for (const span of spans) {
      const { from, to } = span
      if (from === index) offer(to, from, meetByKind(span, candidate), weightOf(from, to), unmet)
    }
    for (let to = index + 2; to <= Math.min(tokens.length, index + longestGlue); to++) {
      const glued = meetByName(tokens.slice(index, to).join(''), candidate.name)
      if (glued.worth > 0) offer(to, index, glued.worth * worth.gluedName, weightOf(index, to), glued)
    }
  })
  return steps[tokens.length] ?? { sum: 0, names: [] }
}

/** How much of the piece's name was typed, and whether in its order: settles between pieces that have all the words. */
const settle = (names: readonly Met[], candidate: Candidate): number => {
  const used = new Set(names.flatMap(({ from, to }) => Array.from({ length: to - from }, (_, index) => from + index)))
  const inOrder = names.every(({ from }, index) => index === 0 || from >= (names[index - 1]?.to ?? 0))
  return (0.05 * used.size) / Math.max(1, candidate.name.length) + (inOrder ? 0.01 : 0)
}

export interface Match {
  readonly id: number
  readonly score: number
}

/** The score of one piece, or null where it is no answer. An exact code comes first, whatever else there is. */
export const scoreCandidate = (search: Search, candidate: Candidate): number | null => {
  const total = search.tokens.reduce((sum, token) => sum + weigh(token), 0)
  if (total === 0) return null
  const { sum, names } = align(search, candidate)
  const share = sum / total
  const fullCode = candidate.name.join('')
  const isWhole = fullCode === search.code || candidate.gtin === search.code
  const exact = isWhole ? 2 : candidate.code === search.code ? 1 : 0
  const least = names.length > 0 ? leastShare.named : leastShare.unnamed
  if (share < least && exact === 0) return null
  return Number((exact + share + settle(names, candidate)).toFixed(6))
}

/** Those that answer, best first. Equal ones keep their order. */
export const rankMatches = (search: Search, candidates: readonly Candidate[]): readonly Match[] =>
  candidates
    .flatMap((candidate) => {
      const score = scoreCandidate(search, candidate)
      return score === null ? [] : [{ id: candidate.id, score }]
    })
    .toSorted((a, b) => b.score - a.score)
