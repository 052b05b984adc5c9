import { useId } from 'react'
import type { StandDrawing } from '#shared/engine/drawings/stand'
import type { Printer } from '#shared/units/print'
import { describeStand } from './describe-stand'
import { DimensionLine } from './dimension-line'
import { besideEdge } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { patternId, ZonePatterns } from './patterns'
import { boxAround, findCommon, layoutStand } from './stand-layout'
import { defaultWidthPx, gridStepMm } from './tank-layout'
import { useContainerWidth } from './use-container-width'

export interface StandPlanProps {
  readonly top: StandDrawing['top']
  /** The tank on it; without one the top is drawn alone. */
  readonly standing?: StandDrawing
  readonly printer: Printer
}

/** The stand's top from above with the tank in its middle; what stands over is hatched. */
export function StandPlan({ top, standing, printer }: StandPlanProps) {
  const id = useId()
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(defaultWidthPx)
  const tank = standing?.tank ?? null
  const { pxPerMm, middleX, floorPx, heightPx, size } = layoutStand({ top, tank }, widthPx)
  const deepPx = Math.max(top.widthMm, tank?.widthMm ?? 0) * pxPerMm
  const middleY = floorPx - deepPx / 2
  const board = boxAround(middleX, middleY, top.lengthMm * pxPerMm, top.widthMm * pxPerMm)
  const glass = tank && boxAround(middleX, middleY, tank.lengthMm * pxPerMm, tank.widthMm * pxPerMm)
  const outer = { x: Math.min(board.x, glass?.x ?? board.x), y: floorPx - deepPx }
  const right = 2 * middleX - outer.x
  const gridMm = gridStepMm(pxPerMm, printer.system)
  const isAssumed = standing !== undefined && (standing.assumed.length || standing.assumed.width)
  const sideText = (mm: number) => printer.length(Math.abs(mm) / 2)

  return (
    <DrawingSheet
      frame={frame}
      title="From above"
      description={
        standing
          ? describeStand(standing, printer)
          : `Its top from above: ${printer.size([top.lengthMm, top.widthMm])}, along the front and from front to back.`
      }
      widthPx={widthPx}
      heightPx={heightPx}
      size={size}
      grid={{ px: gridMm * pxPerMm, x: board.x, y: floorPx, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={false}
    >
      <ZonePatterns id={id} />
      <g aria-hidden="true">
        {glass && <rect {...glass} fill={`url(#${patternId(id, 'fail')})`} />}
        <rect {...board} strokeWidth="2" className="fill-sheet stroke-ink" />
        {glass && (
          <>
            <rect {...findCommon(board, glass)} className="fill-water" />
            <rect
              {...glass}
              fill="none"
              strokeWidth="1.5"
              strokeDasharray={isAssumed ? '5 4' : undefined}
              className="stroke-ink"
            />
            {glass.height > 40 && (
              <text x={middleX} y={middleY + 4} textAnchor="middle" fontSize="13" className="fill-ink-soft font-text">
                tank
              </text>
            )}
          </>
        )}
      </g>
      {glass &&
        standing &&
        [-1, 1].map((side) => (
          <DimensionLine
            key={side}
            axis="horizontal"
            from={middleX + (side * board.width) / 2}
            to={middleX + (side * glass.width) / 2}
            at={outer.y - 14}
            edge={outer.y}
            label={sideText(standing.spareMm.length)}
            name={side < 0 ? 'To the left' : 'To the right'}
            status="plain"
          />
        ))}
      {glass &&
        standing &&
        [-1, 1].map((side) => (
          <DimensionLine
            key={side}
            axis="vertical"
            from={middleY + (side * board.height) / 2}
            to={middleY + (side * glass.height) / 2}
            {...besideEdge(right, 1, '', 0)}
            edge={right}
            label={sideText(standing.spareMm.width)}
            name={side < 0 ? 'Behind' : 'In front'}
            status="plain"
          />
        ))}
      <DimensionLine
        axis="vertical"
        from={board.y}
        to={board.y + board.height}
        {...besideEdge(outer.x, -1, printer.length(top.widthMm), board.height)}
        edge={board.x}
        label={printer.length(top.widthMm)}
        name="Top, front to back"
        status="plain"
      />
      <DimensionLine
        axis="horizontal"
        from={board.x}
        to={board.x + board.width}
        at={floorPx + 16}
        edge={board.y + board.height}
        side="after"
        label={printer.length(top.lengthMm)}
        name="Top, along the front"
        status="plain"
      />
    </DrawingSheet>
  )
}
