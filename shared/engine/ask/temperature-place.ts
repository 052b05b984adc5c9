import { findSeason } from './cues'
import type { Landmark } from './landmarks'
import type { Measure } from './measures'
import { findNearest, type Near } from './nearest'
import type { Mention } from './phrases'
import type { Reading } from './reading'
import type { Season } from './words/season-words'
import { stopWords } from './words/stop-words'

export interface TemperaturePlace {
  readonly of: 'room' | 'water' | 'feed' | undefined
  readonly landmark: Landmark | undefined
  readonly season: Mention<Season> | undefined
}

/** A bare number is a temperature only this close to a word of room or water. */
const nearEnough = 8
const adjacent = 1

/** Words that only temperatures of rooms go with. */
const seasonal: ReadonlySet<string> = new Set(
  'winter winters summer summers night nights overnight coldest warmest hottest day daytime'.split(' '),
)
const seasonReach = { before: 4, after: 3 } as const

/** "up to 84 in summer" needs no word of the room. */
const isSeasonal = ({ tokens, measureAt }: Reading, measure: Measure): boolean => {
  const after = tokens.slice(measure.to, measure.to + seasonReach.after)
  const before = tokens.slice(Math.max(0, measure.from - seasonReach.before), measure.from).reverse()
  const endOf = (row: typeof tokens, at: (index: number) => number) => {
    const end = row.findIndex(({ type }, index) => type === 'stop' || measureAt.has(at(index)))
    return end === -1 ? row : row.slice(0, end)
  }
  const near = [...endOf(after, (index) => measure.to + index), ...endOf(before, (index) => measure.from - 1 - index)]
  return near.some(({ text }) => seasonal.has(text))
}

/** "10 outlets": a bare number before a word of substance counts that. */
const countsSomething = ({ tokens }: Reading, measure: Measure): boolean => {
  const next = tokens[measure.to]
  return next?.type === 'word' && !stopWords.has(next.text)
}

const isAcrossStop = ({ tokens }: Reading, measure: Measure, { landmark }: Near): boolean =>
  landmark.from >= measure.to && tokens.slice(measure.to, landmark.from).some(({ type }) => type === 'stop')

/** "tank 78F"; of a tank further off, the temperature is rather its room's. */
const findTankBefore = ({ landmarkAt, tokens }: Reading, measure: Measure): Landmark | undefined => {
  const before = ['is', 'at', ':'].includes(tokens[measure.from - 1]?.text ?? '') ? measure.from - 2 : measure.from - 1
  const landmark = landmarkAt.get(before)
  return landmark?.subject === 'tank' ? landmark : undefined
}

const findSeasonBeside = (measure: Measure, season: Mention<Season> | undefined): boolean =>
  season !== undefined &&
  (season.to === measure.from || (season.from >= measure.to && season.from - measure.to <= adjacent))

/**
 * What a temperature is of. Words of the water ("keep it at") count where they are nearer than the room's, unless a
 * word of the seasons stands right beside the number; across a comma they belong to the next number.
 */
export const findTemperaturePlace = (
  reading: Reading,
  measure: Measure,
  isTyped: boolean,
): TemperaturePlace | undefined => {
  const season = findSeason(reading, measure)
  if (!isTyped && season?.from !== measure.to && countsSomething(reading, measure)) return undefined
  const isSubject = ({ subject }: Landmark) =>
    subject === 'room' || subject === 'water' || subject === 'feed' || subject === 'outdoors'
  const first = findNearest(reading, measure, isSubject)
  if (first?.landmark.subject === 'outdoors') return undefined
  const isWaterElsewhere =
    first?.landmark.subject === 'water' &&
    (isAcrossStop(reading, measure, first) || (findSeasonBeside(measure, season) && first.cost > adjacent))
  const near = isWaterElsewhere ? findNearest(reading, measure, ({ subject }) => subject === 'room') : first
  const isElsewhere = near !== undefined && !isTyped && season === undefined && isAcrossStop(reading, measure, near)
  const isNear = near !== undefined && !isElsewhere && (isTyped || near.cost <= nearEnough || season !== undefined)
  const tank = season === undefined && !(isNear && near.cost <= adjacent) ? findTankBefore(reading, measure) : undefined
  if (tank !== undefined) return { of: 'water', landmark: tank, season: undefined }
  if (!isNear) {
    const isOfRoom = season !== undefined && (isTyped || isSeasonal(reading, measure))
    return isTyped || isOfRoom ? { of: isOfRoom ? 'room' : undefined, landmark: undefined, season } : undefined
  }
  const of = near.landmark.subject === 'water' || near.landmark.subject === 'feed' ? near.landmark.subject : 'room'
  return { of, landmark: near.landmark, season: of === 'room' ? season : undefined }
}
