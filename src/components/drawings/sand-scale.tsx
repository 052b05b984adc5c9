import { useId } from 'react'
import type { SandScaleDrawing } from '#shared/engine/drawings/sand-scale'
import { describeSandScale, printGrain } from './describe-sand-scale'
import { labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { Legend, type LegendItem } from './legend'
import { patternId, ZonePatterns } from './patterns'
import { monoWidth } from './text-width'
import { useContainerWidth } from './use-container-width'

export interface SandScaleProps {
  readonly drawing: SandScaleDrawing
}

const sheet = {
  sidePx: 30,
  grainsPx: 62,
  bandPx: 74,
  bandTallPx: 34,
  axisPx: 108,
  heightPx: 154,
  defaultPx: 480,
} as const
/** The largest grain that is drawn, and how large; all others to its scale. */
const largestPx = 48
const largestMm = 4

/** Grain sizes by classes that double, grains above them to one scale, and this sand among them. */
export function SandScale({ drawing }: SandScaleProps) {
  const id = useId()
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(sheet.defaultPx)
  const { classes, fromMm, toMm, wantedMm, grains } = drawing
  const lengthPx = Math.max(120, widthPx - 2 * sheet.sidePx)
  const xOf = (mm: number) => sheet.sidePx + (Math.log2(mm / fromMm) / Math.log2(toMm / fromMm)) * lengthPx
  const sizes = [fromMm, ...classes.map((one) => one.toMm)]
  const steps = Math.log2(toMm / fromMm)
  const ticks = Array.from({ length: Math.round(steps) + 1 }, (_, at) => fromMm * 2 ** at)
  // Every second label where a phone has no room for all of them.
  const every = lengthPx / steps < monoWidth('0.125', 12) + 10 ? 2 : 1
  const pxPerMm = Math.min(largestPx / largestMm, lengthPx / steps / largestMm)
  const drawn = ticks.filter((mm) => mm * pxPerMm >= 1 && mm <= largestMm)
  const zone = (from: number, to: number) => ({
    x: xOf(from),
    width: Math.max(0, xOf(to) - xOf(from)),
    y: sheet.bandPx,
    height: sheet.bandTallPx,
  })
  const hatch = `url(#${patternId(id, 'change')})`
  const box = { x: 1, y: 1, width: 20, height: 12 }
  const items: readonly (LegendItem | false)[] = [
    grains !== null && {
      key: 'sand',
      swatch: <path d="M1 7h20" strokeWidth="5" className="stroke-ink" />,
      text: `this sand, ${printGrain(grains.minMm)} to ${printGrain(grains.maxMm)}, middle ${printGrain(grains.middleMm)}`,
    },
    {
      key: 'grains',
      swatch: <circle cx="11" cy="7" r="5" strokeWidth="1" className="fill-grid stroke-ink-soft" />,
      text: 'grains of these sizes, to one scale',
    },
    {
      key: 'wanted',
      swatch: <rect {...box} className="fill-fits" opacity="0.24" />,
      text: `stays down and lets waste through, ${printGrain(wantedMm[0])} to ${printGrain(wantedMm[1])}`,
    },
    {
      key: 'other',
      swatch: <rect {...box} fill={hatch} />,
      text: 'finer blows about, coarser traps waste',
    },
  ]
  const middle = grains && classes.find((one) => grains.middleMm >= one.fromMm && grains.middleMm < one.toMm)

  return (
    <DrawingSheet
      frame={frame}
      title={middle ? `Grain sizes: ${middle.name}` : 'Grain sizes'}
      description={describeSandScale(drawing)}
      widthPx={widthPx}
      heightPx={sheet.heightPx}
      isInteractive={false}
      legend={<Legend items={items.filter((item) => item !== false)} />}
    >
      <ZonePatterns id={id} />
      <g aria-hidden="true">
        {drawn.map((mm) => (
          <circle
            key={mm}
            cx={xOf(mm)}
            cy={sheet.grainsPx - (mm * pxPerMm) / 2}
            r={(mm * pxPerMm) / 2}
            strokeWidth="1"
            className="fill-grid stroke-ink-soft"
          />
        ))}
        <rect {...zone(fromMm, wantedMm[0])} fill={hatch} />
        <rect {...zone(wantedMm[0], wantedMm[1])} className="fill-fits" opacity="0.24" />
        <rect {...zone(wantedMm[1], toMm)} fill={hatch} />
        {sizes.map((mm) => (
          <line
            key={mm}
            x1={xOf(mm)}
            x2={xOf(mm)}
            y1={sheet.bandPx}
            y2={sheet.axisPx}
            strokeWidth="1"
            className="stroke-rule"
          />
        ))}
        {grains && (
          <>
            <line
              x1={xOf(grains.minMm)}
              x2={Math.max(xOf(grains.maxMm), xOf(grains.minMm) + 2)}
              y1={sheet.bandPx + sheet.bandTallPx / 2}
              y2={sheet.bandPx + sheet.bandTallPx / 2}
              strokeWidth="6"
              className="stroke-ink"
            />
            <circle
              cx={xOf(grains.middleMm)}
              cy={sheet.bandPx + sheet.bandTallPx / 2}
              r="6.5"
              strokeWidth="2.5"
              className="fill-sheet stroke-ink"
            />
          </>
        )}
        <line
          x1={sheet.sidePx}
          x2={sheet.sidePx + lengthPx}
          y1={sheet.axisPx}
          y2={sheet.axisPx}
          strokeWidth="1.5"
          className="stroke-ink"
        />
        {ticks.map((mm, at) => (
          <g key={mm}>
            <line
              x1={xOf(mm)}
              x2={xOf(mm)}
              y1={sheet.axisPx}
              y2={sheet.axisPx + 6}
              strokeWidth="1.5"
              className="stroke-ink"
            />
            {at % every === 0 && (
              <text x={xOf(mm)} y={sheet.axisPx + 20} textAnchor="middle" fontSize="12" className="fill-ink">
                {Number(mm.toPrecision(3))}
              </text>
            )}
          </g>
        ))}
        <text
          x={sheet.sidePx + lengthPx}
          y={sheet.heightPx - 8}
          textAnchor="end"
          fontSize={labelPx}
          className="fill-ink-soft"
        >
          grain, mm
        </text>
      </g>
    </DrawingSheet>
  )
}
