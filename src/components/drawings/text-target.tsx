import { labelPx, leastTarget } from './dimension-layout'
import { EditTarget } from './edit-target'
import type { DrawingEdits } from './tank-drawing'
import { monoWidth } from './text-width'

export interface TextTargetProps {
  readonly edits: DrawingEdits
  /** Left end and middle of the line of text. */
  readonly x: number
  readonly y: number
  readonly text: string
  readonly name: string
  readonly isGiven: boolean
  readonly path: string
}

/** A value too thin to carry a dimension line of its own, such as the glass. */
export function TextTarget({ edits, x, y, text, name, isGiven, path }: TextTargetProps) {
  const width = monoWidth(text, labelPx)
  return (
    <EditTarget
      {...edits}
      path={path}
      name={isGiven ? name : `${name}, assumed`}
      box={{ x: x - 4, y: y - leastTarget / 2, width: width + 8, height: leastTarget }}
    >
      <text x={x} y={y + 4} fontSize={labelPx} fontWeight={isGiven ? 600 : 400} className="fill-action">
        {text}
      </text>
      <line
        x1={x}
        x2={x + width}
        y1={y + 8}
        y2={y + 8}
        strokeWidth="1"
        strokeDasharray={isGiven ? undefined : '3 2'}
        className="stroke-action"
      />
    </EditTarget>
  )
}
