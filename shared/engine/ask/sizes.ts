import { amountIn, printAmount, type Amount } from './amounts'
import { findBound } from './cues'
import { giveUnits, isOneUnit } from './length-units'
import type { Landmark } from './landmarks'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import type { Reading } from './reading'
import type { Dimension } from './words/dimension-words'

type Of = 'tank' | 'chamber' | 'sump' | 'support' | 'piece'

const keysOf: Readonly<Record<Of, readonly [string, string, string]>> = {
  tank: ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'],
  chamber: ['lengthMm', 'widthMm', 'waterDepthMm'],
  sump: ['lengthMm', 'widthMm', 'waterDepthMm'],
  support: ['lengthMm', 'widthMm', ''],
  piece: ['lengthMm', 'widthMm', 'heightMm'],
}
/** No tank is sold with two sides under this; chambers are. */
const smallestTankSideMm = 180
/** Water in a rear chamber stands about as high as in the tank, so the depth of one this shallow was typed elsewhere. */
const shallowMm = 150
const deepMm = 200

const sides = ['lengthMm', 'widthMm', 'waterDepthMm', 'heightMm'] as const

const bodies: ReadonlySet<string> = new Set(['light', 'return-pump', 'skimmer'])

const accepts = (reading: Reading, isBounded: boolean) => (landmark: Landmark) =>
  landmark.subject === 'chamber' ||
  landmark.subject === 'tank' ||
  landmark.subject === 'sump' ||
  landmark.subject === 'support' ||
  (isBounded && landmark.kind !== undefined && landmark.kind === reading.kind && bodies.has(landmark.kind))

const chooseSubject = (landmark: Landmark | undefined, valuesMm: readonly number[]): Of => {
  const subject = landmark?.subject
  if (subject === 'chamber' || subject === 'sump' || subject === 'support') return subject
  if (landmark?.kind !== undefined && subject === undefined) return 'piece'
  const isSmall =
    valuesMm.length === 3 &&
    valuesMm
      .toSorted((a, b) => a - b)
      .slice(0, 2)
      .every((value) => value < smallestTankSideMm)
  return subject === undefined && isSmall ? 'chamber' : 'tank'
}

/** Places of length, width and height by what they were called; "36 W x 18 D x 16 H" starts with the length. */
const placeByLabels = (
  labels: readonly (Dimension | undefined)[],
  hasHeight: boolean,
): readonly number[] | undefined => {
  if (labels.some((label) => label === undefined)) return undefined
  const isCalled = (label: Dimension) => labels.includes(label)
  const places = labels.map((label) => {
    if (label === 'long') return 0
    if (label === 'wide') return isCalled('long') || !isCalled('deep') || !isCalled('tall') ? 1 : 0
    if (label === 'deep') return isCalled('tall') ? 1 : 2
    return label === 'tall' && hasHeight ? 2 : -1
  })
  return new Set(places).size === places.length && !places.includes(-1) ? places : undefined
}

const deepestLast = (valuesMm: readonly number[]): readonly number[] => {
  const largest = valuesMm.indexOf(Math.max(...valuesMm))
  const order = valuesMm.map((_, index) => index).filter((index) => index !== largest)
  return [...order, largest]
}

/** More than any tank has; what comes after is left over. */
const mostChambers = 12

const nextChamber = ({ draft }: Reading): number | undefined => {
  for (let index = 0; index < mostChambers; index++) {
    if (!sides.some((side) => Object.hasOwn(draft.fields, `tank.chambers.${index}.${side}`))) return index
  }
  return undefined
}

const names: Readonly<Record<Of, string>> = {
  tank: 'tank',
  chamber: 'chamber',
  sump: 'sump',
  support: 'surface',
  piece: 'at most',
}

const describe = (of: Of, amounts: readonly Amount[], remark: string): string => {
  const isOne = isOneUnit(amounts)
  const size = amounts.map((amount, index) => printAmount(amount, !isOne || index === amounts.length - 1)).join(' × ')
  return `${names[of]} ${size}${remark}`
}

/** Reads two or three lengths in a row as the size of a chamber, tank, sump or surface, or as room for the piece. */
export const readSizeOf = (reading: Reading, measure: Measure): boolean => {
  if (measure.shape !== 'size') return false
  const { draft } = reading
  const bound = findBound(reading, measure)
  const near = findNearest(reading, measure, accepts(reading, bound !== undefined))
  const first = giveUnits(reading, measure, near?.landmark.subject === 'chamber' ? 'chamber' : 'tank')
  const of = chooseSubject(
    near?.landmark,
    first.amounts.map((amount) => amountIn(amount, 'mm')),
  )
  const { amounts, isGuessed } = of === 'chamber' ? giveUnits(reading, measure, 'chamber') : first
  const valuesMm = amounts.map((amount) => amountIn(amount, 'mm'))
  const labelled = placeByLabels(measure.labels, of !== 'support')
  const isTurned =
    of === 'chamber' &&
    labelled === undefined &&
    (valuesMm[2] ?? Infinity) < shallowMm &&
    Math.max(...valuesMm) >= deepMm
  const order = isTurned ? deepestLast(valuesMm) : valuesMm.map((_, index) => index)
  const ordered = order.flatMap((index) => amounts[index] ?? [])
  const chamber = of === 'chamber' ? nextChamber(reading) : 0
  if (chamber === undefined) return false
  const base = of === 'chamber' ? `tank.chambers.${chamber}` : of === 'sump' ? 'tank.sump' : of
  let filled = 0
  ordered.forEach((amount, index) => {
    const key = keysOf[of][labelled?.[index] ?? index] ?? ''
    if (key === '') return
    const isNew =
      of === 'piece' ? draft.setFilter(key, [null, amountIn(amount, 'mm')]) : draft.setAmount(`${base}.${key}`, amount)
    if (isNew) filled++
  })
  if (filled === 0) return false
  const remarks = [
    ...(isTurned ? ['the longest taken as the depth'] : []),
    ...(isGuessed ? [`no unit typed, taken as ${amounts[0]?.parts[0]?.unit?.symbol ?? ''}`] : []),
  ]
  const remark = remarks.length === 0 ? '' : ` (${remarks.join('; ')})`
  const path = of === 'piece' ? {} : { path: `${base}.${keysOf[of][labelled?.[0] ?? 0] ?? ''}` }
  const cues = [near?.landmark, bound].filter((cue) => cue !== undefined)
  draft.note({ meaning: describe(of, ordered, remark), ...path }, measure, ...cues)
  return true
}
