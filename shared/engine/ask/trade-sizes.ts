import { namedUnits } from '../../units/unit-names'
import { createAmount } from './amounts'
import type { Measure } from './measures'
import type { Reading } from './reading'

/**
 * Outside length × width × height in inches that North American shops mean by a name. Common practice, no published
 * standard: makers differ by a fraction of an inch, so the meaning says where the size comes from.
 */
const sizes: Readonly<Record<string, readonly [number, number, number]>> = {
  '20 long': [30, 12, 12],
  '20 high': [24, 12, 16],
  '20 tall': [24, 12, 16],
  '33 long': [48, 13, 12],
  '40 breeder': [36, 18, 16],
}
const keys = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'] as const
const gallon = namedUnits.volume.find((unit) => unit.symbol === 'gal')
const inch = namedUnits.length.find((unit) => unit.symbol === 'in')

/** "20 long" next to "12 wide" is twenty inches. */
const isDimension = ({ tokens }: Reading): boolean =>
  tokens.some(({ text }) => text === 'wide' || text === 'deep' || text === 'width')

/** Reads "40 breeder" and the few other sizes that the trade calls by a name. */
export const readTradeSize = (reading: Reading, measure: Measure): boolean => {
  const { tokens, draft } = reading
  const [amount] = measure.amounts
  const unit = amount?.parts[0]?.unit
  if (measure.shape !== 'single' || amount === undefined || (unit !== undefined && unit !== gallon)) return false
  const gallons = amount.parts[0]?.value ?? 0
  const word = tokens[measure.to]?.text ?? ''
  const size = Object.hasOwn(sizes, `${gallons} ${word}`) ? sizes[`${gallons} ${word}`] : undefined
  if (size === undefined || isDimension(reading)) return false
  const volume = createAmount(gallons, 'volume', gallon)
  if (!draft.setAmount('tank.volumeL', volume)) return false
  keys.forEach((key, index) => {
    const side = createAmount(size[index] ?? 0, 'length', inch)
    draft.setAmount(`tank.${key}`, side)
  })
  const meaning = `tank of ${gallons} gal, ${size.join(' × ')} in as the trade sells a "${gallons} ${word}"`
  draft.note({ meaning, path: 'tank.volumeL' }, { from: measure.from, to: measure.to + 1 })
  return true
}
