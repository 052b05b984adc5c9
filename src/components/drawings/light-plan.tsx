import { useId, useMemo } from 'react'
import type { LightDrawing } from '#shared/engine/drawings/light'
import type { Printer } from '#shared/units/print'
import { labelContours } from './contour-labels'
import { writeArea, writeLines } from './contour-path'
import { traceLevel } from './contours'
import { describeLight, printLights, printPlane, printSetting, printSpill, splitPlane } from './describe-light'
import { besideEdge, labelPx } from './dimension-layout'
import { DimensionLine } from './dimension-line'
import { DrawingSheet } from './drawing-sheet'
import { Legend, type LegendItem } from './legend'
import { patternId, ZonePatterns } from './patterns'
import { defaultWidthPx, gridStepMm } from './tank-layout'
import { useContainerWidth } from './use-container-width'

export interface LightPlanProps {
  readonly drawing: LightDrawing
  readonly printer: Printer
  /** The tank is nobody's. */
  readonly isExample?: boolean
}

const sheet = { abovePx: 16, belowPx: 56, sidesPx: [22, 70], mostTallPx: 300, mostLongPx: 560 } as const

/** The display from above with the light half way down its water: in the band, brighter, dimmer. */
export function LightPlan({ drawing, printer, isExample = false }: LightPlanProps) {
  const id = useId()
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(defaultWidthPx)
  const { map, band, percent, display, fixtures, assumed } = drawing
  const acrossMm = Math.max(display.lengthMm, ...fixtures.map((one) => 2 * Math.abs(one.xMm) + one.lengthMm))
  const tallMm = Math.max(display.widthMm, ...fixtures.map((one) => 2 * Math.abs(one.yMm) + one.widthMm))
  const mostPxPerMm = Math.min(sheet.mostLongPx / acrossMm, sheet.mostTallPx / tallMm)
  const size = { acrossPx: acrossMm * mostPxPerMm, contentPx: tallMm * mostPxPerMm, ...sheet }
  const [leftPx, rightPx] = sheet.sidesPx
  const roomPx = widthPx - leftPx - rightPx
  const pxPerMm = Math.min(size.acrossPx, Math.max(60, roomPx)) / acrossMm
  const middle = { x: leftPx + roomPx / 2, y: sheet.abovePx + (tallMm * pxPerMm) / 2 }
  const around = ({ lengthMm, widthMm }: { readonly lengthMm: number; readonly widthMm: number }, x = 0, y = 0) => ({
    x: middle.x + (x - lengthMm / 2) * pxPerMm,
    y: middle.y + (y - widthMm / 2) * pxPerMm,
    width: lengthMm * pxPerMm,
    height: widthMm * pxPerMm,
  })
  const water = around(display)
  const plane = around({
    lengthMm: display.lengthMm - 2 * map.marginMm,
    widthMm: display.widthMm - 2 * map.marginMm,
  })
  const right = water.x + water.width
  const bottom = water.y + water.height
  const heightPx = sheet.abovePx + tallMm * pxPerMm + sheet.belowPx
  const lowestPx = heightPx - sheet.belowPx
  const gridMm = gridStepMm(pxPerMm, printer.system)

  const levels = useMemo(() => band.map((umol) => (umol * 100) / percent) as [number, number], [band, percent])
  const [low, high] = useMemo(() => [traceLevel(map, levels[0]), traceLevel(map, levels[1])] as const, [map, levels])
  const labels = labelContours(map, plane, [
    { level: levels[0], text: printer.number(band[0], 'umol/m2/s'), to: 'right' },
    { level: levels[1], text: printer.number(band[1], 'umol/m2/s'), to: 'up' },
  ])

  const { within, above, below } = splitPlane(drawing)
  const print = (share: number) => printer.measure(share / 100, 'fraction')
  const hatch = `url(#${patternId(id, 'fail')})`
  const box = { x: 1, y: 1, width: 20, height: 12, strokeWidth: 1 }
  const items: readonly (LegendItem | false)[] = [
    within > 0 && {
      key: 'band',
      swatch: <BandSwatch />,
      text: `${print(within)} in the band, ${printer.pair(band, 'umol/m2/s')}`,
    },
    above > 0 && {
      key: 'above',
      swatch: <rect {...box} fill={hatch} className="stroke-ink-soft" />,
      text: `${print(above)} brighter`,
    },
    below > 0 && {
      key: 'below',
      swatch: <rect {...box} className="fill-water stroke-ink-soft" />,
      text: `${print(below)} dimmer`,
    },
    {
      key: 'light',
      swatch: <rect {...box} fill="none" strokeWidth={2} className="stroke-ink" />,
      text: printLights(drawing, printer),
    },
  ]

  return (
    <DrawingSheet
      frame={frame}
      title={`${isExample ? 'In an example tank' : printPlane(drawing, printer)}, ${printSetting(drawing, printer)}`}
      description={describeLight(drawing, printer)}
      widthPx={widthPx}
      heightPx={heightPx}
      size={size}
      grid={{ px: gridMm * pxPerMm, x: water.x, y: water.y, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={false}
      legend={
        <>
          <Legend items={items.filter((item) => item !== false)} />
          <p className="mt-1 text-sm text-ink-soft">{printSpill(drawing, printer)} An estimate: measure to be sure.</p>
        </>
      }
    >
      <ZonePatterns id={id} />
      <g aria-hidden="true">
        <rect {...water} strokeWidth="1.5" className="fill-water stroke-ink" />
        <path d={writeArea([...low, ...high], map, plane)} fillRule="evenodd" className="fill-fits" opacity="0.24" />
        <path d={writeArea(high, map, plane)} fill={hatch} />
        <path
          d={writeLines([...low, ...high], map, plane)}
          fill="none"
          strokeWidth="1.5"
          strokeLinejoin="round"
          className="stroke-ink"
        />
        <rect {...plane} fill="none" strokeWidth="1" strokeDasharray="1.5 3" className="stroke-ink-soft" />
        {fixtures.map((one) => (
          <rect
            key={`${one.xMm} ${one.yMm}`}
            {...around(one, one.xMm, one.yMm)}
            fill="none"
            strokeWidth="2.5"
            className="stroke-ink"
          />
        ))}
        {labels.map(({ text, x, y }) => (
          <text
            key={text}
            x={x}
            y={y + 4}
            textAnchor="middle"
            fontSize={labelPx}
            fontWeight="600"
            strokeWidth="4"
            paintOrder="stroke"
            className="fill-ink stroke-sheet"
          >
            {text}
          </text>
        ))}
      </g>
      <DimensionLine
        axis="vertical"
        from={water.y}
        to={bottom}
        {...besideEdge(
          Math.max(right, middle.x + (acrossMm * pxPerMm) / 2),
          1,
          printer.length(display.widthMm),
          water.height,
        )}
        edge={right}
        label={printer.length(display.widthMm)}
        name="Display, front to back"
        status={assumed.width ? 'assumed' : 'plain'}
      />
      <DimensionLine
        axis="horizontal"
        from={water.x}
        to={right}
        at={lowestPx + 16}
        edge={bottom}
        side="after"
        label={printer.length(display.lengthMm)}
        name="Display, along the tank"
        status={assumed.length ? 'assumed' : 'plain'}
      />
    </DrawingSheet>
  )
}

function BandSwatch() {
  const box = { x: 1, y: 1, width: 20, height: 12 }
  return (
    <>
      <rect {...box} className="fill-water" />
      <rect {...box} className="fill-fits" opacity="0.24" />
      <rect {...box} fill="none" strokeWidth="1.5" className="stroke-ink" />
    </>
  )
}
