import type { Printer } from '#shared/units/print'
import { ChamberViews } from './chamber-views'
import { describeRod, describeSlack, uprightSlackMm } from './describe-tank'
import { DimensionLine } from './dimension-line'
import { besideEdge, labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { placeRod } from './place-rod'
import { type ChamberDrawing, chamberPath, type DrawingEdits, type RodDrawing } from './tank-drawing'
import { defaultWidthPx, gridStepMm, sidePx } from './tank-layout'
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

const abovePx = 36
const belowPx = 42
const tallestPx = 250
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
  const isUpright = rod?.position === 'upright'
  const betweenPx = gapPx + (isUpright ? monoWidth(rodLabel, labelPx) + gapPx : 0)
  const highestMm = Math.max(chamber.waterDepthMm, seen?.heightMm ?? 0, chamber.widthMm)
  const parts = acrossMm + chamber.lengthMm
  const mostPxPerMm = tallestPx / highestMm
  const pxPerMm = Math.min(mostPxPerMm, Math.max(60, widthPx - 2 * sidePx - betweenPx) / parts)
  const floorY = abovePx + highestMm * pxPerMm
  const heightPx = floorY + belowPx
  const leftX = (widthPx - parts * pxPerMm - betweenPx) / 2
  const rightX = leftX + acrossMm * pxPerMm
  const waterY = floorY - chamber.waterDepthMm * pxPerMm
  const planX = rightX + betweenPx
  const planRight = planX + chamber.lengthMm * pxPerMm
  const planY = floorY - chamber.widthMm * pxPerMm
  const gridMm = gridStepMm(pxPerMm, printer.system)
  const slackMm = rod && isUpright ? uprightSlackMm(rod, chamber.waterDepthMm) : undefined
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
      title={`${chamber.name}, ${isFromSide ? 'side' : 'front'} and above`}
      description={[
        `${printer.size([chamber.lengthMm, chamber.widthMm, chamber.waterDepthMm])} along the tank, front to back and water depth.`,
        rod && describeRod(rod, chamber.name, chamber.waterDepthMm, printer),
        `The dotted line keeps ${printer.length(clearanceMm)} to every wall.`,
      ]
        .filter(Boolean)
        .join(' ')}
      widthPx={widthPx}
      heightPx={heightPx}
      size={{ acrossPx: parts * mostPxPerMm, contentPx: highestMm * mostPxPerMm, betweenPx, abovePx, belowPx }}
      grid={{ px: gridMm * pxPerMm, x: leftX, y: floorY, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={onEdit !== undefined || editHref !== undefined}
    >
      <ChamberViews
        water={{ x: leftX, y: waterY, width: rightX - leftX, height: floorY - waterY }}
        plan={{ x: planX, y: planY, width: planRight - planX, height: floorY - planY }}
        clearPx={clearanceMm * pxPerMm}
        pxPerMm={pxPerMm}
        rod={rod}
        seen={seen}
        placed={placed}
      />
      <DimensionLine
        {...edits}
        axis="vertical"
        from={waterY}
        to={floorY}
        {...besideEdge(leftX, -1, printer.length(chamber.waterDepthMm), floorY - waterY)}
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
        {...besideEdge(planRight, 1, printer.length(chamber.widthMm), floorY - planY)}
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
      {isUpright && (
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
      {rod && !isUpright && (
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
