import { describeTank } from './describe-tank'
import { besideEdge } from './dimension-layout'
import { DimensionLine } from './dimension-line'
import { DrawingSheet } from './drawing-sheet'
import { placeRod } from './place-rod'
import { RodShape } from './rod-shape'
import { SectionChain } from './section-chain'
import { activeChamber, chamberPath, chamberStartsMm } from './tank-drawing'
import { defaultWidthPx, layoutTank } from './tank-layout'
import type { TankViewProps } from './tank-plan'
import { TextTarget } from './text-target'
import { useContainerWidth } from './use-container-width'

/** The tank cut open from the front: floor, walls, water line, the chamber in question and the rod in it. */
export function TankSection({ drawing, printer, onEdit, editHref }: TankViewProps) {
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(defaultWidthPx)
  const layout = layoutTank(drawing, widthPx, printer.system)
  const { pxPerMm, leftPx, floorPx: bottomY } = layout
  const edits = { ...(onEdit && { onEdit }), ...(editHref && { editHref }) }
  const isGiven = (path: string) => drawing.given.has(path)
  const status = (path: string) => (isGiven(path) ? 'given' : 'assumed')

  const { chambers, rod } = drawing
  const lengthPx = drawing.outerLengthMm * pxPerMm
  const tallPx = drawing.outerHeightMm * pxPerMm
  const wallPx = drawing.wallMm * pxPerMm
  const topY = bottomY - tallPx
  const floorY = bottomY - drawing.bottomMm * pxPerMm
  const waterY = floorY - drawing.waterLineMm * pxPerMm
  const inside = { x: leftPx + wallPx, width: lengthPx - 2 * wallPx }
  const right = leftPx + lengthPx

  const active = activeChamber(drawing)
  const starts = chamberStartsMm(chambers)
  const boxes = chambers.map((chamber, at) => ({
    x: inside.x + (starts[at] ?? 0) * pxPerMm,
    y: floorY - chamber.waterDepthMm * pxPerMm,
    width: chamber.lengthMm * pxPerMm,
    height: chamber.waterDepthMm * pxPerMm,
  }))
  const activeBox = boxes[active]
  const chamber = chambers[active]
  const rodRoom = activeBox ?? { x: inside.x, y: waterY, width: inside.width, height: floorY - waterY }
  const placed =
    rod && placeRod(rod, { lengthMm: rodRoom.width / pxPerMm, widthMm: chamber?.widthMm ?? drawing.outerWidthMm })
  const isOutsideGiven = isGiven('tank.outerLengthMm') && isGiven('tank.outerHeightMm')
  const isDepthGiven = isGiven(chamberPath(active, 'waterDepthMm'))

  return (
    <DrawingSheet
      frame={frame}
      title="From the front"
      description={describeTank(drawing, printer)}
      widthPx={widthPx}
      heightPx={layout.heightPx}
      size={layout.size}
      grid={{ px: layout.gridPx, x: leftPx, y: bottomY, label: `grid ${printer.length(layout.gridMm)}` }}
      isInteractive={onEdit !== undefined || editHref !== undefined}
    >
      <g aria-hidden="true">
        <rect x={inside.x} y={waterY} width={inside.width} height={floorY - waterY} className="fill-water" />
        <path
          d={`M${leftPx} ${topY}V${bottomY}H${right}V${topY}`}
          fill="none"
          strokeWidth="1.5"
          strokeDasharray={isOutsideGiven ? undefined : '5 4'}
          className="stroke-ink"
        />
        <path
          d={`M${inside.x} ${topY}V${floorY}H${inside.x + inside.width}V${topY}`}
          fill="none"
          strokeWidth="1"
          className="stroke-ink-soft"
        />
        <line
          x1={inside.x}
          x2={inside.x + inside.width}
          y1={waterY}
          y2={waterY}
          strokeWidth="1.5"
          strokeDasharray={isGiven('tank.waterLineMm') ? undefined : '5 4'}
          className="stroke-action"
        />
        {waterY - topY >= 14 && (
          <text
            x={right - wallPx - 6}
            y={waterY - 4}
            textAnchor="end"
            fontSize="11"
            className="fill-ink-soft font-text"
          >
            water line
          </text>
        )}
        {boxes.map((box, at) =>
          at === active ? null : (
            <path
              key={chambers[at]?.id}
              d={`M${box.x} ${floorY}V${box.y}h${box.width}V${floorY}`}
              fill="none"
              strokeWidth="1"
              className="stroke-ink-soft"
              opacity="0.6"
            />
          ),
        )}
        {activeBox && (
          <rect
            {...activeBox}
            strokeWidth={isDepthGiven ? 2 : 1.5}
            strokeDasharray={isDepthGiven ? undefined : '5 4'}
            className={`fill-action-soft ${isDepthGiven ? 'stroke-action' : 'stroke-ink'}`}
          />
        )}
        {rod && placed && (
          <RodShape
            x={rodRoom.x + rodRoom.width / 2}
            y={floorY - (placed.heightMm / 2) * pxPerMm}
            lengthPx={placed.seenLengthMm * pxPerMm}
            thickPx={rod.diameterMm * pxPerMm}
            angleDeg={placed.seenAngleDeg}
            verdict={rod.verdict}
          />
        )}
      </g>
      <SectionChain
        edits={edits}
        printer={printer}
        rod={rod}
        room={inside}
        box={activeBox}
        floorY={floorY}
        pxPerMm={pxPerMm}
        depth={
          chamber && {
            mm: chamber.waterDepthMm,
            name: `${chamber.name}, water depth`,
            status: status(chamberPath(active, 'waterDepthMm')),
            path: chamberPath(active, 'waterDepthMm'),
          }
        }
      />
      <DimensionLine
        {...edits}
        axis="vertical"
        from={waterY}
        to={floorY}
        {...besideEdge(leftPx, -1, printer.length(drawing.waterLineMm), floorY - waterY)}
        edge={leftPx}
        label={printer.length(drawing.waterLineMm)}
        name="Water line above the floor inside"
        status={status('tank.waterLineMm')}
        path="tank.waterLineMm"
      />
      <DimensionLine
        {...edits}
        axis="vertical"
        from={topY}
        to={bottomY}
        {...besideEdge(right, 1, printer.length(drawing.outerHeightMm), tallPx)}
        edge={right}
        label={printer.length(drawing.outerHeightMm)}
        name="Outside height"
        status={status('tank.outerHeightMm')}
        path="tank.outerHeightMm"
      />
      <TextTarget
        edits={edits}
        x={leftPx}
        y={bottomY + 22}
        text={`walls ${printer.length(drawing.wallMm)}`}
        name={`Walls ${printer.length(drawing.wallMm)}`}
        isGiven={isGiven('tank.wallMm')}
        path="tank.wallMm"
      />
      <TextTarget
        edits={edits}
        x={leftPx}
        y={bottomY + 47}
        text={`floor ${printer.length(drawing.bottomMm)}`}
        name={`Floor thickness ${printer.length(drawing.bottomMm)}`}
        isGiven={isGiven('tank.bottomMm')}
        path="tank.bottomMm"
      />
    </DrawingSheet>
  )
}
