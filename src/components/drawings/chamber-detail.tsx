import type { Printer } from '#shared/units/print'
import { describeRod, describeSlack, uprightSlackMm } from './describe-tank'
import { DimensionLine } from './dimension-line'
import { labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { placeRod } from './place-rod'
import { RodShape } from './rod-shape'
import { type ChamberDrawing, chamberPath, type DrawingEdits, type RodDrawing } from './tank-drawing'
import { defaultWidthPx, gridStepMm } from './tank-layout'
import { longestThatFits, monoWidth } from './text-width'
import { useContainerWidth } from './use-container-width'

export interface ChamberDetailProps extends DrawingEdits {
  readonly chamber: ChamberDrawing
  /** Position among the tank's chambers, for the setup paths. */
  readonly at: number
  readonly given: ReadonlySet<string>
  readonly printer: Printer
  readonly rod?: RodDrawing
  /** Kept free in plan to every wall, drawn as a dotted line. */
  readonly clearanceMm?: number
}

const margin = { top: 34, side: 64, bottom: 40 } as const
const tallPx = 240
const gapPx = 20

/** The chamber enlarged, upright and in plan, with its rod standing, leaning or lying, and what is left over. */
export function ChamberDetail(props: ChamberDetailProps) {
  const { chamber, at, given, printer, rod, clearanceMm = 10, onEdit, editHref } = props
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(defaultWidthPx)
  const edits = { ...(onEdit && { onEdit }), ...(editHref && { editHref }) }
  const status = (key: 'lengthMm' | 'widthMm' | 'waterDepthMm') =>
    given.has(chamberPath(at, key)) ? 'given' : 'assumed'

  const placed = rod && placeRod(rod, chamber)
  // A rod that leans from front to back is seen from the side.
  const isFromSide = placed !== undefined && placed.planAngleDeg > 45
  const acrossMm = isFromSide ? chamber.widthMm : chamber.lengthMm
  const seen = rod && placeRod(rod, isFromSide ? { lengthMm: chamber.widthMm, widthMm: chamber.lengthMm } : chamber)
  const rodLabel = rod ? printer.length(rod.lengthMm) : ''
  const rodRoom = rod ? monoWidth(rodLabel, labelPx) + gapPx : 0
  const highestMm = Math.max(chamber.waterDepthMm, seen?.heightMm ?? 0)
  const pxPerMm = Math.min(
    tallPx / highestMm,
    tallPx / chamber.widthMm,
    Math.max(60, widthPx - 2 * margin.side - rodRoom - gapPx) / (acrossMm + chamber.lengthMm),
  )
  const heightPx = tallPx + margin.top + margin.bottom
  const contentPx = (acrossMm + chamber.lengthMm) * pxPerMm + rodRoom + gapPx
  const leftX = (widthPx - contentPx) / 2
  const rightX = leftX + acrossMm * pxPerMm
  const floorY = heightPx - margin.bottom
  const waterY = floorY - chamber.waterDepthMm * pxPerMm
  const planX = rightX + rodRoom + gapPx
  const planRight = planX + chamber.lengthMm * pxPerMm
  const planY = floorY - chamber.widthMm * pxPerMm
  const clearPx = clearanceMm * pxPerMm
  const gridMm = gridStepMm(pxPerMm, printer.system)
  const slackMm = rod?.position === 'upright' ? uprightSlackMm(rod, chamber.waterDepthMm) : undefined
  const spare = slackMm === undefined ? undefined : describeSlack(slackMm, printer)
  const rodAt = rightX + gapPx / 2 + monoWidth(rodLabel, labelPx) / 2
  const rodTopY = floorY - (rod?.lengthMm ?? 0) * pxPerMm
  const spareY = (waterY + rodTopY) / 2
  // Beside the plan there is less room than above it.
  const spareRoom = (spareY < planY - 40 ? widthPx : planX) - rodAt - gapPx
  const spareText = spare && longestThatFits([spare, printer.length(Math.abs(slackMm ?? 0))], spareRoom, labelPx)

  return (
    <DrawingSheet
      frame={frame}
      title={`${chamber.name}, from the ${isFromSide ? 'side' : 'front'} and from above`}
      description={[
        `${printer.size([chamber.lengthMm, chamber.widthMm, chamber.waterDepthMm])} along the tank, front to back and water depth.`,
        rod && describeRod(rod, chamber.name, chamber.waterDepthMm, printer),
        `The dotted line keeps ${printer.length(clearanceMm)} to every wall.`,
      ]
        .filter(Boolean)
        .join(' ')}
      widthPx={widthPx}
      heightPx={heightPx}
      grid={{ px: gridMm * pxPerMm, x: leftX, y: floorY, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={onEdit !== undefined || editHref !== undefined}
    >
      <g aria-hidden="true">
        <rect x={leftX} y={waterY} width={acrossMm * pxPerMm} height={floorY - waterY} className="fill-action-soft" />
        <path
          d={`M${leftX} ${waterY - 14}V${floorY}H${rightX}V${waterY - 14}`}
          fill="none"
          strokeWidth="2"
          className="stroke-ink"
        />
        <line x1={leftX} x2={rightX} y1={waterY} y2={waterY} strokeWidth="1.5" className="stroke-action" />
        <rect
          x={planX}
          y={planY}
          width={planRight - planX}
          height={floorY - planY}
          strokeWidth="2"
          className="fill-action-soft stroke-ink"
        />
        {clearPx * 2 < Math.min(planRight - planX, floorY - planY) && (
          <rect
            x={planX + clearPx}
            y={planY + clearPx}
            width={planRight - planX - 2 * clearPx}
            height={floorY - planY - 2 * clearPx}
            fill="none"
            strokeWidth="1.5"
            strokeDasharray="1.5 3"
            className="stroke-ink-soft"
          />
        )}
        {rod && placed && seen && (
          <>
            <RodShape
              x={(leftX + rightX) / 2}
              y={floorY - (seen.heightMm / 2) * pxPerMm}
              lengthPx={seen.seenLengthMm * pxPerMm}
              thickPx={rod.diameterMm * pxPerMm}
              angleDeg={seen.seenAngleDeg}
              verdict={rod.verdict}
            />
            <RodShape
              x={(planX + planRight) / 2}
              y={(planY + floorY) / 2}
              lengthPx={placed.planLengthMm * pxPerMm}
              thickPx={rod.diameterMm * pxPerMm}
              angleDeg={placed.planAngleDeg}
              verdict={rod.verdict}
            />
          </>
        )}
      </g>
      <DimensionLine
        {...edits}
        axis="vertical"
        from={waterY}
        to={floorY}
        at={leftX - 34}
        edge={leftX}
        label={printer.length(chamber.waterDepthMm)}
        name={`${chamber.name}, water depth`}
        status={status('waterDepthMm')}
        path={chamberPath(at, 'waterDepthMm')}
      />
      <DimensionLine
        {...edits}
        axis="vertical"
        from={planY}
        to={floorY}
        at={planRight + 34}
        edge={planRight}
        label={printer.length(chamber.widthMm)}
        name={`${chamber.name}, front to back`}
        status={status('widthMm')}
        path={chamberPath(at, 'widthMm')}
      />
      <DimensionLine
        {...edits}
        axis="horizontal"
        from={planX}
        to={planRight}
        at={planY - 12}
        edge={planY}
        label={printer.length(chamber.lengthMm)}
        name={`${chamber.name}, along the tank`}
        status={status('lengthMm')}
        path={chamberPath(at, 'lengthMm')}
      />
      {rod?.position === 'upright' && (
        <>
          <DimensionLine
            axis="vertical"
            from={rodTopY}
            to={floorY}
            at={rodAt}
            label={rodLabel}
            name="Rod"
            status="plain"
          />
          <DimensionLine axis="vertical" from={waterY} to={rodTopY} at={rodAt} label="" name="Spare" status="plain" />
          <text
            x={rodAt + 10}
            y={spareY + 4}
            fontSize={labelPx}
            fontWeight="600"
            aria-hidden="true"
            className={(slackMm ?? 0) < 0 ? 'fill-no' : 'fill-fits'}
          >
            {spareText}
          </text>
        </>
      )}
      {rod && rod.position !== 'upright' && (
        <text
          x={(leftX + rightX) / 2}
          y={floorY + 20}
          textAnchor="middle"
          fontSize={labelPx}
          aria-hidden="true"
          className="fill-ink"
        >
          {rodLabel} {rod.position === 'leaning' ? `at ${Math.round(rod.angleDeg)}°` : 'flat'}
        </text>
      )}
    </DrawingSheet>
  )
}
