import { findShownUnit } from '../../units/convert'
import type { NamedUnit } from '../../units/unit-names'
import { namedUnits } from '../../units/unit-names'
import { amountIn, printAmount, withUnit, type Amount } from './amounts'
import { findSeason } from './cues'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import type { Reading } from './reading'
import type { Season } from './words/season-words'
import { stopWords } from './words/stop-words'

const scaleOf = (symbol: string): NamedUnit | undefined => namedUnits.temperature.find((unit) => unit.symbol === symbol)
/** °C that rooms and tanks have; a number without a scale is read on the one that puts it here. */
const likely = [5, 45] as const
/** °C that nearly all marine tanks are kept at; a temperature of nothing named is the water's between these. */
const waterBand = [22.5, 29.5] as const
const nearEnough = 8

const isLikely = (amount: Amount, unit: NamedUnit): boolean => {
  const celsius = amountIn(withUnit(amount, 'temperature', unit), 'C')
  return celsius >= likely[0] && celsius <= likely[1]
}

/** A scale typed in the text, else the system's, unless only the other makes sense. */
const chooseScale = (amount: Amount, { measures, system }: Reading): NamedUnit | undefined => {
  const typed = measures
    .flatMap(({ amounts }) => amounts)
    .find(({ quantity, parts }) => quantity === 'temperature' && parts[0]?.unit)
  const scales = [typed?.parts[0]?.unit, findShownUnit('C', system), scaleOf('°F'), scaleOf('°C')]
  return scales.find((scale) => scale !== undefined && isLikely(amount, scale))
}

/** "10 outlets": a bare number before a word of substance counts that. */
const countsSomething = ({ tokens }: Reading, measure: Measure): boolean => {
  const next = tokens[measure.to]
  return next?.type === 'word' && !stopWords.has(next.text)
}

const pathOf: Readonly<Record<Season, string>> = {
  coldest: 'room.coldestC',
  warmest: 'room.warmestC',
  usual: 'room.temperatureC',
}
const nameOf: Readonly<Record<Season, string>> = {
  coldest: 'coldest room',
  warmest: 'warmest room',
  usual: 'usual room',
}

const guessPlace = (celsius: number): Season | 'water' => {
  if (celsius < waterBand[0]) return 'usual'
  return celsius <= waterBand[1] ? 'water' : 'warmest'
}

/** Reads a temperature, or a bare number beside words of temperature; false where it is neither. */
export const readTemperature = (reading: Reading, measure: Measure): boolean => {
  const { draft } = reading
  const isTyped = measure.amounts.some(({ quantity }) => quantity === 'temperature')
  if (measure.shape === 'size' || (!isTyped && measure.amounts.some(({ quantity }) => quantity !== undefined)))
    return false
  const near = findNearest(
    reading,
    measure,
    ({ subject }) => subject === 'room' || subject === 'water' || subject === 'feed',
  )
  const season = findSeason(reading, measure)
  if (!isTyped && season?.from !== measure.to && countsSomething(reading, measure)) return false
  const place = near !== undefined && (isTyped || near.cost <= nearEnough || season !== undefined) ? near : undefined
  if (!isTyped && place === undefined) return false
  const amounts = measure.amounts.map((amount) => {
    const scale = amount.parts[0]?.unit ?? chooseScale(amount, reading)
    return scale === undefined ? undefined : withUnit(amount, 'temperature', scale)
  })
  const first = amounts[0]
  const last = amounts.at(-1)
  if (first === undefined || last === undefined) return false
  const isWater = place?.landmark.subject === 'water'
  const cues = [place?.landmark, isWater ? undefined : season].filter((cue) => cue !== undefined)
  const text = (amount: Amount) => printAmount(amount)
  const say = (path: string, meaning: string, amount: Amount) => {
    if (!draft.setField(path, amountIn(amount, 'C'), text(amount))) return false
    draft.note({ meaning: `${meaning} ${text(amount)}`, path }, measure, ...cues)
    return true
  }
  if (place?.landmark.subject === 'feed') return say('water.feedTempC', 'tap water', first)
  const isRoom = place?.landmark.subject === 'room' || (!isWater && season !== undefined)
  if (measure.shape === 'range') return readRange(reading, measure, first, last, isRoom || place === undefined, cues)
  const target = isRoom ? (season?.means ?? 'usual') : place === undefined ? guessPlace(amountIn(first, 'C')) : 'water'
  return target === 'water' ? say('goals.temperatureC', 'water', first) : say(pathOf[target], nameOf[target], first)
}

const readRange = (
  { draft }: Reading,
  measure: Measure,
  low: Amount,
  high: Amount,
  isRoom: boolean,
  cues: Parameters<Reading['draft']['note']>[2][],
): boolean => {
  const ends = [amountIn(low, 'C'), amountIn(high, 'C')] as const
  if (isRoom && (ends[0] < waterBand[0] || ends[1] > waterBand[1])) {
    if (!draft.setField('room.coldestC', ends[0], printAmount(low))) return false
    draft.setField('room.warmestC', ends[1], printAmount(high))
    draft.note(
      { meaning: `room ${printAmount(low, false)} to ${printAmount(high)}`, path: 'room.coldestC' },
      measure,
      ...cues,
    )
    return true
  }
  const unit = high.parts[0]?.unit
  const middle = { ...high, parts: [{ value: ((low.parts[0]?.value ?? 0) + (high.parts[0]?.value ?? 0)) / 2, unit }] }
  if (!draft.setField('goals.temperatureC', amountIn(middle, 'C'), printAmount(middle))) return false
  draft.note(
    { meaning: `water ${printAmount(middle)}, the middle of what was said`, path: 'goals.temperatureC' },
    measure,
    ...cues,
  )
  return true
}
