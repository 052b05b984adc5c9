import type { Placement } from '#shared/engine/types'
import type { Verdict } from '#shared/engine/types'

export interface ChamberDrawing {
  readonly id: string
  readonly name: string
  /** Along the tank. */
  readonly lengthMm: number
  /** Front to back. */
  readonly widthMm: number
  readonly waterDepthMm: number
  /** From the inside of the left wall; left out, the chamber stands beside the one before. */
  readonly xMm?: number
}

/** A heater in its place. `position` may show one that is too long standing out of the water. */
export interface RodDrawing extends Placement {
  readonly lengthMm: number
  readonly diameterMm: number
  /** Colours its outline. */
  readonly verdict?: Verdict
}

/** All of a tank that is drawn, assumed values included. */
export interface TankDrawing {
  readonly outerLengthMm: number
  readonly outerWidthMm: number
  readonly outerHeightMm: number
  readonly wallMm: number
  readonly bottomMm: number
  /** Above the inside floor. */
  readonly waterLineMm: number
  readonly chambers: readonly ChamberDrawing[]
  /** Setup paths that the person gave, such as `tank.outerLengthMm` or `tank.chambers.0.lengthMm`; all else is dashed. */
  readonly given: ReadonlySet<string>
  readonly rod?: RodDrawing
}

export interface DrawingEdits {
  /** A dimension was pressed: its setup path, and the element for a popover to stand beside. */
  readonly onEdit?: (path: string, target: Element) => void
  /** Where the dimension leads without scripts: the field of the plain form. */
  readonly editHref?: (path: string) => string
}

export const chamberPath = (at: number, key: 'lengthMm' | 'widthMm' | 'waterDepthMm'): string =>
  `tank.chambers.${at}.${key}`

/** Left ends of the chambers along the back wall, from the inside of the left wall. */
export function chamberStartsMm(chambers: readonly ChamberDrawing[]): readonly number[] {
  let next = 0
  return chambers.map((chamber) => {
    const start = chamber.xMm ?? next
    next = start + chamber.lengthMm
    return start
  })
}

/** The chamber that the rod stands in, else the first. Minus one without chambers. */
export function activeChamber({ chambers, rod }: TankDrawing): number {
  const at = chambers.findIndex((chamber) => chamber.id === rod?.chamber)
  return at >= 0 || rod?.chamber === 'display' ? at : chambers.length > 0 ? 0 : -1
}
