import type { PackedChamber } from '#shared/engine/drawings/packing'
import type { Printer } from '#shared/units/print'
import { DimensionLine } from './dimension-line'
import { besideEdge, labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { defaultWidthPx, gridStepMm, sidePx } from './tank-layout'
import { useContainerWidth } from './use-container-width'

export interface PackingViewsProps {
  readonly chamber: PackedChamber
  readonly printer: Printer
  readonly nameOf: (itemId: string) => string
}

const abovePx = 34
const betweenPx = 30
const belowPx = 30
const tallestPx = 300
const widestPx = 260

const letterOf = (at: number): string => String.fromCharCode(65 + (at % 26))

const outcomeWords = {
  fits: 'Everything drawn stands side by side.',
  no: 'There is no room for all of it side by side: it is drawn in a row.',
  unknown: 'No arrangement was found, and none was ruled out: it is drawn in a row.',
} as const

/** The drawing in words: each piece with its sides, and whether there is room for all. */
function describePacking(chamber: PackedChamber, printer: Printer, nameOf: (id: string) => string): string {
  const { name, lengthMm, widthMm, waterDepthMm, pieces, outcome, unsized } = chamber
  const list = pieces.map(({ itemId, lengthMm: long, widthMm: wide, heightMm }) => {
    const sides =
      heightMm === null ? `${printer.size([long, wide])}, of unknown height` : printer.size([long, wide, heightMm])
    return `${nameOf(itemId)} takes ${sides}.`
  })
  return [
    `${name}: ${printer.size([lengthMm, widthMm])} from above, water ${printer.length(waterDepthMm)} deep.`,
    ...(pieces.length === 0 ? ['Nothing of known size stands in it.'] : list),
    ...(pieces.length > 1 || outcome !== 'fits' ? [outcomeWords[outcome]] : []),
    ...unsized.map((id) => `${nameOf(id)} is not drawn: nobody recorded its size.`),
  ].join(' ')
}

/** A chamber with all that stands in it, from the front and from above, one over the other to one scale. */
export function PackingViews({ chamber, printer, nameOf }: PackingViewsProps) {
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(defaultWidthPx)
  const { pieces, lengthMm, widthMm, waterDepthMm, outcome, unsized } = chamber
  const uprightMm = Math.max(waterDepthMm, ...pieces.map(({ heightMm }) => heightMm ?? 0))
  const reachMm = Math.max(lengthMm, ...pieces.map((piece) => piece.xMm + piece.lengthMm))
  const deepMm = Math.max(widthMm, ...pieces.map((piece) => piece.yMm + piece.widthMm))
  const mostPxPerMm = Math.min(tallestPx / (uprightMm + deepMm), widestPx / reachMm)
  const pxPerMm = Math.min(mostPxPerMm, Math.max(60, widthPx - 2 * sidePx) / reachMm)
  const leftX = (widthPx - reachMm * pxPerMm) / 2
  const rightX = leftX + lengthMm * pxPerMm
  const floorY = abovePx + uprightMm * pxPerMm
  const waterY = floorY - waterDepthMm * pxPerMm
  const planY = floorY + betweenPx
  const planBottom = planY + widthMm * pxPerMm
  const gridMm = gridStepMm(pxPerMm, printer.system)
  const order = [...new Set(pieces.map(({ itemId }) => itemId))]
  const letter = (itemId: string) => letterOf(order.indexOf(itemId))
  const stroke = { fits: 'stroke-ink', no: 'stroke-no', unknown: 'stroke-unknown' }[outcome]
  return (
    <DrawingSheet
      frame={frame}
      title={`${chamber.name}, front and above`}
      description={describePacking(chamber, printer, nameOf)}
      widthPx={widthPx}
      heightPx={planY + deepMm * pxPerMm + belowPx}
      size={{
        acrossPx: reachMm * mostPxPerMm,
        contentPx: (uprightMm + deepMm) * mostPxPerMm,
        abovePx,
        belowPx: betweenPx + belowPx,
      }}
      grid={{ px: gridMm * pxPerMm, x: leftX, y: floorY, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={false}
      legend={
        <ul className="space-y-0.5 text-sm">
          {order.map((itemId) => (
            <li key={itemId} className="flex gap-2">
              <span className="font-mono font-bold">{letter(itemId)}</span>
              <span className="min-w-0">{nameOf(itemId)}</span>
            </li>
          ))}
          {unsized.map((itemId) => (
            <li key={itemId} className="text-ink-soft">
              {nameOf(itemId)}: not drawn, nobody recorded its size
            </li>
          ))}
          {outcome !== 'fits' && (
            <li className={`font-semibold ${outcome === 'no' ? 'text-no' : 'text-unknown'}`}>
              {outcomeWords[outcome]}
            </li>
          )}
          {order.length + unsized.length === 0 && <li className="text-ink-soft">Nothing stands in it.</li>}
        </ul>
      }
    >
      <g aria-hidden="true">
        <rect x={leftX} y={waterY} width={rightX - leftX} height={floorY - waterY} className="fill-water" />
        <path
          d={`M${leftX} ${waterY - 12}V${floorY}H${rightX}V${waterY - 12}`}
          fill="none"
          strokeWidth="1.5"
          className="stroke-ink"
        />
        <path d={`M${leftX} ${waterY}H${rightX}`} strokeWidth="1.5" className="stroke-action" />
        <rect
          x={leftX}
          y={planY}
          width={rightX - leftX}
          height={planBottom - planY}
          strokeWidth="1.5"
          className="fill-water stroke-ink"
        />
        {pieces.map((piece, at) => {
          const x = leftX + piece.xMm * pxPerMm
          const width = Math.max(3, piece.lengthMm * pxPerMm)
          const tall = (piece.heightMm ?? waterDepthMm) * pxPerMm
          const deep = Math.max(3, piece.widthMm * pxPerMm)
          const shared = { x, width, strokeWidth: 1.5, rx: piece.isRod ? Math.min(width, 12) / 2 : 1 }
          return (
            <g key={at}>
              <rect
                {...shared}
                y={floorY - tall}
                height={tall}
                strokeDasharray={piece.heightMm === null ? '4 3' : undefined}
                className={`fill-sheet ${stroke}`}
              />
              <rect {...shared} y={planY + piece.yMm * pxPerMm} height={deep} className={`fill-sheet ${stroke}`} />
              {[floorY - tall / 2, planY + piece.yMm * pxPerMm + deep / 2].map((y) => (
                <text
                  key={y}
                  x={x + width / 2}
                  y={y + 4}
                  textAnchor="middle"
                  fontSize={labelPx}
                  fontWeight="700"
                  strokeWidth="3"
                  paintOrder="stroke"
                  className="fill-ink stroke-sheet"
                >
                  {letter(piece.itemId)}
                </text>
              ))}
            </g>
          )
        })}
      </g>
      <DimensionLine
        axis="vertical"
        from={waterY}
        to={floorY}
        {...besideEdge(leftX, -1, printer.length(waterDepthMm), floorY - waterY)}
        edge={leftX}
        label={printer.length(waterDepthMm)}
        name="Water depth"
        status="plain"
      />
      <DimensionLine
        axis="vertical"
        from={planY}
        to={planBottom}
        {...besideEdge(leftX, -1, printer.length(widthMm), planBottom - planY)}
        edge={leftX}
        label={printer.length(widthMm)}
        name="Front to back"
        status="plain"
      />
      <DimensionLine
        axis="horizontal"
        from={leftX}
        to={rightX}
        at={floorY + betweenPx - 8}
        label={printer.length(lengthMm)}
        name="Along the tank"
        status="plain"
      />
    </DrawingSheet>
  )
}
