import type { HeatDrawing, HeatPoint } from '#shared/engine/drawings/heat'
import type { Printer } from '#shared/units/print'
import { DrawingSheet } from './drawing-sheet'
import { Legend } from './legend'
import { ScaleAxis } from './scale-axis'
import { placePercent } from './scale-domain'
import { longestThatFits, monoWidth } from './text-width'
import { useContainerWidth } from './use-container-width'

const sidePx = 24
const topPx = 26
const plotPx = 150
const axisPx = 30
const labelPx = 12

/** The drawing in words. */
function describeHeat(drawing: HeatDrawing, printer: Printer): string {
  const { points, heaterW, heldC, goalC, coldestC, warmestC, unheatedC, stuckOnC } = drawing
  const [cold] = points
  const need = cold ? printer.pair([cold.needW, cold.needUpperW], 'W') : ''
  return [
    `To hold ${printer.temperature(goalC)} it takes ${need} with the room at ${printer.temperature(coldestC)}.`,
    heaterW === 0
      ? 'There is no heater that states its power.'
      : `The heaters give ${printer.power(heaterW)}${heldC === null ? '' : `, which holds it with the room down to ${printer.temperature(heldC)}`}.`,
    `With the room at ${printer.temperature(warmestC)} and no heater on, the water settles at ${printer.temperature(unheatedC)}.`,
    ...(stuckOnC === null
      ? []
      : [`Should the heaters never switch off then, it goes to ${printer.temperature(stuckOnC)}.`]),
  ].join(' ')
}

/** What it takes to hold the goal from the coldest night to the warmest day, and what the heaters give. */
export function HeatLine({ drawing, printer }: { readonly drawing: HeatDrawing; readonly printer: Printer }) {
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(480)
  const { points, heaterW, coldestC, warmestC } = drawing
  const insidePx = widthPx - 2 * sidePx
  const mostW = Math.max(heaterW, ...points.map(({ needUpperW }) => needUpperW), 1) * 1.12
  const domain = [coldestC, Math.max(warmestC, coldestC + 1)] as const
  const x = (roomC: number) => sidePx + (placePercent(roomC, domain) / 100) * insidePx
  const y = (watts: number) => topPx + plotPx - (watts / mostW) * plotPx
  const path = (pick: (point: HeatPoint) => number, from: readonly HeatPoint[]) =>
    from.map((point) => `${x(point.roomC)} ${y(pick(point))}`).join('L')
  const band = `M${path((point) => point.needUpperW, points)}L${path((point) => point.needW, points.toReversed())}Z`
  const upper = points[0]?.needUpperW ?? 0
  const heaterText = longestThatFits([`heaters ${printer.power(heaterW)}`, printer.power(heaterW)], insidePx, labelPx)
  const needText = `takes ${printer.pair([points[0]?.needW ?? 0, upper], 'W')}`
  const needY = y(upper) - 8
  const isClose = heaterW > 0 && Math.abs(y(heaterW) - 6 - needY) < 18
  return (
    <DrawingSheet
      frame={frame}
      title="Heat, from the coldest night to the warmest day"
      description={describeHeat(drawing, printer)}
      widthPx={widthPx}
      heightPx={topPx + plotPx + axisPx}
      isInteractive={false}
      legend={
        <Legend
          items={[
            {
              key: 'need',
              swatch: <rect width="22" height="14" className="fill-action" opacity="0.35" />,
              text: 'what it takes: between two published figures for evaporation',
            },
            ...(heaterW > 0
              ? [
                  {
                    key: 'give',
                    swatch: <path d="M0 7h22" strokeWidth="2.5" className="stroke-fits" />,
                    text: 'what the heaters give',
                  },
                ]
              : []),
          ]}
        />
      }
    >
      <g aria-hidden="true">
        <path d={band} strokeWidth="1.5" className="fill-action stroke-action" fillOpacity="0.35" />
        {heaterW > 0 && (
          <path d={`M${sidePx} ${y(heaterW)}H${sidePx + insidePx}`} strokeWidth="2.5" className="stroke-fits" />
        )}
        {heaterW > 0 && heaterText && (
          <text
            x={sidePx + insidePx - monoWidth(heaterText, labelPx)}
            y={y(heaterW) - 6}
            fontSize={labelPx}
            fontWeight="600"
            className="fill-fits"
          >
            {heaterText}
          </text>
        )}
        <text
          x={sidePx + 2}
          y={isClose && insidePx < 330 ? needY + 34 : needY}
          fontSize={labelPx}
          fontWeight="600"
          strokeWidth="4"
          paintOrder="stroke"
          className="fill-action stroke-sheet"
        >
          {needText}
        </text>
        <svg x={sidePx} width={insidePx} height={topPx + plotPx + axisPx} overflow="visible">
          <ScaleAxis domain={domain} unit="C" printer={printer} widthPx={insidePx} y={topPx + plotPx} />
        </svg>
      </g>
    </DrawingSheet>
  )
}
