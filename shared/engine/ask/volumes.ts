import { findNamedUnit, fromCanonical } from '../../units/convert'
import { amountIn, createAmount, printAmount } from './amounts'
import { findBeside } from './beside'
import { readBounded } from './bounded'
import { findBound } from './cues'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import type { Reading } from './reading'

/** Reads a volume: the tank's, unless it is of a reservoir, of a water change, or of the tank that is looked for. */
export const readVolume = (reading: Reading, measure: Measure): boolean => {
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
  if (amount === undefined || !reading.draft.setAmount('tank.volumeL', amount)) return false
  reading.draft.note({ meaning: `tank of ${printAmount(amount)}`, path: 'tank.volumeL' }, measure, ...cues)
  return true
}

/** "1 lb per gallon" of rock, once the tank's volume is read. */
export const readRockPerVolume = (reading: Reading, measure: Measure): boolean => {
  const litres = reading.draft.fields['tank.volumeL']?.value
  const amount = measure.amounts.at(-1)
  const isRock = reading.kind === 'rock' || findBeside(reading, measure, 'rock') !== undefined
  if (!isRock || amount?.quantity !== 'density' || typeof litres !== 'number') return false
  const symbol = amount.parts[0]?.unit?.symbol.startsWith('lb') ? 'lb' : 'kg'
  const mass = fromCanonical(amountIn(amount, 'kg/L') * litres, 'kg', symbol)
  const rock = createAmount(Number(mass.toPrecision(4)), 'mass', findNamedUnit(symbol, 'kg'))
  if (!reading.draft.setAmount('goals.rockKg', rock)) return false
  reading.draft.note(
    { meaning: `rock ${printAmount(amount)}, ${printAmount(rock)} in all`, path: 'goals.rockKg' },
    measure,
  )
  return true
}
