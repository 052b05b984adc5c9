import { amountIn, printAmount } from './amounts'
import { findBeside } from './beside'
import { readBounded } from './bounded'
import { findBound } from './cues'
import type { Measure } from './measures'
import type { Near } from './nearest'
import type { Reading } from './reading'
import { readTurnover } from './turnover'
import { readVolume } from './volumes'
import { pieceKeys } from './words/piece-keys'

const setPlain = (reading: Reading, measure: Measure, path: string, name: string, near?: Near): boolean => {
  const amount = measure.amounts.at(-1)
  if (amount === undefined || !reading.draft.setAmount(path, amount)) return false
  const cues = near === undefined ? [] : [near.landmark]
  reading.draft.note({ meaning: `${name} ${printAmount(amount)}`, path }, measure, ...cues)
  return true
}

const mostPieces = 9

/** "two 100 W heaters" on one controller are 200 W. */
const countPieces = (
  { kind, measureAt }: Reading,
  measure: Measure,
): { readonly count: number; readonly cue?: Measure } => {
  const before = kind === 'temperature-controller' ? measureAt.get(measure.from - 1) : undefined
  const amount = before?.shape === 'single' && before.amounts[0]?.quantity === undefined ? before.amounts[0] : undefined
  const count = amount?.parts[0]?.value ?? 1
  if (before === undefined || !Number.isInteger(count) || count < 2 || count > mostPieces) return { count: 1 }
  return { count, cue: before }
}

const multiply = (measure: Measure, count: number): Measure => ({
  ...measure,
  amounts: measure.amounts.map((amount) => ({
    ...amount,
    parts: amount.parts.map((part) => ({ ...part, value: part.value * count })),
  })),
})

const readPiece = (reading: Reading, measure: Measure): boolean => {
  const { kind } = reading
  const quantity = measure.amounts[0]?.quantity
  const piece = kind === null || quantity === undefined ? undefined : pieceKeys[kind]?.[quantity]
  if (piece === undefined) return false
  const bound = findBound(reading, measure)
  const { count, cue } = countPieces(reading, measure)
  const cues = [bound, cue].filter((each) => each !== undefined)
  return readBounded(reading, multiply(measure, count), { ...piece, bound: bound?.means ?? piece.bound }, cues)
}

const readFlow = (reading: Reading, measure: Measure): boolean => {
  const isWeekly = measure.amounts.at(-1)?.parts[0]?.unit?.symbol.endsWith('/week') ?? false
  if (isWeekly)
    return setPlain(reading, measure, 'water.litresPerWeek', 'pure water', findBeside(reading, measure, 'water-change'))
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

const readMass = (reading: Reading, measure: Measure): boolean => {
  const rock = findBeside(reading, measure, 'rock')
  if (rock !== undefined || reading.kind === 'rock') return setPlain(reading, measure, 'goals.rockKg', 'rock', rock)
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
      : setPlain(reading, measure, 'mains.circuitA', 'circuit', near)
  },
  pressure: (reading, measure) =>
    setPlain(reading, measure, 'water.feedKPa', 'tap pressure', findBeside(reading, measure, 'feed')),
  salinity: (reading, measure) =>
    setPlain(reading, measure, 'goals.salinityPpt', 'salinity', findBeside(reading, measure, 'salinity')),
  concentration: (reading, measure) =>
    setPlain(reading, measure, 'water.feedTdsPpm', 'tap dissolved solids', findBeside(reading, measure, 'feed')),
  fraction: (reading, measure) => {
    const near = findBeside(reading, measure, 'humidity')
    return near !== undefined && setPlain(reading, measure, 'room.relativeHumidity', 'humidity', near)
  },
}

/** Reads volumes, powers, flows, volts and whatever else has its own unit, lengths and temperatures aside. */
export const readQuantity = (reading: Reading, measure: Measure): boolean => {
  const quantity = measure.amounts[0]?.quantity
  return quantity !== undefined && (readers[quantity]?.(reading, measure) ?? false)
}
