/** Values at the middles of the cells of a plane, row by row. */
export interface ValueGrid {
  readonly columns: number
  readonly rows: number
  readonly cells: ArrayLike<number>
}

/** In cells, from the corner of the plane where its first row begins. */
export interface GridPoint {
  readonly x: number
  readonly y: number
}

type Side = 'top' | 'right' | 'bottom' | 'left'

/**
 * Lines from side to side by the corners that are at the level or above: 8 top left, 4 top right, 2 bottom right, 1 bottom
 * left. Seen along a line, those corners always lie on the same hand, so that lines of neighbouring squares join.
 */
const crossings: Readonly<Record<number, readonly (readonly [Side, Side])[]>> = {
  1: [['bottom', 'left']],
  2: [['right', 'bottom']],
  3: [['right', 'left']],
  4: [['top', 'right']],
  6: [['top', 'bottom']],
  7: [['top', 'left']],
  8: [['left', 'top']],
  9: [['bottom', 'top']],
  11: [['right', 'top']],
  12: [['left', 'right']],
  13: [['bottom', 'right']],
  14: [['left', 'bottom']],
}

/** Two corners across from each other: the middle of the four tells whether they belong together. */
const saddles: Readonly<Record<number, Record<'joined' | 'apart', readonly (readonly [Side, Side])[]>>> = {
  5: {
    joined: [
      ['top', 'left'],
      ['bottom', 'right'],
    ],
    apart: [
      ['top', 'right'],
      ['bottom', 'left'],
    ],
  },
  10: {
    joined: [
      ['right', 'top'],
      ['left', 'bottom'],
    ],
    apart: [
      ['left', 'top'],
      ['right', 'bottom'],
    ],
  },
}

/**
 * Closed lines around what is at a level or above it, by marching squares (Lorensen & Cline 1987 in two dimensions, cited
 * from memory) with straight interpolation. At the edge of the plane a line runs along the edge.
 */
export function traceLevel({ columns, rows, cells }: ValueGrid, level: number): readonly (readonly GridPoint[])[] {
  // Around the middles of the cells: their own values again at the edge, and nothing just outside of it.
  const wide = columns + 4
  const tall = rows + 4
  const clamp = (index: number, count: number) => Math.min(count - 1, Math.max(0, index - 2))
  const place = (index: number, count: number) => Math.min(count, Math.max(0, index - 1.5))
  const valueAt = (i: number, j: number) =>
    i === 0 || j === 0 || i === wide - 1 || j === tall - 1
      ? -Infinity
      : (cells[clamp(j, rows) * columns + clamp(i, columns)] ?? -Infinity)
  const between = (a: number, b: number) => (Number.isFinite(a) && Number.isFinite(b) ? (level - a) / (b - a) : 0.5)
  const points = new Map<number, GridPoint>()
  const keyOf = (i: number, j: number, side: Side): number => {
    const [x, y] = [side === 'right' ? i + 1 : i, side === 'bottom' ? j + 1 : j]
    const isAcross = side === 'top' || side === 'bottom'
    const key = 2 * (y * wide + x) + (isAcross ? 0 : 1)
    if (!points.has(key)) {
      const share = between(valueAt(x, y), isAcross ? valueAt(x + 1, y) : valueAt(x, y + 1))
      const [atX, atY] = [place(x, columns), place(y, rows)]
      points.set(key, {
        x: isAcross ? atX + share * (place(x + 1, columns) - atX) : atX,
        y: isAcross ? atY : atY + share * (place(y + 1, rows) - atY),
      })
    }
    return key
  }
  const next = new Map<number, number>()
  for (let j = 0; j < tall - 1; j += 1) {
    for (let i = 0; i < wide - 1; i += 1) {
      const corners = [valueAt(i, j), valueAt(i + 1, j), valueAt(i + 1, j + 1), valueAt(i, j + 1)]
      const which = corners.reduce((bits, value) => bits * 2 + (value >= level ? 1 : 0), 0)
      const isJoined = corners.reduce((sum, value) => sum + value, 0) / 4 >= level
      const lines = saddles[which]?.[isJoined ? 'joined' : 'apart'] ?? crossings[which] ?? []
      for (const [from, to] of lines) next.set(keyOf(i, j, from), keyOf(i, j, to))
    }
  }
  const rings: GridPoint[][] = []
  for (let [start] = next.keys(); start !== undefined; [start] = next.keys()) {
    const ring: GridPoint[] = []
    for (let key: number | undefined = start; key !== undefined && next.has(key);) {
      const point = points.get(key)
      const last = ring.at(-1)
      if (point && (last?.x !== point.x || last.y !== point.y)) ring.push(point)
      const following: number | undefined = next.get(key)
      next.delete(key)
      key = following
    }
    rings.push(ring)
  }
  return rings
}
