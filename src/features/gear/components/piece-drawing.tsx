import { DimensionLine } from '../../../components/drawings/dimension-line'
import { DrawingSheet } from '../../../components/drawings/drawing-sheet'
import { RodShape } from '../../../components/drawings/rod-shape'
import { gridStepMm, sidePx } from '../../../components/drawings/tank-layout'
import { useContainerWidth } from '../../../components/drawings/use-container-width'
import type { Printer } from '#shared/units/print'

export interface PieceSizes {
  /** Across the sheet. */
  readonly lengthMm: number
  /** Up the sheet: thickness of a rod, height of a body. */
  readonly heightMm: number
  readonly widthMm?: number
  readonly isRod: boolean
}

const sheet = { above: 46, below: 30, mostTall: 240, mostLong: 560, default: 480 } as const
/** Between the two views, as a share of the length. */
const gapShare = 0.16

/** A rod, or a body from the front and from above, to one scale with its outside measures. */
export function PieceDrawing({
  name,
  sizes,
  printer,
}: {
  readonly name: string
  readonly sizes: PieceSizes
  readonly printer: Printer
}) {
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(sheet.default)
  const { lengthMm, heightMm, widthMm, isRod } = sizes
  const gapMm = widthMm === undefined ? 0 : gapShare * lengthMm
  const tallMm = heightMm + gapMm + (widthMm ?? 0)
  const mostPxPerMm = Math.min(sheet.mostLong / lengthMm, sheet.mostTall / tallMm)
  const size = {
    acrossPx: mostPxPerMm * lengthMm,
    contentPx: mostPxPerMm * tallMm,
    abovePx: sheet.above,
    belowPx: sheet.below,
  }
  const long = Math.min(size.acrossPx, Math.max(60, widthPx - 2 * sidePx))
  const pxPerMm = long / lengthMm
  const [tall, deep] = [heightMm * pxPerMm, (widthMm ?? 0) * pxPerMm]
  const x = (widthPx - long) / 2
  const y = sheet.above
  const planY = y + tall + gapMm * pxPerMm
  const gridMm = gridStepMm(pxPerMm, printer.system)
  const bodyClass = 'fill-sheet stroke-ink'
  return (
    <DrawingSheet
      frame={frame}
      title={isRod ? 'To scale' : 'From the front and from above, to scale'}
      description={
        isRod
          ? `${name}: ${printer.length(lengthMm)} long, ${printer.length(heightMm)} thick.`
          : `${name}: ${printer.length(lengthMm)} long, ${printer.length(heightMm)} high${widthMm === undefined ? '' : `, ${printer.length(widthMm)} deep`}.`
      }
      widthPx={widthPx}
      heightPx={sheet.above + tallMm * pxPerMm + sheet.below}
      size={size}
      grid={{ px: gridMm * pxPerMm, x, y, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={false}
    >
      {isRod ? (
        <g aria-hidden="true">
          <RodShape x={x + long / 2} y={y + tall / 2} lengthPx={long} thickPx={tall} angleDeg={0} />
        </g>
      ) : (
        <rect x={x} y={y} width={long} height={tall} strokeWidth="1.5" className={bodyClass} />
      )}
      {widthMm !== undefined && (
        <rect x={x} y={planY} width={long} height={deep} strokeWidth="1.5" className={bodyClass} />
      )}
      <DimensionLine
        axis="horizontal"
        from={x}
        to={x + long}
        at={y - 14}
        edge={y}
        label={printer.length(lengthMm)}
        name="Length"
        status="plain"
      />
      <DimensionLine
        axis="vertical"
        from={y}
        to={y + tall}
        at={x + long + 34}
        edge={x + long}
        side="after"
        label={printer.length(heightMm)}
        name={isRod ? 'Thickness' : 'Height'}
        status="plain"
      />
      {widthMm !== undefined && (
        <DimensionLine
          axis="vertical"
          from={planY}
          to={planY + deep}
          at={x + long + 34}
          edge={x + long}
          side="after"
          label={printer.length(widthMm)}
          name="Depth"
          status="plain"
        />
      )}
    </DrawingSheet>
  )
}
