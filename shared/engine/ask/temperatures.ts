import { findShownUnit } from '../../units/convert'
import { namedUnits, type NamedUnit } from '../../units/unit-names'
import { amountIn, createAmount, printAmount, withUnit, type Amount } from './amounts'
import type { Measure } from './measures'
import type { Reading } from './reading'
import { findTemperaturePlace, type TemperaturePlace } from './temperature-place'
import type { Season } from './words/season-words'

const scaleOf = (symbol: string): NamedUnit | undefined => namedUnits.temperature.find((unit) => unit.symbol === symbol)
/** °C that rooms and tanks have; a number without a scale is read on the one that puts it here. */
const likely = [5, 45] as const
/** °C that nearly all marine tanks are kept at; a temperature of nothing named is the water's between these. */
const waterBand = [22.5, 29.5] as const

const isLikely = (amount: Amount, unit: NamedUnit): boolean => {
  const celsius = amountIn(withUnit(amount, 'temperature', unit), 'C')
  return celsius >= likely[0] && celsius <= likely[1]
}

/** A scale typed in the text, else the system's, unless only the other makes sense. */
const chooseScale = (amount: Amount, { scale: typed, system }: Reading): NamedUnit | undefined =>
  [typed, findShownUnit('C', system), scaleOf('°F'), scaleOf('°C')].find(
    (scale) => scale !== undefined && isLikely(amount, scale),
  )

const roomFields: Readonly<Record<Season, { readonly path: string; readonly name: string }>> = {
  coldest: { path: 'room.coldestC', name: 'coldest room' },
  warmest: { path: 'room.warmestC', name: 'warmest room' },
  usual: { path: 'room.temperatureC', name: 'room' },
}
const waterField = { path: 'goals.temperatureC', name: 'water' }
const feedField = { path: 'water.feedTempC', name: 'tap water' }

const guessField = (celsius: number) => {
  if (celsius < waterBand[0]) return roomFields.usual
  return celsius <= waterBand[1] ? waterField : roomFields.warmest
}

const readRange = (
  { draft }: Reading,
  measure: Measure,
  ends: readonly [Amount, Amount],
  place: TemperaturePlace,
): boolean => {
  const [low, high] = ends
  const cues = [place.landmark, place.season].filter((cue) => cue !== undefined)
  const [lowC, highC] = [amountIn(low, 'C'), amountIn(high, 'C')]
  const isInWaterBand = lowC >= waterBand[0] && highC <= waterBand[1]
  if (place.of === 'room' || (place.of === undefined && !isInWaterBand)) {
    if (!draft.setAmount('room.coldestC', low)) return false
    draft.setAmount('room.warmestC', high)
    const meaning = `room ${printAmount(low)} to ${printAmount(high)}`
    draft.note({ meaning, path: 'room.coldestC' }, measure, ...cues)
    return true
  }
  const middle = createAmount(
    ((low.parts[0]?.value ?? 0) + (high.parts[0]?.value ?? 0)) / 2,
    'temperature',
    high.parts[0]?.unit,
  )
  if (place.of === 'feed' || low.parts[0]?.unit !== high.parts[0]?.unit || !draft.setAmount(waterField.path, middle))
    return false
  draft.note(
    { meaning: `water ${printAmount(middle)}, the middle of what was said`, path: waterField.path },
    measure,
    ...cues,
  )
  return true
}

/** Reads a temperature, or a bare number beside words of temperature; false where it is neither. */
export const readTemperature = (reading: Reading, measure: Measure): boolean => {
  const quantities = new Set(measure.amounts.map(({ quantity }) => quantity))
  const isTyped = quantities.has('temperature')
  if (measure.shape === 'size' || (!isTyped && (quantities.size > 1 || !quantities.has(undefined)))) return false
  const place = findTemperaturePlace(reading, measure, isTyped)
  if (place === undefined) return false
  const [first, last] = [measure.amounts[0], measure.amounts.at(-1)].map((amount) => {
    const scale = amount && (amount.parts[0]?.unit ?? chooseScale(amount, reading))
    return amount && scale && withUnit(amount, 'temperature', scale)
  })
  if (first === undefined || last === undefined) return false
  if (measure.shape === 'range') return readRange(reading, measure, [first, last], place)
  const ofRoom = roomFields[place.season?.means ?? 'usual']
  const fields = { room: ofRoom, water: waterField, feed: feedField }
  const { path, name } = place.of === undefined ? guessField(amountIn(first, 'C')) : fields[place.of]
  if (!reading.draft.setAmount(path, first)) return false
  const cues = [place.landmark, place.season].filter((cue) => cue !== undefined)
  reading.draft.note({ meaning: `${name} ${printAmount(first)}`, path }, measure, ...cues)
  return true
}
