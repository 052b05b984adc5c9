import type { Box } from './dimension-layout'

export interface PlanChamberProps {
  readonly name: string
  readonly box: Box
  readonly isActive: boolean
  readonly isGiven: boolean
  readonly hasRod: boolean
}

const namePx = 11
/** Instrument Sans runs to about this share of its size per letter. */
const letterShare = 0.55

export function PlanChamber({ name, box, isActive, isGiven, hasRod }: PlanChamberProps) {
  const fits = name.length * namePx * letterShare + 6 <= box.width && box.height >= 18
  return (
    <g aria-hidden="true">
      <rect
        {...box}
        strokeWidth={isGiven ? 2 : 1.5}
        strokeDasharray={isGiven ? undefined : '5 4'}
        className={`${isActive ? 'fill-action-soft' : 'fill-water'} ${isGiven ? 'stroke-action' : 'stroke-ink'}`}
      />
      {fits && !hasRod && (
        <text
          x={box.x + box.width / 2}
          y={box.y + box.height / 2 + 4}
          textAnchor="middle"
          fontSize={namePx}
          className="fill-ink font-text"
        >
          {name}
        </text>
      )}
    </g>
  )
}
