import type { Verdict } from '#shared/engine/types'

export interface RodShapeProps {
  /** Centre. */
  readonly x: number
  readonly y: number
  readonly lengthPx: number
  readonly thickPx: number
  /** Above the horizontal. */
  readonly angleDeg: number
  readonly verdict?: Verdict | undefined
}

const outlines = { fits: 'stroke-fits', changes: 'stroke-changes', no: 'stroke-no', unknown: 'stroke-unknown' } as const

/** A round-ended rod, outlined in its verdict's colour. */
export function RodShape({ x, y, lengthPx, thickPx, angleDeg, verdict }: RodShapeProps) {
  const thick = Math.max(thickPx, 5)
  const length = Math.max(lengthPx, thick)
  return (
    <rect
      x={x - length / 2}
      y={y - thick / 2}
      width={length}
      height={thick}
      rx={thick / 2}
      transform={`rotate(${-angleDeg} ${x} ${y})`}
      strokeWidth="2"
      strokeDasharray={verdict === 'unknown' ? '2 2' : undefined}
      className={`fill-sheet ${verdict ? outlines[verdict] : 'stroke-ink'}`}
    />
  )
}
