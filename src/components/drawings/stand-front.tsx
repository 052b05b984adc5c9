import { useId } from 'react'
import type { StandDrawing } from '#shared/engine/drawings/stand'
import type { Printer } from '#shared/units/print'
import { describeStand } from './describe-stand'
import { DimensionLine } from './dimension-line'
import { besideEdge } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { patternId, ZonePatterns } from './patterns'
import { findStubMm, layoutStand } from './stand-layout'
import { defaultWidthPx, gridStepMm } from './tank-layout'
import { useContainerWidth } from './use-container-width'

const boardPx = 9

/** Tank and stand from the front, the stand broken off below its top. */
export function StandFront({ standing, printer }: { readonly standing: StandDrawing; readonly printer: Printer }) {
  const id = useId()
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(defaultWidthPx)
  const { top, tank, assumed } = standing
  const { pxPerMm, middleX, floorPx, heightPx, size } = layoutStand(standing, widthPx)
  const deckY = floorPx - findStubMm(tank) * pxPerMm
  const half = { top: (top.lengthMm * pxPerMm) / 2, tank: (tank.lengthMm * pxPerMm) / 2 }
  const glassY = deckY - tank.heightMm * pxPerMm
  const left = middleX - half.top
  const right = middleX + Math.max(half.top, half.tank)
  const gridMm = gridStepMm(pxPerMm, printer.system)
  const overPx = half.tank - half.top
  return (
    <DrawingSheet
      frame={frame}
      title="From the front"
      description={describeStand(standing, printer)}
      widthPx={widthPx}
      heightPx={heightPx}
      size={size}
      grid={{ px: gridMm * pxPerMm, x: left, y: deckY, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={false}
    >
      <ZonePatterns id={id} />
      <g aria-hidden="true">
        <path
          d={`M${left} ${floorPx}V${deckY}h${half.top * 2}V${floorPx}`}
          strokeWidth="2"
          className="fill-sheet stroke-ink"
        />
        <path d={`M${left} ${deckY + boardPx}h${half.top * 2}`} strokeWidth="1" className="stroke-ink-soft" />
        <path
          d={`M${left - 8} ${floorPx}H${middleX - 10}l6 -7l8 14l6 -7H${left + half.top * 2 + 8}`}
          strokeWidth="1"
          className="fill-sheet stroke-ink-soft"
        />
        <rect
          x={middleX - half.tank}
          y={glassY}
          width={half.tank * 2}
          height={deckY - glassY}
          strokeWidth="1.5"
          strokeDasharray={assumed.length || assumed.height ? '5 4' : undefined}
          className="fill-water stroke-ink"
        />
        {overPx > 0.5 &&
          [middleX - half.tank, middleX + half.top].map((x) => (
            <rect key={x} x={x} y={deckY} width={overPx} height={boardPx} fill={`url(#${patternId(id, 'fail')})`} />
          ))}
        <text
          x={middleX}
          y={(glassY + deckY) / 2 + 4}
          textAnchor="middle"
          fontSize="13"
          className="fill-ink-soft font-text"
        >
          tank
        </text>
        <text
          x={middleX}
          y={(deckY + boardPx + floorPx) / 2 + 4}
          textAnchor="middle"
          fontSize="13"
          className="fill-ink-soft font-text"
        >
          stand
        </text>
      </g>
      <DimensionLine
        axis="horizontal"
        from={middleX - half.tank}
        to={middleX + half.tank}
        at={glassY - 14}
        edge={glassY}
        label={printer.length(tank.lengthMm)}
        name="Tank, along the top"
        status={assumed.length ? 'assumed' : 'plain'}
      />
      <DimensionLine
        axis="vertical"
        from={glassY}
        to={deckY}
        {...besideEdge(right, 1, printer.length(tank.heightMm), deckY - glassY)}
        edge={middleX + half.tank}
        label={printer.length(tank.heightMm)}
        name="Tank, height"
        status={assumed.height ? 'assumed' : 'plain'}
      />
      <DimensionLine
        axis="horizontal"
        from={left}
        to={left + half.top * 2}
        at={floorPx + 20}
        edge={floorPx}
        side="after"
        label={printer.length(top.lengthMm)}
        name="Top, along the front"
        status="plain"
      />
    </DrawingSheet>
  )
}
