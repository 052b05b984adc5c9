import { amountIn, printAmount, type Amount } from './amounts'
import { readBounded } from './bounded'
import { findBound, findDimension } from './cues'
import { acceptsLength, chooseLengthField } from './length-fields'
import { giveUnits } from './length-units'
import type { Landmark } from './landmarks'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import type { Reading } from './reading'
import type { Dimension } from './words/dimension-words'
import { chooseLengthKey } from './words/piece-keys'

const largestGrainMm = 8
/** How far a length reaches for its subject; the second and third of a row that say what they are reach back to the first's. */
const reach = { plain: 12, named: 30 } as const

/** The attribute of the piece that a length narrows; undefined where it is of the setup. */
const choosePieceKey = (
  { kind }: Reading,
  landmark: Landmark | undefined,
  dimension: Dimension | undefined,
  mm: number,
): string | undefined => {
  if (kind === null) return undefined
  if (landmark?.subject === 'cord') return 'cordMm'
  const isOfSand = landmark?.subject === 'sand' || landmark?.kind === 'sand'
  if (isOfSand) return kind === 'sand' && mm <= largestGrainMm && dimension === undefined ? 'grain' : undefined
  const isOfPiece = landmark === undefined || landmark.kind === kind
  return isOfPiece && kind !== 'tank' ? chooseLengthKey(kind, dimension) : undefined
}

const isCube = ({ tokens }: Reading, landmark: Landmark | undefined): boolean =>
  landmark?.subject === 'tank' && tokens[landmark.from]?.text === 'cube'

const fillCube = ({ draft }: Reading, amount: Amount): boolean =>
  ['tank.outerLengthMm', 'tank.outerWidthMm', 'tank.outerHeightMm'].filter((path) => draft.setAmount(path, amount))
    .length > 0

/** The number with what bounds it: "shorter than 8 in". */
const withBound = (measure: Measure, bound: { readonly from: number; readonly to: number } | undefined): Measure =>
  bound === undefined
    ? measure
    : { ...measure, from: Math.min(measure.from, bound.from), to: Math.max(measure.to, bound.to) }

/** How high a pump lifts is the length of nothing: what a pump gives at a head is its curve's to tell. */
const liftWords: ReadonlySet<string> = new Set(['head', 'lift', 'rise'])

/** Reads a length with a unit, or a bare number that a word of dimension stands beside. */
export const readLength = (reading: Reading, measure: Measure): boolean => {
  const quantities = new Set(measure.amounts.map(({ quantity }) => quantity))
  if (measure.shape === 'size' || [...quantities].some((quantity) => quantity !== undefined && quantity !== 'length')) {
    return false
  }
  if (liftWords.has(reading.tokens[measure.to]?.text ?? '')) return false
  const { draft } = reading
  const dimension = findDimension(reading, measure)
  const amounts =
    dimension === undefined && !quantities.has('length') ? [] : giveUnits(reading, measure, 'chamber').amounts
  const amount = amounts.at(-1)
  if (amount === undefined) return false
  const mm = amountIn(amount, 'mm')
  const bound = findBound(reading, measure)
  const near = findNearest(reading, withBound(measure, bound), acceptsLength(reading, mm, dimension?.means))
  const farthest = dimension === undefined ? reach.plain : reach.named
  const landmark = near !== undefined && near.cost <= farthest ? near.landmark : undefined
  const cues = [dimension, bound, landmark].filter((cue) => cue !== undefined)

  const key = choosePieceKey(reading, landmark, dimension?.means, mm)
  if (key !== undefined) {
    return readBounded(reading, { ...measure, amounts }, { key, unit: 'mm', bound: bound?.means, loose: true }, cues)
  }
  const isOfCube = isCube(reading, landmark) && (dimension === undefined || dimension.means === 'long')
  const target = chooseLengthField(reading, landmark, dimension?.means, mm)
  if (target === undefined || !(isOfCube ? fillCube(reading, amount) : draft.setAmount(target.path, amount)))
    return false
  const meaning = isOfCube ? `cube of ${printAmount(amount)}` : `${target.name} ${printAmount(amount)}`
  draft.note({ meaning, path: target.path }, measure, ...cues)
  return true
}
