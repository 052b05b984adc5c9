import { measureTank } from '../checks/stand'
import { compareFootprints } from '../checks/support'
import type { Piece, Setup } from '../types'
import { readMeasure, readNumber } from '../values'
import { sceneFor } from './scene'

/** A tank on a stand, the stand's length across the sheet. */
export interface StandDrawing {
  readonly top: { readonly lengthMm: number; readonly widthMm: number }
  /** As it stands, turned or not. */
  readonly tank: { readonly lengthMm: number; readonly widthMm: number; readonly heightMm: number }
  /** Both sides together, along the top's length and across it; negative: the tank stands over. */
  readonly spareMm: { readonly length: number; readonly width: number }
  readonly isTurned: boolean
  readonly standHeightMm: number | null
  /** Of the tank, the sides along and across the top that nobody said, and its height. */
  readonly assumed: { readonly length: boolean; readonly width: boolean; readonly height: boolean }
}

/**
 * The setup's tank on a stand; null where nobody recorded the stand's top. RangeError where the tank has neither size nor
 * volume.
 */
export function drawStand(setup: Setup, { specs }: Piece): StandDrawing | null {
  const length = readMeasure(specs, 'topLengthMm')
  const width = readMeasure(specs, 'topWidthMm')
  if (!length || !width) return null
  const scene = sceneFor(setup, 'stand')
  const { tank, assumed } = scene.plan
  const { sparesMm, isTurned } = compareFootprints(measureTank(scene), [length, width])
  const turn = <T>(along: T, across: T) => (isTurned ? [across, along] : [along, across]) as readonly [T, T]
  const [lengthMm, widthMm] = turn(tank.outerLengthMm, tank.outerWidthMm)
  const [isLengthAssumed, isWidthAssumed] = turn(assumed.has('tank.outerLengthMm'), assumed.has('tank.outerWidthMm'))
  return {
    top: { lengthMm: length.value, widthMm: width.value },
    tank: { lengthMm, widthMm, heightMm: tank.outerHeightMm },
    spareMm: { length: sparesMm[0], width: sparesMm[1] },
    isTurned,
    standHeightMm: readNumber(specs, 'heightMm') ?? null,
    assumed: { length: isLengthAssumed, width: isWidthAssumed, height: assumed.has('tank.outerHeightMm') },
  }
}
