import type { HeatDayDrawing } from '#shared/engine/drawings/heat-day'
import { fromShown, toShown } from '#shared/units/convert'
import type { Printer } from '#shared/units/print'
import { describeHeatDay, printHeld, printOff, printStuck } from './describe-heat-day'
import { labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { Legend, type LegendItem } from './legend'
import { ScaleAxis } from './scale-axis'
import { monoWidth } from './text-width'
import { niceTicks } from './ticks'
import { useContainerWidth } from './use-container-width'

export interface HeatDayProps {
  readonly drawing: HeatDayDrawing
  readonly printer: Printer
}

const sheet = { leftPx: 54, topPx: 34, bottomPx: 236, heightPx: 284, defaultPx: 480 } as const
const hours = 24
const gapPx = 15

const look = {
  stuck: { strokeWidth: 2.5, className: 'stroke-no' },
  held: { strokeWidth: 2.5, className: 'stroke-ink' },
  off: { strokeWidth: 2, strokeDasharray: '6 4', className: 'stroke-ink-soft' },
} as const

type Curve = keyof typeof look

/** Keeps labels at the ends of lines from standing on each other: each at its own height or pushed down under the last. */
function spreadLabels(wanted: readonly { readonly key: Curve; readonly y: number }[]) {
  let last = Number.NEGATIVE_INFINITY
  return wanted
    .toSorted((a, b) => a.y - b.y)
    .map(({ key, y }) => {
      last = Math.max(y, last + gapPx)
      return { key, y: last }
    })
}

/** The water's temperature over a day: with the heater working, off, and stuck on. */
export function HeatDay({ drawing, printer }: HeatDayProps) {
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(sheet.defaultPx)
  const { held, off, stuck, goalC } = drawing
  const curves = ([['stuck', stuck] as const, ['held', held] as const, ['off', off] as const] as const).flatMap(
    ([key, points]) => (points === null ? [] : [{ key, points }]),
  )
  const all = curves.flatMap(({ points }) => points.map(({ waterC }) => waterC))
  const [lowest, highest] = [Math.min(goalC - 1, ...all), Math.max(goalC + 1, ...all)]
  const air = 0.06 * (highest - lowest)
  const domain = [lowest - air, highest + air] as const
  const endOf = (points: HeatDayDrawing['off']) => points.at(-1)?.waterC ?? goalC
  const rightPx = 16 + Math.max(...curves.map(({ points }) => monoWidth(printer.temperature(endOf(points)), labelPx)))
  const plot = { x: sheet.leftPx, width: Math.max(80, widthPx - sheet.leftPx - rightPx) }
  const toX = plot.x + plot.width
  const xOf = (hour: number) => plot.x + (hour / hours) * plot.width
  const yOf = (waterC: number) =>
    sheet.bottomPx - ((waterC - domain[0]) / (domain[1] - domain[0])) * (sheet.bottomPx - sheet.topPx)
  const ticks = niceTicks(toShown(domain[0], 'C', printer.system), toShown(domain[1], 'C', printer.system), 6)
  const texts = {
    stuck: printStuck(drawing, printer),
    held: printHeld(drawing, printer),
    off: printOff(drawing, printer),
  }
  const items = curves.map(({ key }): LegendItem => ({
    key,
    swatch: <path d="M1 7h20" fill="none" {...look[key]} />,
    text: texts[key],
  }))
  const ends = new Map(curves.map(({ key, points }) => [key, endOf(points)]))
  const labels = spreadLabels(curves.map(({ key, points }) => ({ key, y: yOf(endOf(points)) })))

  return (
    <DrawingSheet
      frame={frame}
      title="The water over a day"
      description={describeHeatDay(drawing, printer)}
      widthPx={widthPx}
      heightPx={sheet.heightPx}
      isInteractive={false}
      legend={<Legend items={items} />}
    >
      <g aria-hidden="true">
        <text x={12} y={16} fontSize={labelPx} className="fill-ink-soft">
          water, {printer.unitLabel('C')}
        </text>
        <text x={toX} y={sheet.heightPx - 8} textAnchor="end" fontSize={labelPx} className="fill-ink-soft">
          hours
        </text>
        {ticks.major.map((shown) => {
          const y = yOf(fromShown(shown, 'C', printer.system))
          return (
            <g key={shown}>
              <line x1={plot.x} x2={toX} y1={y} y2={y} strokeWidth="1" className="stroke-grid" />
              <line x1={plot.x - 5} x2={plot.x} y1={y} y2={y} strokeWidth="1.5" className="stroke-ink" />
              <text x={plot.x - 8} y={y + 4} textAnchor="end" fontSize="12" className="fill-ink">
                {printer.number(fromShown(shown, 'C', printer.system), 'C')}
              </text>
            </g>
          )
        })}
        <line x1={plot.x} x2={plot.x} y1={sheet.topPx} y2={sheet.bottomPx} strokeWidth="1.5" className="stroke-ink" />
        {curves.map(({ key, points }) => (
          <path
            key={key}
            d={`M${points.map(({ hour, waterC }) => `${xOf(hour).toFixed(1)} ${yOf(waterC).toFixed(1)}`).join('L')}`}
            fill="none"
            strokeLinejoin="round"
            {...look[key]}
          />
        ))}
        {labels.map(({ key, y }) => (
          <text key={key} x={toX + 8} y={y + 4} fontSize={labelPx} fontWeight="600" className="fill-ink">
            {printer.temperature(ends.get(key) ?? goalC)}
          </text>
        ))}
      </g>
      <svg x={plot.x} width={plot.width} height={sheet.heightPx} overflow="visible">
        <ScaleAxis domain={[0, hours]} unit="h" printer={printer} widthPx={plot.width} y={sheet.bottomPx} />
      </svg>
    </DrawingSheet>
  )
}
