import { EditTarget } from './edit-target'
import { labelPx, layoutDimension, type LabelSide, type Span } from './dimension-layout'
import type { DrawingEdits } from './tank-drawing'

export interface DimensionLineProps extends Span, DrawingEdits {
  readonly label: string
  /** What is measured: "Outside length". */
  readonly name: string
  /** `given`: the person's own number. `assumed`: ours, dashed. `plain`: the piece's, or computed. */
  readonly status: 'given' | 'assumed' | 'plain'
  readonly side?: LabelSide
  /** The edge that is measured, on the other axis; hairlines lead from it to the line. */
  readonly edge?: number
  /** What the label stands on, to keep hairlines behind it from touching it. */
  readonly ground?: 'sheet' | 'water'
  /** Setup path; without one the line cannot be edited. */
  readonly path?: string
}

const looks = {
  given: { line: 'stroke-action', text: 'fill-action' },
  assumed: { line: 'stroke-ink-soft', text: 'fill-action' },
  plain: { line: 'stroke-ink', text: 'fill-ink' },
} as const

/** A drawn measure: a line between slashed ends with its value. Its label never lies on what it measures. */
export function DimensionLine(props: DimensionLineProps) {
  const {
    axis,
    from,
    to,
    at,
    label,
    name,
    status,
    side = 'before',
    edge,
    ground = 'sheet',
    path,
    onEdit,
    editHref,
  } = props
  const { stretches, label: box, target } = layoutDimension({ axis, from, to, at }, label, side)
  const isHorizontal = axis === 'horizontal'
  const point = (along: number, across: number) => (isHorizontal ? `${along} ${across}` : `${across} ${along}`)
  const look = looks[status]
  // Ink in place of the action colour where there is nothing to press.
  const isEditable = path !== undefined
  const dash = status === 'assumed' ? '4 3' : undefined
  const overshoot = edge === undefined ? 0 : Math.sign(at - edge) * 5
  const drawn = (
    <>
      {edge !== undefined && (
        <path
          d={[from, to].map((end) => `M${point(end, edge + overshoot * 0.6)}L${point(end, at + overshoot)}`).join('')}
          strokeWidth="1"
          className="stroke-ink-soft"
          opacity="0.6"
        />
      )}
      <path
        d={stretches.map(([a, b]) => `M${point(a, at)}L${point(b, at)}`).join('')}
        strokeWidth="1.5"
        strokeDasharray={dash}
        className={look.line}
      />
      <path
        d={[from, to].map((end) => `M${point(end - 4, at + 4)}L${point(end + 4, at - 4)}`).join('')}
        strokeWidth="1.5"
        className={look.line}
      />
      <text
        x={box.x + box.width / 2}
        y={box.y + 11.5}
        textAnchor="middle"
        fontSize={labelPx}
        fontWeight={status === 'assumed' ? 400 : 600}
        strokeWidth="4"
        paintOrder="stroke"
        className={`${isEditable ? look.text : 'fill-ink'} ${ground === 'water' ? 'stroke-water' : 'stroke-sheet'}`}
      >
        {label}
      </text>
      {status === 'assumed' && isEditable && (
        <line
          x1={box.x}
          x2={box.x + box.width}
          y1={box.y + 15}
          y2={box.y + 15}
          strokeWidth="1"
          strokeDasharray="3 2"
          className="stroke-action"
        />
      )}
    </>
  )
  if (!isEditable) return <g aria-hidden="true">{drawn}</g>
  return (
    <EditTarget
      path={path}
      name={`${name} ${label}${status === 'assumed' ? ', assumed' : ''}`}
      box={target}
      {...(onEdit && { onEdit })}
      {...(editHref && { editHref })}
    >
      {drawn}
    </EditTarget>
  )
}
