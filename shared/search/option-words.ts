import { filterChoices } from '../engine/ask/words/choice-words'
import { kindKeys, kinds, type KindKey } from '../kinds/index'
import type { Attribute, Option } from '../kinds/types'
import { measureDistance } from './edit-distance'
import { toTokens } from './normalise'

/** Said of every second piece, these tell nothing apart. */
const untellingWords: ReadonlySet<string> = new Set(
  'tank tanks and on the of in not for its with bought apart only any other included built'.split(' '),
)

/** The pins of its plug are compared in a room, not typed into a search. */
const untellingKeys: ReadonlySet<string> = new Set(['plugType'])

const isTelling = (word: string): boolean => !untellingWords.has(word)

/** The words of an option's label, and the single words that hobbyists have for it. */
export const describeOption = (kind: KindKey, key: string, { label, value }: Option): readonly string[] => {
  if (untellingKeys.has(key)) return []
  const said = filterChoices.flatMap(([phrase, choice]) =>
    choice.kind === kind && choice.key === key && String(choice.value) === value && !phrase.includes(' ')
      ? [phrase]
      : [],
  )
  return [label, ...said].flatMap(toTokens).filter(isTelling)
}

/** The words for a thing that a piece has, such as "surge protected". */
export const describeTrue = ({ label }: Attribute): readonly string[] => toTokens(label).filter(isTelling)

const listWords = (kind: KindKey, attribute: Attribute): readonly string[] => {
  if (attribute.type === 'boolean') return describeTrue(attribute)
  if (attribute.type !== 'choice' && attribute.type !== 'set') return []
  return attribute.options.flatMap((option) => describeOption(kind, attribute.key, option))
}

/** Words that say which of a kind, such as "titanium" of a heater. */
export const optionWordsOf: ReadonlyMap<KindKey, ReadonlySet<string>> = new Map(
  kindKeys.map((kind) => [kind, new Set(kinds[kind].attributes.flatMap((attribute) => listWords(kind, attribute)))]),
)

const shortestGuess = 5
const allWords: ReadonlySet<string> = new Set([...optionWordsOf.values()].flatMap((words) => [...words]))
const guessable = [...allWords].filter((word) => word.length >= shortestGuess && !/\d/.test(word))

/** Option words that this may be, with a slip or two of the finger. */
export const guessOptionWords = (word: string): readonly string[] => {
  if (word.length < shortestGuess || /\d/.test(word) || allWords.has(word)) return []
  const most = word.length < 9 ? 1 : 2
  return guessable.filter((known) => measureDistance(known, word, most) <= most)
}
