import type { Verdict } from '#shared/engine/types'

export interface MarkPinProps {
  readonly verdict: Verdict
  /** Of the head above the axis. */
  readonly heightPx: number
  readonly isLit: boolean
}

const strokes = { fits: 'stroke-fits', changes: 'stroke-changes', no: 'stroke-no', unknown: 'stroke-unknown' } as const
const fills = { fits: 'fill-fits', changes: 'fill-changes', no: 'fill-no', unknown: 'fill-unknown' } as const

/** A pin on the axis at (0, 0). Its head is solid, half, crossed or dotted, as the verdict's icon is. */
export function MarkPin({ verdict, heightPx, isLit }: MarkPinProps) {
  const r = isLit ? 5.5 : 3.75
  return (
    <g className={strokes[verdict]} strokeWidth={isLit ? 2.5 : 1.5}>
      <line y2={-heightPx + (verdict === 'no' ? 0 : r)} opacity={isLit ? 1 : 0.7} />
      <g transform={`translate(0 ${-heightPx})`}>
        {verdict === 'fits' && <circle r={r} className={fills.fits} />}
        {verdict === 'changes' && (
          <>
            <circle r={r} className="fill-paper" />
            <path d={`M0 ${-r}a${r} ${r} 0 0 1 0 ${2 * r}Z`} className={fills.changes} />
          </>
        )}
        {verdict === 'no' && <path d={`M${-r} ${-r}L${r} ${r}M${r} ${-r}L${-r} ${r}`} fill="none" />}
        {verdict === 'unknown' && <circle r={r} className="fill-paper" strokeDasharray="1.5 1.6" />}
      </g>
    </g>
  )
}
