import type { Box } from './dimension-layout'
import { EditTarget } from './edit-target'
import type { DrawingEdits } from './tank-drawing'

export interface PlanDisplayProps {
  readonly display: Box
  readonly inside: Box
  readonly canAddChamber: boolean
  readonly edits: DrawingEdits
}

const stripPx = 27

/** Names the display, and offers a chamber along the back wall of a tank that has none. */
export function PlanDisplay({ display, inside, canAddChamber, edits }: PlanDisplayProps) {
  const isEditable = edits.onEdit !== undefined || edits.editHref !== undefined
  return (
    <>
      {display.height > 30 && (
        <text
          x={display.x + display.width / 2}
          y={display.y + display.height / 2 + 4}
          textAnchor="middle"
          fontSize="13"
          aria-hidden="true"
          className="fill-ink-soft font-text"
        >
          display
        </text>
      )}
      {canAddChamber && isEditable && (
        <EditTarget
          {...edits}
          path="tank.chambers"
          name="Add a rear chamber"
          box={{ x: inside.x, y: inside.y, width: inside.width, height: stripPx }}
        >
          <path
            d={`M${inside.x} ${inside.y + stripPx}h${inside.width}`}
            strokeWidth="1.5"
            strokeDasharray="4 3"
            className="stroke-ink-soft"
          />
          <text
            x={inside.x + inside.width / 2}
            y={inside.y + 17}
            textAnchor="middle"
            fontSize="13"
            className="fill-action font-text"
          >
            add a rear chamber
          </text>
        </EditTarget>
      )}
    </>
  )
}
