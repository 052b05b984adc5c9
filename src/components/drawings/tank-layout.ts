import { fromShown, toShown } from '#shared/units/convert'
import type { UnitSystem } from '#shared/units/systems'
import type { TankDrawing } from './tank-drawing'
import { niceStep } from './ticks'

/** Room beside the tank for a dimension line and its label; `DrawingSheet` keeps the same free. */
export const sidePx = 66
const bottomPx = 62
/** Over the back wall: one row of chamber lengths, or two where neighbours' labels may meet. */
const topPx = { oneRow: 40, twoRows: 60 } as const

export interface TankLayout {
  readonly widthPx: number
  readonly heightPx: number
  readonly pxPerMm: number
  /** Left outside of the tank; where its back (or, from the front, the drawing's area) begins; where its floor stands. */
  readonly leftPx: number
  readonly topPx: number
  readonly floorPx: number
  /** Of the grid: a round length in the person's unit. */
  readonly gridMm: number
  readonly gridPx: number
  readonly size: SheetSize
}

/** How the sheet's height follows its width, so that the page can reserve it before any script has measured. */
export interface SheetSize {
  /** Size of what is to scale where there is room for all of it. */
  readonly acrossPx: number
  readonly contentPx: number
  /** Between the parts that are to scale: does not shrink with them. */
  readonly betweenPx?: number
  /** Kept free to the left and right; by default room for a dimension line on either side. */
  readonly sidesPx?: readonly [number, number]
  readonly abovePx: number
  readonly belowPx: number
}

export const defaultWidthPx = 400
const mostContentPx = 270
const mostAcrossPx = 560
const leastGridPx = 13

export function gridStepMm(pxPerMm: number, system: UnitSystem): number {
  return fromShown(niceStep(toShown(leastGridPx / pxPerMm, 'mm', system)), 'mm', system)
}

/** One scale and one height for plan and section of a tank, so that they line up side by side and one under the other. */
export function layoutTank(drawing: TankDrawing, widthPx: number, system: UnitSystem): TankLayout {
  const uprightMm = Math.max(drawing.outerHeightMm, drawing.outerWidthMm)
  const mostPxPerMm = Math.min(mostContentPx / uprightMm, mostAcrossPx / drawing.outerLengthMm)
  const size = {
    acrossPx: mostPxPerMm * drawing.outerLengthMm,
    contentPx: mostPxPerMm * uprightMm,
    abovePx: drawing.chambers.length > 1 ? topPx.twoRows : topPx.oneRow,
    belowPx: bottomPx,
  }
  const acrossPx = Math.min(size.acrossPx, Math.max(60, widthPx - 2 * sidePx))
  const pxPerMm = acrossPx / drawing.outerLengthMm
  const gridMm = gridStepMm(pxPerMm, system)
  const floorPx = size.abovePx + uprightMm * pxPerMm
  return {
    widthPx,
    heightPx: floorPx + size.belowPx,
    pxPerMm,
    leftPx: (widthPx - acrossPx) / 2,
    topPx: size.abovePx,
    floorPx,
    gridMm,
    gridPx: gridMm * pxPerMm,
    size,
  }
}
