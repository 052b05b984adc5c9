import { lastChamber, nextChamber } from './chambers'
import type { Landmark } from './landmarks'
import type { Reading } from './reading'

/** What two or three lengths in a row can be the size of; `piece` is the room that there is for it. */
export type SizeSubject = 'tank' | 'chamber' | 'sump' | 'support' | 'opening' | 'piece'

export const sizeKeys: Readonly<Record<SizeSubject, readonly string[]>> = {
  tank: ['outerLengthMm', 'outerWidthMm', 'outerHeightMm'],
  chamber: ['lengthMm', 'widthMm', 'waterDepthMm'],
  sump: ['lengthMm', 'widthMm', 'waterDepthMm'],
  support: ['lengthMm', 'widthMm'],
  opening: ['openingLengthMm', 'openingWidthMm'],
  piece: ['lengthMm', 'widthMm', 'heightMm'],
}

export const sizeNames: Readonly<Record<SizeSubject, string>> = {
  tank: 'tank',
  chamber: 'chamber',
  sump: 'sump',
  support: 'surface',
  opening: 'chamber opening',
  piece: 'size at most',
}

const plain: ReadonlySet<string> = new Set(['tank', 'chamber', 'sump', 'support', 'opening'])
const bodies: ReadonlySet<string> = new Set(['light', 'return-pump', 'skimmer'])
/** No tank is sold with two sides under this; chambers are. */
const smallestTankSideMm = 180

/** A size is the piece's own only with a bound: "a skimmer under 6 x 6 x 18 in". */
export const acceptsSize =
  ({ kind: asked }: Reading, isBounded: boolean) =>
  ({ subject, kind }: Landmark): boolean =>
    (subject !== undefined && plain.has(subject)) ||
    (isBounded && kind !== undefined && kind === asked && bodies.has(kind))

export const chooseSizeSubject = (landmark: Landmark | undefined, valuesMm: readonly number[]): SizeSubject => {
  const subject = landmark?.subject
  if (subject !== undefined && plain.has(subject)) return subject as SizeSubject
  if (landmark !== undefined) return 'piece'
  const smaller = valuesMm.toSorted((a, b) => a - b).slice(0, 2)
  return valuesMm.length === 3 && smaller.every((value) => value < smallestTankSideMm) ? 'chamber' : 'tank'
}

/** Where in the setup the size goes; undefined where there is no more room. */
export const findSizePath = ({ draft }: Reading, subject: SizeSubject): string | undefined => {
  if (subject === 'chamber') {
    const next = nextChamber(draft)
    return next === undefined ? undefined : `tank.chambers.${next}`
  }
  if (subject === 'opening') return `tank.chambers.${lastChamber(draft)}`
  return subject === 'sump' ? 'tank.sump' : subject
}
