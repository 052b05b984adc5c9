import type { Printer } from '#shared/units/print'
import { assignRows } from './assign-rows'
import { describeTank } from './describe-tank'
import { DimensionLine } from './dimension-line'
import { besideEdge, labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { PlanChamber } from './plan-chamber'
import { PlanDisplay } from './plan-display'
import { placeRod } from './place-rod'
import { RodShape } from './rod-shape'
import { activeChamber, chamberPath, chamberStartsMm, type DrawingEdits, type TankDrawing } from './tank-drawing'
import { defaultWidthPx, layoutTank } from './tank-layout'
import { monoWidth } from './text-width'
import { useContainerWidth } from './use-container-width'

export interface TankViewProps extends DrawingEdits {
  readonly drawing: TankDrawing
  readonly printer: Printer
}

const rowPx = 20

/** The tank from above, back wall at the top: walls, rear chambers, display, and the rod in its place. */
export function TankPlan({ drawing, printer, onEdit, editHref }: TankViewProps) {
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(defaultWidthPx)
  const layout = layoutTank(drawing, widthPx, printer.system)
  const { pxPerMm, leftPx, topPx } = layout
  const edits = { ...(onEdit && { onEdit }), ...(editHref && { editHref }) }
  const status = (path: string) => (drawing.given.has(path) ? 'given' : 'assumed')

  const { chambers, rod } = drawing
  const lengthPx = drawing.outerLengthMm * pxPerMm
  const depthPx = drawing.outerWidthMm * pxPerMm
  const wallPx = drawing.wallMm * pxPerMm
  const inside = { x: leftPx + wallPx, y: topPx + wallPx, width: lengthPx - 2 * wallPx, height: depthPx - 2 * wallPx }
  const active = activeChamber(drawing)
  const boxes = chamberStartsMm(chambers).map((startMm, at) => ({
    x: inside.x + startMm * pxPerMm,
    y: inside.y,
    width: (chambers[at]?.lengthMm ?? 0) * pxPerMm,
    height: (chambers[at]?.widthMm ?? 0) * pxPerMm,
  }))
  const rows = assignRows(
    boxes.map((box, at) => {
      const half = Math.max(box.width, monoWidth(printer.length(chambers[at]?.lengthMm ?? 0), labelPx) + 8) / 2
      return [box.x + box.width / 2 - half, box.x + box.width / 2 + half]
    }),
  )
  const chambersDeepPx = Math.max(0, ...boxes.map((box) => box.height))
  const display = { ...inside, y: inside.y + chambersDeepPx, height: inside.height - chambersDeepPx }
  const isOutsideGiven = drawing.given.has('tank.outerLengthMm') && drawing.given.has('tank.outerWidthMm')
  const activeBox = boxes[active]
  const rodBox = activeBox ?? display
  const placed = rod && placeRod(rod, { lengthMm: rodBox.width / pxPerMm, widthMm: rodBox.height / pxPerMm })

  return (
    <DrawingSheet
      frame={frame}
      title="From above"
      description={describeTank(drawing, printer)}
      widthPx={widthPx}
      heightPx={layout.heightPx}
      size={layout.size}
      grid={{ px: layout.gridPx, x: leftPx, y: topPx, label: `grid ${printer.length(layout.gridMm)}` }}
      isInteractive={onEdit !== undefined || editHref !== undefined}
    >
      <rect
        x={leftPx}
        y={topPx}
        width={lengthPx}
        height={depthPx}
        strokeWidth="1.5"
        strokeDasharray={isOutsideGiven ? undefined : '5 4'}
        className="fill-sheet stroke-ink"
      />
      <rect {...inside} strokeWidth="1" className="fill-water stroke-ink-soft" />
      <PlanDisplay display={display} inside={inside} canAddChamber={chambers.length === 0} edits={edits} />
      {chambers.map((chamber, at) => {
        const box = boxes[at]
        return (
          box && (
            <PlanChamber
              key={chamber.id}
              name={chamber.name}
              box={box}
              isActive={at === active}
              isGiven={drawing.given.has(chamberPath(at, 'lengthMm')) && drawing.given.has(chamberPath(at, 'widthMm'))}
              hasRod={at === active && rod !== undefined}
            />
          )
        )
      })}
      {chambers.map((chamber, at) => {
        const box = boxes[at]
        return (
          box && (
            <DimensionLine
              key={chamber.id}
              {...edits}
              axis="horizontal"
              from={box.x}
              to={box.x + box.width}
              at={topPx - 12 - (rows[at] ?? 0) * rowPx}
              // Hairlines from an upper row stop short of the labels below it.
              edge={rows[at] ? topPx - 4 - (rows[at] ?? 0) * rowPx : topPx}
              label={printer.length(chamber.lengthMm)}
              name={`${chamber.name}, along the tank`}
              status={status(chamberPath(at, 'lengthMm'))}
              path={chamberPath(at, 'lengthMm')}
            />
          )
        )
      })}
      {activeBox && (
        <DimensionLine
          {...edits}
          axis="vertical"
          from={activeBox.y}
          to={activeBox.y + activeBox.height}
          {...besideEdge(leftPx, -1, printer.length(chambers[active]?.widthMm ?? 0), activeBox.height)}
          edge={activeBox.x}
          label={printer.length(chambers[active]?.widthMm ?? 0)}
          name={`${chambers[active]?.name}, front to back`}
          status={status(chamberPath(active, 'widthMm'))}
          path={chamberPath(active, 'widthMm')}
        />
      )}
      {rod && placed && (
        <g aria-hidden="true">
          <RodShape
            x={rodBox.x + rodBox.width / 2}
            y={rodBox.y + rodBox.height / 2}
            lengthPx={placed.planLengthMm * pxPerMm}
            thickPx={rod.diameterMm * pxPerMm}
            angleDeg={placed.planAngleDeg}
            verdict={rod.verdict}
          />
        </g>
      )}
      <DimensionLine
        {...edits}
        axis="vertical"
        from={topPx}
        to={topPx + depthPx}
        {...besideEdge(leftPx + lengthPx, 1, printer.length(drawing.outerWidthMm), depthPx)}
        edge={leftPx + lengthPx}
        label={printer.length(drawing.outerWidthMm)}
        name="Outside, front to back"
        status={status('tank.outerWidthMm')}
        path="tank.outerWidthMm"
      />
      <DimensionLine
        {...edits}
        axis="horizontal"
        from={leftPx}
        to={leftPx + lengthPx}
        at={topPx + depthPx + 16}
        edge={topPx + depthPx}
        side="after"
        label={printer.length(drawing.outerLengthMm)}
        name="Outside length"
        status={status('tank.outerLengthMm')}
        path="tank.outerLengthMm"
      />
    </DrawingSheet>
  )
}
