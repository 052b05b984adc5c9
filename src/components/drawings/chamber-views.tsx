import type { Box } from './dimension-layout'
import type { PlacedRod } from './place-rod'
import { RodShape } from './rod-shape'
import type { RodDrawing } from './tank-drawing'

export interface ChamberViewsProps {
  /** The water seen upright, from the floor to the chamber's working level. */
  readonly water: Box
  readonly plan: Box
  readonly clearPx: number
  readonly pxPerMm: number
  readonly rod: RodDrawing | undefined
  /** The rod projected into the upright view and into the plan. */
  readonly seen: PlacedRod | undefined
  readonly placed: PlacedRod | undefined
}

export function ChamberViews({ water, plan, clearPx, pxPerMm, rod, seen, placed }: ChamberViewsProps) {
  const floorY = water.y + water.height
  const rimY = water.y - 14
  return (
    <g aria-hidden="true">
      <rect {...water} className="fill-action-soft" />
      <path
        d={`M${water.x} ${rimY}V${floorY}h${water.width}V${rimY}`}
        fill="none"
        strokeWidth="2"
        className="stroke-ink"
      />
      <path d={`M${water.x} ${water.y}h${water.width}`} strokeWidth="1.5" className="stroke-action" />
      <rect {...plan} strokeWidth="2" className="fill-action-soft stroke-ink" />
      {clearPx * 2 < Math.min(plan.width, plan.height) && (
        <rect
          x={plan.x + clearPx}
          y={plan.y + clearPx}
          width={plan.width - 2 * clearPx}
          height={plan.height - 2 * clearPx}
          fill="none"
          strokeWidth="1.5"
          strokeDasharray="1.5 3"
          className="stroke-ink-soft"
        />
      )}
      {rod && seen && placed && (
        <>
          <RodShape
            x={water.x + water.width / 2}
            y={floorY - (seen.heightMm / 2) * pxPerMm}
            lengthPx={seen.seenLengthMm * pxPerMm}
            thickPx={rod.diameterMm * pxPerMm}
            angleDeg={seen.seenAngleDeg}
            verdict={rod.verdict}
          />
          <RodShape
            x={plan.x + plan.width / 2}
            y={plan.y + plan.height / 2}
            lengthPx={placed.planLengthMm * pxPerMm}
            thickPx={rod.diameterMm * pxPerMm}
            angleDeg={placed.planAngleDeg}
            verdict={rod.verdict}
          />
        </>
      )}
    </g>
  )
}
