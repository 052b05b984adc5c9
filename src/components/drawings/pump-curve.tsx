import { useId } from 'react'
import type { PumpCurveDrawing, PumpDrawing } from '#shared/engine/drawings/pump'
import type { CurvePoint } from '#shared/engine/physics/pump'
import type { Printer } from '#shared/units/print'
import { describePump, isAtWork, printPlumbing, printPoint, printWanted } from './describe-pump'
import { labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { HeadAxis } from './head-axis'
import { Legend, type LegendItem } from './legend'
import { ScaleAxis } from './scale-axis'
import { monoWidth } from './text-width'
import { useContainerWidth } from './use-container-width'

export interface PumpCurveProps {
  /** Alone, or crossing what a setup's lift and pipe take. */
  readonly drawing: PumpCurveDrawing | PumpDrawing
  readonly printer: Printer
}

const sheet = { leftPx: 54, rightPx: 22, topPx: 30, bottomPx: 232, heightPx: 282, defaultPx: 400 } as const
/** Of the longest curve and the greatest head, so that neither ends at the frame. */
const air = 1.06

const look = {
  pump: { strokeWidth: 2.5, className: 'stroke-ink' },
  slowest: { strokeWidth: 1.25, className: 'stroke-ink' },
  system: { strokeWidth: 2, strokeDasharray: '6 4', className: 'stroke-ink-soft' },
} as const

const endOf = (points: readonly CurvePoint[]) => Math.max(0, ...points.map(({ flowLph }) => flowLph))
const topOf = (points: readonly CurvePoint[]) => Math.max(0, ...points.map(({ headM }) => headM))

/** Head over flow: the pump falls, lift and pipe rise, and where they cross it works. */
export function PumpCurve({ drawing, printer }: PumpCurveProps) {
  const id = useId()
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(sheet.defaultPx)
  const work = isAtWork(drawing) ? drawing : null
  const mostLph = air * Math.max(endOf(drawing.curve), work?.wanted?.lph[1] ?? 0)
  const mostM = air * Math.max(topOf(drawing.curve), work?.staticHeadM ?? 0)
  const plot = {
    x: sheet.leftPx,
    y: sheet.topPx,
    width: Math.max(80, widthPx - sheet.leftPx - sheet.rightPx),
    height: sheet.bottomPx - sheet.topPx,
  }
  const xOf = (flowLph: number) => plot.x + (flowLph / mostLph) * plot.width
  const yOf = (headM: number) => sheet.bottomPx - (headM / mostM) * plot.height
  const pathOf = (points: readonly CurvePoint[]) =>
    `M${points.map(({ flowLph, headM }) => `${xOf(flowLph).toFixed(1)} ${yOf(headM).toFixed(1)}`).join('L')}`

  const line = (key: keyof typeof look, text: string): LegendItem => ({
    key,
    swatch: <path d="M1 7h20" fill="none" {...look[key]} />,
    text,
  })
  const items: readonly LegendItem[] = [
    line('pump', work?.slowest ? 'the pump at full speed' : 'the pump'),
    {
      key: 'recorded',
      swatch: <circle cx="11" cy="7" r="3" strokeWidth="1.5" className="fill-sheet stroke-ink" />,
      text: 'recorded',
    },
    ...(work?.slowest ? [line('slowest', `at ${printer.measure(work.slowest.speedShare, 'fraction')} speed`)] : []),
    ...(work
      ? [
          line('system', printPlumbing(work, printer)),
          ...(work.wanted
            ? [
                {
                  key: 'wanted',
                  swatch: <rect x="1" y="1" width="20" height="12" className="fill-fits" opacity="0.24" />,
                  text: printWanted(work.wanted, printer),
                },
              ]
            : []),
          {
            key: 'point',
            swatch: <circle cx="11" cy="7" r="5" className="fill-ink" />,
            text: `gives ${printPoint(work.point, printer)}`,
          },
        ]
      : []),
  ]

  return (
    <DrawingSheet
      frame={frame}
      title={work ? 'Where the pump works' : 'Flow against head'}
      description={describePump(drawing, printer)}
      widthPx={widthPx}
      heightPx={sheet.heightPx}
      isInteractive={false}
      legend={<Legend items={items} />}
    >
      <clipPath id={`${id}-plot`}>
        <rect {...plot} />
      </clipPath>
      <HeadAxis
        most={mostM}
        unit="m"
        printer={printer}
        x={plot.x}
        topPx={sheet.topPx}
        bottomPx={sheet.bottomPx}
        toX={plot.x + plot.width}
      />
      <g aria-hidden="true">
        <text x={12} y={16} fontSize={labelPx} className="fill-ink-soft">
          head, {printer.unitLabel('m')}
        </text>
        <text x={widthPx - 12} y={sheet.heightPx - 8} textAnchor="end" fontSize={labelPx} className="fill-ink-soft">
          flow, {printer.unitLabel('L/h')}
        </text>
        {work?.wanted && (
          <rect
            x={xOf(work.wanted.lph[0])}
            y={plot.y}
            width={xOf(work.wanted.lph[1]) - xOf(work.wanted.lph[0])}
            height={plot.height}
            className="fill-fits"
            opacity="0.24"
          />
        )}
        <g fill="none" clipPath={`url(#${id}-plot)`}>
          {work && <path d={pathOf(work.system)} {...look.system} />}
          {work?.slowest && <path d={pathOf(work.slowest.curve)} {...look.slowest} />}
          <path d={pathOf(drawing.curve)} {...look.pump} />
        </g>
        {drawing.recorded.map(({ flowLph, headM }) => (
          <circle
            key={flowLph}
            cx={xOf(flowLph)}
            cy={yOf(headM)}
            r="3"
            strokeWidth="1.5"
            className="fill-sheet stroke-ink"
          />
        ))}
      </g>
      <svg x={plot.x} width={plot.width} height={sheet.heightPx} overflow="visible">
        <ScaleAxis domain={[0, mostLph]} unit="L/h" printer={printer} widthPx={plot.width} y={sheet.bottomPx} />
      </svg>
      {work && (
        <WorkingPoint
          x={xOf(work.point.flowLph)}
          y={yOf(work.point.headM)}
          text={printer.flow(work.point.flowLph)}
          toX={plot.x + plot.width}
        />
      )}
    </DrawingSheet>
  )
}

interface WorkingPointProps {
  readonly x: number
  readonly y: number
  readonly text: string
  /** Right end of the plot. */
  readonly toX: number
}

function WorkingPoint({ x, y, text, toX }: WorkingPointProps) {
  // Up to the right of the crossing the plane is empty: one line has come down, the other has yet to rise.
  const isRoom = x + 12 + monoWidth(text, labelPx) <= toX
  return (
    <g aria-hidden="true">
      <circle cx={x} cy={y} r="5.5" strokeWidth="2" className="fill-ink stroke-sheet" />
      <text
        x={isRoom ? x + 10 : x - 10}
        y={Math.min(y - 8, sheet.bottomPx - 22)}
        textAnchor={isRoom ? 'start' : 'end'}
        fontSize={labelPx}
        fontWeight="700"
        strokeWidth="4"
        paintOrder="stroke"
        className="fill-ink stroke-sheet"
      >
        {text}
      </text>
    </g>
  )
}
