import { indexPhrases, matchAt, type Mention, type PhraseIndex } from './phrases'
import type { Measure } from './measures'
import type { Reading } from './reading'
import { boundsAfter, boundsBefore, type Bound } from './words/compare-words'
import { dimensionLetters, dimensionOf, type Dimension } from './words/dimension-words'
import { seasonPhrases, type Season } from './words/season-words'

const longestPhrase = 4
const seasons = indexPhrases(seasonPhrases)
const before = indexPhrases(boundsBefore)
const after = indexPhrases(boundsAfter)
/** "11 in water", while "above water 10 in" is of something else. */
const water = indexPhrases<Dimension>([['water', 'water']])
/** "W 5 in L 4 in". */
const letters = indexPhrases<Dimension>(dimensionLetters)
const dimensions = indexPhrases<Dimension>([
  ...dimensionOf,
  ['front to back', 'front-to-back'],
  ['of water', 'water'],
  ['in diameter', 'across'],
  ['in length', 'long'],
  ['in width', 'wide'],
  ['in depth', 'deep'],
  ['in height', 'tall'],
  ['of depth', 'deep'],
  ['of height', 'tall'],
  ['water depth', 'water'],
  ['depth of water', 'water'],
])

/** The phrase nearest before a measure, with no more than `gap` other words between, in the same clause. */
const lookBack = <T>(
  reading: Reading,
  measure: Measure,
  index: PhraseIndex<T>,
  gap: number,
  stops: boolean,
): Mention<T> | undefined => {
  const { tokens, measureAt, draft } = reading
  for (let end = measure.from; end >= measure.from - gap; end--) {
    const passed = tokens[end]
    if (end < measure.from && (passed === undefined || measureAt.has(end) || (stops && passed.type === 'stop')))
      return undefined
    for (let length = longestPhrase; length > 0; length--) {
      const mention = matchAt(index, tokens, end - length)
      const isFree = mention?.to === end && !draft.isUsed(mention.from) && !measureAt.has(mention.from)
      if (mention !== undefined && isFree) return mention
    }
  }
  return undefined
}

const lookAhead = <T>(
  reading: Reading,
  measure: Measure,
  index: PhraseIndex<T>,
  gap: number,
): Mention<T> | undefined => {
  const { tokens, measureAt, draft } = reading
  for (let at = measure.to; at <= measure.to + gap; at++) {
    const token = tokens[at]
    if (token === undefined || token.type === 'stop' || measureAt.has(at)) return undefined
    if (at > measure.to && (token.text === 'and' || token.text === 'but')) return undefined
    const mention = matchAt(index, tokens, at)
    if (mention !== undefined && !draft.isUsed(at)) return mention
  }
  return undefined
}

/** "under 10 in", "10 in or less". */
export const findBound = (reading: Reading, measure: Measure): Mention<Bound> | undefined =>
  lookAhead(reading, measure, after, 0) ?? lookBack(reading, measure, before, 2, true)

/** "depth of 12", "12 deep". */
export const findDimension = (reading: Reading, measure: Measure): Mention<Dimension> | undefined =>
  lookBack(reading, measure, letters, 0, true) ??
  lookBack(reading, measure, dimensions, 3, true) ??
  lookAhead(reading, measure, dimensions, 0) ??
  lookAhead(reading, measure, water, 0)

/** "down to 60", "60 in winter"; whichever stands closer, before where neither does. */
export const findSeason = (reading: Reading, measure: Measure): Mention<Season> | undefined => {
  const earlier = lookBack(reading, measure, seasons, 6, true)
  const later = lookAhead(reading, measure, seasons, 4)
  if (earlier === undefined || later === undefined) return earlier ?? later
  return later.from - measure.to < measure.from - earlier.to ? later : earlier
}
