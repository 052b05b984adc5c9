import type { StandDrawing } from '#shared/engine/drawings/stand'
import type { Box } from './dimension-layout'
import type { SheetSize } from './tank-layout'

export interface StandLayout {
  readonly heightPx: number
  readonly pxPerMm: number
  /** Middle of tank and top, and where the lower edge of the drawing lies. */
  readonly middleX: number
  readonly floorPx: number
  readonly size: SheetSize
}

/** Room for the dimensions around tank and top. */
export const standSheet = { abovePx: 44, belowPx: 56, sidesPx: [70, 82], mostTallPx: 260, mostLongPx: 460 } as const
/** Of a stand from the front only its upper end is drawn, broken off: a share of the tank's height. */
const stubShare = 0.4

export const findStubMm = (tank: StandDrawing['tank']): number => Math.max(120, stubShare * tank.heightMm)

/** One scale and one height for both views, so that they line up side by side and one under the other. */
export function layoutStand(
  { top, tank }: Pick<StandDrawing, 'top'> & { readonly tank: StandDrawing['tank'] | null },
  widthPx: number,
): StandLayout {
  const acrossMm = Math.max(top.lengthMm, tank?.lengthMm ?? 0)
  const tallMm = Math.max(top.widthMm, tank?.widthMm ?? 0, tank ? tank.heightMm + findStubMm(tank) : 0)
  const mostPxPerMm = Math.min(standSheet.mostLongPx / acrossMm, standSheet.mostTallPx / tallMm)
  const [leftPx, rightPx] = standSheet.sidesPx
  const roomPx = widthPx - leftPx - rightPx
  const size = { acrossPx: acrossMm * mostPxPerMm, contentPx: tallMm * mostPxPerMm, ...standSheet }
  const pxPerMm = Math.min(size.acrossPx, Math.max(60, roomPx)) / acrossMm
  const floorPx = standSheet.abovePx + tallMm * pxPerMm
  return { heightPx: floorPx + standSheet.belowPx, pxPerMm, middleX: leftPx + roomPx / 2, floorPx, size }
}

/** A rectangle around a middle. */
export const boxAround = (x: number, y: number, width: number, height: number): Box => ({
  x: x - width / 2,
  y: y - height / 2,
  width,
  height,
})

/** What two rectangles around one middle have in common. */
export const findCommon = (a: Box, b: Box): Box => ({
  x: Math.max(a.x, b.x),
  y: Math.max(a.y, b.y),
  width: Math.min(a.width, b.width),
  height: Math.min(a.height, b.height),
})
