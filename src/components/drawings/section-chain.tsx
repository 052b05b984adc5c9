import type { Printer } from '#shared/units/print'
import { describeSlack, uprightSlackMm } from './describe-tank'
import { labelPx, type Box } from './dimension-layout'
import { DimensionLine, type DimensionLineProps } from './dimension-line'
import type { DrawingEdits, RodDrawing } from './tank-drawing'
import { longestThatFits, monoWidth } from './text-width'

export interface SectionChainProps {
  readonly edits: DrawingEdits
  readonly printer: Printer
  readonly rod: RodDrawing | undefined
  /** Inside of the tank. */
  readonly room: { readonly x: number; readonly width: number }
  /** Water of the chamber; none for a rod in the display. */
  readonly box: Box | undefined
  readonly floorY: number
  readonly pxPerMm: number
  readonly depth:
    | {
        readonly mm: number
        readonly name: string
        readonly status: DimensionLineProps['status']
        readonly path: string
      }
    | undefined
}

const gapPx = 9

/** The chamber's depth, the rod's length and what is left over it, one beside the other on the roomier side. */
export function SectionChain({ edits, printer, rod, room, box, floorY, pxPerMm, depth }: SectionChainProps) {
  if (!box || !depth) return null
  const roomRight = room.x + room.width - (box.x + box.width)
  const roomLeft = box.x - room.x
  const direction = roomRight >= roomLeft ? 1 : -1
  const edge = direction > 0 ? box.x + box.width : box.x
  const free = Math.max(roomRight, roomLeft)
  const depthLabel = printer.length(depth.mm)
  const depthWidth = monoWidth(depthLabel, labelPx)
  const depthAt = edge + direction * (gapPx + depthWidth / 2)
  const used = gapPx + depthWidth + gapPx

  const line = (
    <DimensionLine
      {...edits}
      axis="vertical"
      from={box.y}
      to={floorY}
      at={depthAt}
      edge={edge}
      ground="water"
      label={depthLabel}
      name={depth.name}
      status={depth.status}
      path={depth.path}
    />
  )
  if (!rod) return line
  const anchor = direction > 0 ? 'start' : 'end'
  const rodLabel = printer.length(rod.lengthMm)

  if (rod.position !== 'upright') {
    const full = `${rodLabel} ${rod.position}`
    const texts =
      rod.position === 'flat' ? [full, rodLabel] : [`${full} at ${Math.round(rod.angleDeg)}°`, full, rodLabel]
    const inside = rod.position === 'flat' ? longestThatFits(texts, box.width - 6, labelPx) : undefined
    const text = inside ?? longestThatFits(texts, free - used, labelPx)
    return (
      <>
        {line}
        {text && (
          <text
            x={inside ? box.x + box.width / 2 : edge + direction * used}
            y={inside ? floorY - rod.diameterMm * pxPerMm - 10 : floorY - 10}
            textAnchor={inside ? 'middle' : anchor}
            fontSize={labelPx}
            aria-hidden="true"
            className="fill-ink"
          >
            {text}
          </text>
        )}
      </>
    )
  }

  const slackMm = uprightSlackMm(rod, depth.mm)
  const rodWidth = monoWidth(rodLabel, labelPx)
  const rodAt = edge + direction * (used + rodWidth / 2)
  const rodTop = floorY - rod.lengthMm * pxPerMm
  const slackFull = describeSlack(slackMm, printer)
  const afterRod = used + rodWidth / 2 + gapPx
  const slack = longestThatFits([slackFull, printer.length(Math.abs(slackMm))], free - afterRod, labelPx)
  if (used + rodWidth > free) return line
  return (
    <>
      {line}
      <DimensionLine
        axis="vertical"
        from={rodTop}
        to={floorY}
        at={rodAt}
        label={rodLabel}
        name="Rod"
        ground="water"
        status="plain"
      />
      <DimensionLine axis="vertical" from={box.y} to={rodTop} at={rodAt} label="" name="Spare" status="plain" />
      {slack && (
        <text
          x={edge + direction * afterRod}
          y={(box.y + rodTop) / 2 + 4}
          textAnchor={anchor}
          fontSize={labelPx}
          fontWeight="600"
          aria-hidden="true"
          className={slackMm < 0 ? 'fill-no' : 'fill-fits'}
        >
          {slack}
        </text>
      )}
    </>
  )
}
