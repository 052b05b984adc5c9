import type { Box } from './dimension-layout'
import type { GridPoint, ValueGrid } from './contours'

type Rings = readonly (readonly GridPoint[])[]
type Size = Pick<ValueGrid, 'columns' | 'rows'>

const round = (value: number) => Number(value.toFixed(1))

/** Where a point of the grid lies when the plane fills the box. */
export const placePoint = ({ x, y }: GridPoint, { columns, rows }: Size, box: Box): GridPoint => ({
  x: round(box.x + (x / columns) * box.width),
  y: round(box.y + (y / rows) * box.height),
})

/** Closed lines as the path of an area. With `evenodd`, rings of two levels enclose what lies between them. */
export function writeArea(rings: Rings, size: Size, box: Box): string {
  return rings
    .map((ring) => {
      const points = ring.map((point) => placePoint(point, size, box))
      return `M${points.map(({ x, y }) => `${x} ${y}`).join('L')}Z`
    })
    .join('')
}

const runsAlongEdge = (a: GridPoint, b: GridPoint, { columns, rows }: Size) =>
  (a.x === b.x && (a.x === 0 || a.x === columns)) || (a.y === b.y && (a.y === 0 || a.y === rows))

/** The same lines without where they run along the edge of the plane: there it ends, not the area. */
export function writeLines(rings: Rings, size: Size, box: Box): string {
  let path = ''
  for (const ring of rings) {
    let isDrawing = false
    ring.forEach((point, at) => {
      const following = ring[(at + 1) % ring.length]
      if (!following || runsAlongEdge(point, following, size)) {
        isDrawing = false
        return
      }
      const [from, to] = [placePoint(point, size, box), placePoint(following, size, box)]
      path += isDrawing ? `L${to.x} ${to.y}` : `M${from.x} ${from.y}L${to.x} ${to.y}`
      isDrawing = true
    })
  }
  return path
}
