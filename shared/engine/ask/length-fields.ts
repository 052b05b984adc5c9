import { getAttribute, type KindKey } from '../../kinds/index'
import { lastChamber } from './chambers'
import type { Landmark } from './landmarks'
import type { Reading } from './reading'
import type { Dimension } from './words/dimension-words'
import { chooseLengthKey } from './words/piece-keys'

const thickestWallMm = 50
const deepestSandMm = 300

export interface LengthField {
  readonly path: string
  readonly name: string
}

type Fields = Readonly<Partial<Record<Dimension, LengthField>>>

const field = (path: string, name: string): LengthField => ({ path, name })

const tankFields: Fields = {
  long: field('tank.outerLengthMm', 'tank length'),
  wide: field('tank.outerWidthMm', 'tank width'),
  'front-to-back': field('tank.outerWidthMm', 'tank width'),
  deep: field('tank.outerHeightMm', 'tank height'),
  tall: field('tank.outerHeightMm', 'tank height'),
  water: field('tank.waterLineMm', 'water line'),
}

/** Below the path of the chamber. */
const chamberFields: Fields = {
  long: field('lengthMm', 'chamber length'),
  wide: field('widthMm', 'chamber width'),
  'front-to-back': field('widthMm', 'chamber width'),
  deep: field('waterDepthMm', 'chamber water depth'),
  tall: field('heightMm', 'chamber height'),
  water: field('waterDepthMm', 'chamber water depth'),
}

const sumpFields: Fields = {
  long: field('tank.sump.lengthMm', 'sump length'),
  wide: field('tank.sump.widthMm', 'sump width'),
  'front-to-back': field('tank.sump.widthMm', 'sump width'),
  deep: field('tank.sump.waterDepthMm', 'sump water depth'),
  water: field('tank.sump.waterDepthMm', 'sump water depth'),
}

const supportFields: Fields = {
  long: field('support.lengthMm', 'surface length'),
  wide: field('support.widthMm', 'surface width'),
  deep: field('support.widthMm', 'surface width'),
  'front-to-back': field('support.widthMm', 'surface width'),
}

const simple: Readonly<Record<string, LengthField>> = {
  ceiling: field('room.ceilingMm', 'ceiling'),
  'water-line': field('tank.waterLineMm', 'water line'),
  'stand-height': field('room.tankTopMm', 'top edge of the tank'),
}

/** The setup's field that a length fills, by what it is of and how it was called. */
export const chooseLengthField = (
  reading: Reading,
  landmark: Landmark | undefined,
  dimension: Dimension | undefined,
  mm: number,
): LengthField | undefined => {
  const { subject, kind } = landmark ?? {}
  if (dimension === 'thick' || subject === 'wall')
    return mm <= thickestWallMm ? field('tank.wallMm', 'wall') : undefined
  if (subject === 'sand' && mm <= deepestSandMm) return field('goals.sandDepthMm', 'sand')
  if (subject === 'chamber') {
    const side = dimension && chamberFields[dimension]
    return side && field(`tank.chambers.${lastChamber(reading.draft)}.${side.path}`, side.name)
  }
  if (subject === 'sump') return dimension && sumpFields[dimension]
  if (subject === 'support' || kind === 'stand') return supportFields[dimension ?? 'long']
  if (subject !== 'tank') return subject && simple[subject]
  return dimension === 'deep' && reading.hasHeight ? tankFields.wide : tankFields[dimension ?? 'long']
}

/** 12 mm is no reach of an arm and no length of a heater, whatever stands beside it. */
const isBelievable = (kind: KindKey, mm: number): boolean => {
  const key = chooseLengthKey(kind, undefined)
  const attribute = key === undefined ? undefined : getAttribute(kind, key)
  return attribute?.type !== 'measure' || mm >= attribute.usual[0] / 2
}

const plain: ReadonlySet<string> = new Set(['chamber', 'tank', 'support', 'sump', 'cord', 'mount-height'])

/** Whether something near a length may be what it is of. */
export const acceptsLength =
  ({ kind: asked }: Reading, mm: number, dimension: Dimension | undefined) =>
  ({ subject, kind }: Landmark): boolean => {
    if (dimension === 'water') return subject === 'chamber' || subject === 'tank' || subject === 'sump'
    if (kind !== undefined && kind === asked && kind !== 'tank' && (dimension !== undefined || isBelievable(kind, mm)))
      return true
    if (kind === 'stand') return true
    if (subject === 'wall') return mm <= thickestWallMm
    if (subject === 'sand') return mm <= deepestSandMm
    return subject !== undefined && (plain.has(subject) || subject in simple)
  }
