import type { KindKey } from '#shared/kinds/index'
import type { Printer } from '#shared/units/print'
import { DrawingSheet } from './drawing-sheet'
import { SwapCell } from './swap-cell'
import { frontOf, type LinedUp, type Surrounding } from './swap-layout'
import { gridStepMm } from './tank-layout'
import { useContainerWidth } from './use-container-width'

export interface SwapLineupProps {
  readonly kind: KindKey
  readonly pieces: readonly LinedUp[]
  readonly surrounding: Surrounding | null
  readonly printer: Printer
}

const abovePx = 30
const belowPx = 50
const gapPx = 22
const tallestPx = 230
const edgePx = 12

/** Whether any of them has a size that can be drawn from the front. */
export const canLineUp = (kind: KindKey, pieces: readonly LinedUp[]): boolean =>
  pieces.some(({ specs }) => frontOf(kind, specs).lengthMm !== null)

/** The drawing in words. */
function describeLineup({ kind, pieces, surrounding, printer }: SwapLineupProps): string {
  const lines = pieces.map(({ letter, name, specs, verdict }) => {
    const { lengthMm, heightMm } = frontOf(kind, specs)
    const sides = [lengthMm, heightMm].map((side) => (side === null ? 'not recorded' : printer.length(side)))
    return `${verdict === null ? 'Gone' : letter}, ${name}: ${sides[0]} across, ${sides[1]} high.`
  })
  const around =
    surrounding &&
    (surrounding.heightMm === undefined
      ? `Under each, the ${surrounding.name}: ${printer.length(surrounding.lengthMm)}.`
      : `Around each, the water of the ${surrounding.name}: ${printer.size([surrounding.lengthMm, surrounding.heightMm])}.`)
  return [...lines, around].filter(Boolean).join(' ')
}

/** What is gone and what could take its place, from the front, side by side to one scale, each where it would stand. */
export function SwapLineup(props: SwapLineupProps) {
  const { kind, pieces, surrounding, printer } = props
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(640)
  const fronts = pieces.map(({ specs }) => frontOf(kind, specs))
  const cellMm = Math.max(surrounding?.lengthMm ?? 0, ...fronts.map(({ lengthMm }) => lengthMm ?? 0), 1)
  const highMm = Math.max(surrounding?.heightMm ?? 0, ...fronts.map(({ heightMm }) => heightMm ?? 0), 1)
  const insidePx = Math.max(120, widthPx - 2 * edgePx - gapPx * (pieces.length - 1))
  const pxPerMm = Math.min(tallestPx / highMm, insidePx / (cellMm * pieces.length))
  const cellPx = cellMm * pxPerMm
  const floorY = abovePx + highMm * pxPerMm
  const startX = (widthPx - cellPx * pieces.length - gapPx * (pieces.length - 1)) / 2
  const gridMm = gridStepMm(pxPerMm, printer.system)
  return (
    <DrawingSheet
      frame={frame}
      title="Side by side, from the front, to one scale"
      description={describeLineup(props)}
      widthPx={widthPx}
      heightPx={floorY + belowPx}
      grid={{ px: gridMm * pxPerMm, x: startX, y: floorY, label: `grid ${printer.length(gridMm)}` }}
      isInteractive={false}
    >
      <g aria-hidden="true">
        {pieces.map((piece, at) => {
          const middle = startX + at * (cellPx + gapPx) + cellPx / 2
          return (
            <SwapCell
              key={piece.letter}
              kind={kind}
              piece={piece}
              surrounding={surrounding}
              space={{ middle, floorY, pxPerMm, cellPx: cellPx + gapPx, cellMm, highMm }}
            />
          )
        })}
      </g>
    </DrawingSheet>
  )
}
