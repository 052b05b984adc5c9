import { placePoint } from './contour-path'
import { traceLevel, type GridPoint, type ValueGrid } from './contours'
import { labelPx, type Box } from './dimension-layout'
import { monoWidth } from './text-width'

type Direction = 'up' | 'right'

/** The point of lines, off the edge of the plane, that lies farthest that way; of nearly equal ones the middlemost. */
function findOutermost(
  points: readonly GridPoint[],
  { columns, rows }: ValueGrid,
  to: Direction,
): GridPoint | undefined {
  const inside = points.filter(({ x, y }) => x > 0 && y > 0 && x < columns && y < rows)
  const reach = ({ x, y }: GridPoint) => (to === 'up' ? -y : x)
  const aside = ({ x, y }: GridPoint) => (to === 'up' ? Math.abs(x - columns / 2) : Math.abs(y - rows / 2))
  const farthest = Math.max(...inside.map(reach))
  return inside.filter((point) => farthest - reach(point) < 0.5).sort((a, b) => aside(a) - aside(b))[0]
}

export interface ContourLabel extends GridPoint {
  readonly text: string
}

const isClear = (a: ContourLabel, b: ContourLabel) =>
  Math.abs(a.y - b.y) > 16 || Math.abs(a.x - b.x) > (monoWidth(a.text, labelPx) + monoWidth(b.text, labelPx)) / 2 + 4

/** A level's number on its line, each on another side, and none where it would lie on another. */
export function labelContours(
  grid: ValueGrid,
  box: Box,
  levels: readonly { readonly level: number; readonly text: string; readonly to: Direction }[],
): readonly ContourLabel[] {
  const labels: ContourLabel[] = []
  for (const { level, text, to } of levels) {
    const point = findOutermost(traceLevel(grid, level).flat(), grid, to)
    if (!point) continue
    const placed = placePoint(point, grid, box)
    const half = monoWidth(text, labelPx) / 2 + 3
    const label = {
      text,
      x: Math.min(box.x + box.width - half, Math.max(box.x + half, placed.x)),
      y: Math.min(box.y + box.height - 10, Math.max(box.y + 10, placed.y)),
    }
    if (labels.every((other) => isClear(label, other))) labels.push(label)
  }
  return labels
}
