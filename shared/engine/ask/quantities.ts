import type { CanonicalUnit } from '../../units/units'
import { amountIn, printAmount } from './amounts'
import { readBounded } from './bounded'
import { findBound } from './cues'
import type { Measure } from './measures'
import { findNearest, type Near } from './nearest'
import type { Reading } from './reading'
import { pieceKeys } from './words/piece-keys'
import type { Subject } from './words/subject-words'

const nearEnough = 6

/** The nearest of some subjects, if it stands beside the measure. */
const findBeside = (reading: Reading, measure: Measure, ...subjects: readonly Subject[]): Near | undefined => {
  const near = findNearest(reading, measure, ({ subject }) => subject !== undefined && subjects.includes(subject))
  return near !== undefined && near.cost <= nearEnough ? near : undefined
}

const setPlain = (
  reading: Reading,
  measure: Measure,
  path: string,
  name: string,
  unit: CanonicalUnit,
  near?: Near,
): boolean => {
  const amount = measure.amounts.at(-1)
  if (amount === undefined || !reading.draft.setField(path, amountIn(amount, unit), printAmount(amount))) return false
  const cues = near === undefined ? [] : [near.landmark]
  reading.draft.note({ meaning: `${name} ${printAmount(amount)}`, path }, measure, ...cues)
  return true
}

const readPiece = (reading: Reading, measure: Measure): boolean => {
  const { kind } = reading
  const quantity = measure.amounts[0]?.quantity
  const piece = kind === null || quantity === undefined ? undefined : pieceKeys[kind]?.[quantity]
  if (piece === undefined) return false
  const bound = findBound(reading, measure)
  return readBounded(
    reading,
    measure,
    { ...piece, bound: bound?.means ?? piece.bound },
    bound === undefined ? [] : [bound],
  )
}

const readVolume = (reading: Reading, measure: Measure): boolean => {
  const { kind } = reading
  const reservoir = findBeside(reading, measure, 'reservoir')
  if (reservoir !== undefined && kind === 'auto-top-off') {
    const bound = findBound(reading, measure)
    return readBounded(reading, measure, { key: 'reservoirL', unit: 'L', bound: bound?.means, loose: true }, [
      reservoir.landmark,
    ])
  }
  const change = findBeside(reading, measure, 'water-change')
  const tank = findNearest(reading, measure, ({ subject }) => subject === 'tank')
  if (change !== undefined && (tank === undefined || change.cost < tank.cost)) return false
  const bound = findBound(reading, measure)
  const cues = [bound, tank !== undefined && tank.cost <= 1 ? tank.landmark : undefined].filter(
    (cue) => cue !== undefined,
  )
  if (kind === 'tank' && (bound !== undefined || measure.shape === 'range')) {
    return readBounded(reading, measure, { key: 'nominalVolumeL', unit: 'L', bound: bound?.means }, cues)
  }
  const amount = measure.amounts.at(-1)
  if (amount === undefined || !reading.draft.setField('tank.volumeL', amountIn(amount, 'L'), printAmount(amount)))
    return false
  reading.draft.note({ meaning: `tank of ${printAmount(amount)}`, path: 'tank.volumeL' }, measure, ...cues)
  return true
}

const readFlow = (reading: Reading, measure: Measure): boolean => {
  const isWeekly = measure.amounts.at(-1)?.parts[0]?.unit?.symbol.endsWith('/week') ?? false
  if (isWeekly)
    return setPlain(
      reading,
      measure,
      'water.litresPerWeek',
      'pure water',
      'L/wk',
      findBeside(reading, measure, 'water-change'),
    )
  return readPiece(reading, measure)
}

const nominalVolts = (volts: number): 100 | 120 | 230 | undefined => {
  if (volts === 100) return 100
  if (volts >= 105 && volts <= 130) return 120
  return volts >= 210 && volts <= 250 ? 230 : undefined
}

const readVolts = (reading: Reading, measure: Measure): boolean => {
  const typed = measure.amounts[0]
  const volts = typed === undefined || measure.shape !== 'single' ? undefined : nominalVolts(amountIn(typed, 'V'))
  if (volts === undefined || !reading.draft.setField('mains.volts', volts, String(volts))) return false
  reading.draft.note({ meaning: `mains ${volts} V`, path: 'mains.volts' }, measure)
  return true
}

const readTurnover = (reading: Reading, measure: Measure): boolean => {
  const [first, last] = [measure.amounts[0], measure.amounts.at(-1)]
  if (
    first === undefined ||
    last === undefined ||
    !reading.draft.setField('goals.turnoverPerHour.0', amountIn(first, '/h'), printAmount(first))
  )
    return false
  reading.draft.setField('goals.turnoverPerHour.1', amountIn(last, '/h'), printAmount(last))
  const numbers = first === last ? printAmount(last) : `${printAmount(first, false)} to ${printAmount(last)}`
  reading.draft.note({ meaning: `turnover ${numbers}`, path: 'goals.turnoverPerHour.0' }, measure)
  return true
}

const readMass = (reading: Reading, measure: Measure): boolean => {
  const rock = findBeside(reading, measure, 'rock')
  if (rock !== undefined || reading.kind === 'rock')
    return setPlain(reading, measure, 'goals.rockKg', 'rock', 'kg', rock)
  return readPiece(reading, measure)
}

const readers: Readonly<Partial<Record<string, (reading: Reading, measure: Measure) => boolean>>> = {
  volume: readVolume,
  flow: readFlow,
  voltage: readVolts,
  turnover: readTurnover,
  mass: readMass,
  power: readPiece,
  current: (reading, measure) => {
    const near = findBeside(reading, measure, 'mains')
    return near === undefined
      ? readPiece(reading, measure)
      : setPlain(reading, measure, 'mains.circuitA', 'circuit', 'A', near)
  },
  pressure: (reading, measure) =>
    setPlain(reading, measure, 'water.feedKPa', 'tap pressure', 'kPa', findBeside(reading, measure, 'feed')),
  salinity: (reading, measure) =>
    setPlain(reading, measure, 'goals.salinityPpt', 'salinity', 'ppt', findBeside(reading, measure, 'salinity')),
  concentration: (reading, measure) =>
    setPlain(reading, measure, 'water.feedTdsPpm', 'tap dissolved solids', 'ppm', findBeside(reading, measure, 'feed')),
  fraction: (reading, measure) => {
    const near = findBeside(reading, measure, 'humidity')
    return near !== undefined && setPlain(reading, measure, 'room.relativeHumidity', 'humidity', 'fraction', near)
  },
}

/** Reads volumes, powers, flows, volts and whatever else has its own unit, lengths and temperatures aside. */
export const readQuantity = (reading: Reading, measure: Measure): boolean => {
  const quantity = measure.amounts[0]?.quantity
  return quantity !== undefined && (readers[quantity]?.(reading, measure) ?? false)
}
