import { monoWidth } from './text-width'

export interface Span {
  readonly axis: 'horizontal' | 'vertical'
  /** Ends along the axis. */
  readonly from: number
  readonly to: number
  /** Where the line runs on the other axis. */
  readonly at: number
}

/** Side of the line on which the label stands: `before` is above or left of it. */
export type LabelSide = 'before' | 'after'

export interface Box {
  readonly x: number
  readonly y: number
  readonly width: number
  readonly height: number
}

export interface DimensionLayout {
  /** One stretch, or two around a label in the line. */
  readonly stretches: readonly (readonly [number, number])[]
  readonly label: Box
  /** At least 24 px each way: WCAG 2.2 success criterion 2.5.8. */
  readonly target: Box
}

export const labelPx = 12
const labelHeight = 15
// One over, for the fraction of a pixel that the width of a drawing is rounded by.
export const leastTarget = 25

function around(boxes: readonly Box[]): Box {
  const x = Math.min(...boxes.map((box) => box.x))
  const y = Math.min(...boxes.map((box) => box.y))
  const width = Math.max(...boxes.map((box) => box.x + box.width)) - x
  const height = Math.max(...boxes.map((box) => box.y + box.height)) - y
  const [moreX, moreY] = [Math.max(0, leastTarget - width), Math.max(0, leastTarget - height)]
  return { x: x - moreX / 2, y: y - moreY / 2, width: width + moreX, height: height + moreY }
}

function isBroken(text: string, lengthPx: number): boolean {
  return text !== '' && lengthPx >= labelHeight + 20
}

/** Where a vertical line runs beside an edge so that its label keeps clear of it: -1 to the left, 1 to the right. */
export function besideEdge(
  edgePx: number,
  direction: -1 | 1,
  text: string,
  lengthPx: number,
): { readonly at: number; readonly side: LabelSide } {
  const offset = isBroken(text, lengthPx) ? Math.max(34, monoWidth(text, labelPx) / 2 + 9) : 12
  return { at: edgePx + direction * offset, side: direction < 0 ? 'before' : 'after' }
}

/** A horizontal line carries its label beside it; a vertical one in a gap, or beside it where it is too short for one. */
export function layoutDimension({ axis, from, to, at }: Span, text: string, side: LabelSide): DimensionLayout {
  const [low, high] = [Math.min(from, to), Math.max(from, to)]
  const middle = (low + high) / 2
  const width = monoWidth(text, labelPx)
  if (axis === 'horizontal') {
    const label = {
      x: middle - width / 2,
      y: side === 'before' ? at - labelHeight - 4 : at + 4,
      width,
      height: labelHeight,
    }
    const line = { x: low, y: at - 5, width: high - low, height: 10 }
    return { stretches: [[low, high]], label, target: around([label, line]) }
  }
  const hasGap = isBroken(text, high - low)
  const x = hasGap ? at - width / 2 : side === 'before' ? at - 8 - width : at + 8
  const label = { x, y: middle - labelHeight / 2, width, height: labelHeight }
  const line = { x: at - 5, y: low, width: 10, height: high - low }
  const gap = labelHeight / 2 + 2
  const stretches = hasGap
    ? ([
        [low, middle - gap],
        [middle + gap, high],
      ] as const)
    : ([[low, high]] as const)
  return { stretches, label, target: around([label, line]) }
}
