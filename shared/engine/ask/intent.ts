import { findPhrases, indexPhrases, type Mention } from './phrases'
import type { Token } from './token'
import type { Intent } from './types'
import {
  checkPhrases,
  fitPhrases,
  gonePhrases,
  missingPhrases,
  needPhrases,
  replacePhrases,
  whichPhrases,
} from './words/intent-words'

const index = (phrases: readonly string[]) => indexPhrases(phrases.map((phrase) => [phrase, true] as const))
const missing = index(missingPhrases)
const needs = index(needPhrases)
const gone = index(gonePhrases)
const replacing = index(replacePhrases)
const asksWhether = index(checkPhrases)
const fitting = index(fitPhrases)
const asksWhich = index(whichPhrases)

export interface IntentFound {
  readonly intent: Intent
  readonly cues: readonly Mention<true>[]
}

interface Asked {
  readonly hasKind: boolean
  readonly hasGear: boolean
  /** Tokens that already name something: the "dead" of "dead rock" is no failure. */
  readonly isTaken: (at: number) => boolean
}

/** "can you recommend", "does anyone know", "is there" ask which, not whether. */
const notWhether: ReadonlySet<string> = new Set('you anyone anybody someone somebody there we'.split(' '))

const startsQuestion = (tokens: readonly Token[], at: number): boolean => {
  const before = tokens[at - 1]
  return (
    before === undefined ||
    before.type === 'stop' ||
    before.text === 'so' ||
    before.text === 'and' ||
    before.text === 'but'
  )
}

/** What is asked for: a check of one piece, pieces that fit, a replacement, or what a setup lacks. */
export const findIntent = (tokens: readonly Token[], { hasKind, hasGear, isTaken }: Asked): IntentFound => {
  const find = (phrases: typeof missing) => findPhrases(phrases, tokens).filter(({ from }) => !isTaken(from))
  const lacks = [...find(missing), ...(hasKind ? [] : find(needs))]
  const replaced = [...find(replacing), ...(hasKind || hasGear ? find(gone) : [])]
  if (replaced.length > 0) return { intent: 'replace', cues: replaced }
  if (lacks.length > 0) return { intent: 'missing', cues: lacks }
  const whether = find(asksWhether).filter(
    ({ from, to }) => startsQuestion(tokens, from) && !notWhether.has(tokens[to]?.text ?? ''),
  )
  const fits = find(fitting)
  const isWhether =
    whether.length > 0 &&
    (fits.length > 0 || whether.some(({ from, to }) => to - from > 2)) &&
    find(asksWhich).length === 0
  if (hasGear) return { intent: 'check', cues: fits }
  return isWhether && hasKind ? { intent: 'check', cues: fits } : { intent: 'find', cues: [] }
}
