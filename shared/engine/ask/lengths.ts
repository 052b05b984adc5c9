import { getAttribute, type KindKey } from '../../kinds/index'
import { amountIn, printAmount, type Amount } from './amounts'
import { readBounded } from './bounded'
import { findBound, findDimension } from './cues'
import { giveUnits } from './length-units'
import type { Landmark } from './landmarks'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import type { Mention } from './phrases'
import type { Reading } from './reading'
import { chooseLengthKey } from './words/piece-keys'
import type { Dimension } from './words/dimension-words'

const thickestWallMm = 50
const deepestSandMm = 300
const largestGrainMm = 8
/** How far a length reaches for its subject; the second and third of a row that say what they are reach back to the first's. */
const reach = { plain: 12, named: 30 } as const

interface Field {
  readonly path: string
  readonly name: string
}

const field = (path: string, name: string): Field => ({ path, name })

const tankFields: Readonly<Partial<Record<Dimension, Field>>> = {
  long: field('tank.outerLengthMm', 'tank length'),
  wide: field('tank.outerWidthMm', 'tank width'),
  'front-to-back': field('tank.outerWidthMm', 'tank width'),
  deep: field('tank.outerHeightMm', 'tank height'),
  tall: field('tank.outerHeightMm', 'tank height'),
  water: field('tank.waterLineMm', 'water line'),
  thick: field('tank.wallMm', 'wall'),
}

/** Below the path of the chamber. */
const chamberFields: Readonly<Partial<Record<Dimension, Field>>> = {
  long: field('lengthMm', 'chamber length'),
  wide: field('widthMm', 'chamber width'),
  'front-to-back': field('widthMm', 'chamber width'),
  deep: field('waterDepthMm', 'chamber water depth'),
  tall: field('heightMm', 'chamber height'),
  water: field('waterDepthMm', 'chamber water depth'),
}

const simple: Readonly<Partial<Record<NonNullable<Landmark['subject']>, Field>>> = {
  ceiling: field('room.ceilingMm', 'ceiling'),
  'water-line': field('tank.waterLineMm', 'water line'),
  'stand-height': field('room.tankTopMm', 'top edge of the tank'),
}

const lastChamber = ({ draft }: Reading): number =>
  Math.max(0, ...Object.keys(draft.fields).map((path) => Number(/^tank\.chambers\.(\d+)\./.exec(path)?.[1] ?? 0)))

const chooseField = (
  reading: Reading,
  landmark: Landmark | undefined,
  dimension: Dimension | undefined,
  mm: number,
): Field | undefined => {
  const subject = landmark?.subject
  if (dimension === 'thick' || subject === 'wall')
    return mm <= thickestWallMm ? field('tank.wallMm', 'wall') : undefined
  if (subject === 'sand' && mm <= deepestSandMm) return field('goals.sandDepthMm', 'sand')
  if (subject === 'chamber') {
    const side = dimension && chamberFields[dimension]
    return side && field(`tank.chambers.${lastChamber(reading)}.${side.path}`, side.name)
  }
  if (subject === 'support' || landmark?.kind === 'stand') {
    if (dimension === 'deep' || dimension === 'wide') return field('support.widthMm', 'surface')
    return dimension === 'tall' ? undefined : field('support.lengthMm', 'surface')
  }
  if (subject !== undefined && simple[subject]) return simple[subject]
  if (subject !== 'tank') return undefined
  if (dimension === 'deep' && reading.hasHeight) return tankFields.wide
  return tankFields[dimension ?? 'long']
}

/** 12 mm is no reach of an arm and no length of a heater, whatever stands beside it. */
const isBelievable = (kind: KindKey, mm: number): boolean => {
  const key = chooseLengthKey(kind, undefined)
  const attribute = key === undefined ? undefined : getAttribute(kind, key)
  return attribute?.type !== 'measure' || mm >= attribute.usual[0] / 2
}

const acceptsLength =
  (reading: Reading, mm: number, dimension: Dimension | undefined) =>
  (landmark: Landmark): boolean => {
    const { subject, kind } = landmark
    if (dimension === 'water') return subject === 'chamber' || subject === 'tank'
    if (kind !== undefined && kind === reading.kind && kind !== 'tank' && isBelievable(kind, mm)) return true
    if (kind === 'stand') return true
    if (subject === 'wall') return mm <= thickestWallMm
    if (subject === 'sand') return mm <= deepestSandMm
    return (
      subject !== undefined &&
      (subject === 'chamber' || subject === 'tank' || subject === 'support' || subject === 'cord' || subject in simple)
    )
  }

const isCube = ({ tokens }: Reading, landmark: Landmark | undefined): boolean =>
  landmark?.subject === 'tank' && tokens[landmark.from]?.text === 'cube'

const fillCube = ({ draft }: Reading, amount: Amount): boolean => {
  const filled = ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'].filter((key) =>
    draft.setAmount(`tank.${key}`, amount),
  )
  return filled.length > 0
}

const isPieces = (reading: Reading, landmark: Landmark | undefined): boolean =>
  landmark?.kind !== undefined && landmark.kind === reading.kind && landmark.kind !== 'tank'

/** Reads a length with a unit, or a bare number that a word of dimension stands beside. */
export const readLength = (reading: Reading, measure: Measure): boolean => {
  if (measure.shape === 'size') return false
  const { draft, kind } = reading
  const dimension: Mention<Dimension> | undefined = findDimension(reading, measure)
  const isTyped = measure.amounts.some(({ quantity }) => quantity === 'length')
  if (measure.amounts.some(({ quantity }) => quantity !== undefined && quantity !== 'length')) return false
  if (!isTyped && dimension === undefined) return false
  const { amounts } = giveUnits(reading, measure, 'chamber')
  const amount = amounts.at(-1)
  if (amount === undefined) return false
  const mm = amountIn(amount, 'mm')
  const bound = findBound(reading, measure)
  const near = findNearest(reading, measure, acceptsLength(reading, mm, dimension?.means))
  const landmark =
    near !== undefined && near.cost <= (dimension === undefined ? reach.plain : reach.named) ? near.landmark : undefined
  const cues = [dimension, bound, landmark].filter((cue) => cue !== undefined)
  const isGrain =
    (landmark?.subject === 'sand' || landmark?.kind === 'sand') &&
    kind === 'sand' &&
    mm <= largestGrainMm &&
    dimension === undefined
  const isBelowPiece = isPieces(reading, landmark) && !(landmark?.subject === 'sand' && !isGrain)
  const isLoose = landmark === undefined && kind !== null && kind !== 'tank'
  if (isGrain || isBelowPiece || isLoose || landmark?.subject === 'cord') {
    const isCord = landmark?.subject === 'cord'
    const key = isCord ? 'cordMm' : isGrain ? 'grain' : kind && chooseLengthKey(kind, dimension?.means)
    return key
      ? readBounded(reading, { ...measure, amounts }, { key, unit: 'mm', bound: bound?.means, loose: true }, cues)
      : false
  }
  if (isCube(reading, landmark) && (dimension === undefined || dimension.means === 'long')) {
    if (!fillCube(reading, amount)) return false
    draft.note({ meaning: `cube of ${printAmount(amount)}`, path: 'tank.outerLengthMm' }, measure, ...cues)
    return true
  }
  const target = chooseField(reading, landmark, dimension?.means, mm)
  if (target === undefined || !draft.setAmount(target.path, amount)) return false
  draft.note({ meaning: `${target.name} ${printAmount(amount)}`, path: target.path }, measure, ...cues)
  return true
}
