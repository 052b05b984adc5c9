import { amountIn, printAmount, type Amount } from './amounts'
import { findBound } from './cues'
import { giveUnits, isOneUnit } from './length-units'
import type { Measure } from './measures'
import { findNearest } from './nearest'
import type { Reading } from './reading'
import { isDepthElsewhere, placeByLabels, putLongestLast } from './size-order'
import { acceptsSize, chooseSizeSubject, findSizePath, sizeKeys, sizeNames, type SizeSubject } from './size-subject'

const millimetresOf = (amounts: readonly Amount[]): readonly number[] => amounts.map((amount) => amountIn(amount, 'mm'))

const printSize = (amounts: readonly Amount[]): string => {
  const isOne = isOneUnit(amounts)
  return amounts.map((amount, index) => printAmount(amount, !isOne || index === amounts.length - 1)).join(' × ')
}

const describeDoubts = (amounts: readonly Amount[], isTurned: boolean, isGuessed: boolean): string => {
  const doubts = [
    ...(isTurned ? ['the longest taken as the depth'] : []),
    ...(isGuessed ? [`no unit typed, taken as ${amounts[0]?.parts[0]?.unit?.symbol ?? ''}`] : []),
  ]
  return doubts.length === 0 ? '' : ` (${doubts.join('; ')})`
}

interface Size {
  readonly subject: SizeSubject
  /** In the order length, width, height or depth; with labels, as those say. */
  readonly amounts: readonly Amount[]
  readonly keys: readonly (string | undefined)[]
  readonly doubts: string
}

const readSides = (reading: Reading, measure: Measure, landmark: Reading['landmarks'][number] | undefined): Size => {
  const typed = giveUnits(reading, measure, landmark?.subject === 'chamber' ? 'chamber' : 'tank')
  const subject = chooseSizeSubject(landmark, millimetresOf(typed.amounts))
  const { amounts, isGuessed } = subject === 'chamber' ? giveUnits(reading, measure, 'chamber') : typed
  const places = placeByLabels(measure.labels, sizeKeys[subject].length === 3)
  const isTurned = subject === 'chamber' && places === undefined && isDepthElsewhere(millimetresOf(amounts))
  return {
    subject,
    amounts: isTurned ? putLongestLast(amounts, millimetresOf(amounts)) : amounts,
    keys: amounts.map((_, index) => sizeKeys[subject][places?.[index] ?? index]),
    doubts: describeDoubts(amounts, isTurned, isGuessed),
  }
}

/** Reads two or three lengths in a row as the size of a chamber, tank, sump or surface, or as room for the piece. */
export const readSizeOf = (reading: Reading, measure: Measure): boolean => {
  if (measure.shape !== 'size') return false
  const { draft } = reading
  const bound = findBound(reading, measure)
  const near = findNearest(reading, measure, acceptsSize(reading, bound !== undefined))
  const { subject, amounts, keys, doubts } = readSides(reading, measure, near?.landmark)
  const base = findSizePath(reading, subject)
  if (base === undefined) return false
  const isOfSetup = subject !== 'piece'
  const isAbsurd = amounts.some((amount, index) => keys[index] && !draft.canHold(`${base}.${keys[index]}`, amount))
  if (isOfSetup && isAbsurd) return false
  const filled = amounts.filter((amount, index) => {
    const key = keys[index]
    if (key === undefined) return false
    return subject === 'piece'
      ? draft.setFilter(key, [null, amountIn(amount, 'mm')])
      : draft.setAmount(`${base}.${key}`, amount)
  })
  if (filled.length === 0) return false
  const cues = [near?.landmark, bound].filter((cue) => cue !== undefined)
  const meaning = `${sizeNames[subject]} ${printSize(amounts)}${doubts}`
  draft.note({ meaning, ...(isOfSetup && { path: `${base}.${keys[0] ?? ''}` }) }, measure, ...cues)
  return true
}
