import type { KindKey } from '#shared/kinds/index'
import { labelPx } from './dimension-layout'
import { placeRod } from './place-rod'
import { RodShape } from './rod-shape'
import { frontOf, readSide, type Front, type LinedUp, type Surrounding } from './swap-layout'
import type { RodDrawing } from './tank-drawing'
import { longestThatFits } from './text-width'

export interface CellSpace {
  readonly middle: number
  readonly floorY: number
  readonly pxPerMm: number
  readonly cellPx: number
  readonly cellMm: number
  readonly highMm: number
}

export interface SwapCellProps {
  readonly kind: KindKey
  readonly piece: LinedUp
  readonly surrounding: Surrounding | null
  readonly space: CellSpace
}

const outlines = { fits: 'stroke-fits', changes: 'stroke-changes', no: 'stroke-no', unknown: 'stroke-unknown' } as const

/** The water that it stands in, or the length that it has to do with as a bar under it. */
function Around({ surrounding, space }: Pick<SwapCellProps, 'space'> & { readonly surrounding: Surrounding }) {
  const { middle, floorY, pxPerMm } = space
  const width = surrounding.lengthMm * pxPerMm
  const x = middle - width / 2
  if (surrounding.heightMm === undefined)
    return <path d={`M${x} ${floorY + 6}h${width}`} strokeWidth="3" className="stroke-action" />
  const waterY = floorY - surrounding.heightMm * pxPerMm
  return (
    <>
      <rect x={x} y={waterY} width={width} height={floorY - waterY} className="fill-water" />
      <path
        d={`M${x} ${waterY - 8}V${floorY}h${width}V${waterY - 8}`}
        fill="none"
        strokeWidth="1.5"
        className="stroke-ink"
      />
    </>
  )
}

function Rod({ piece, front, surrounding, space }: Omit<SwapCellProps, 'kind'> & { readonly front: Front }) {
  const { middle, floorY, pxPerMm, cellMm } = space
  const { verdict, place } = piece
  const rod: RodDrawing = {
    chamber: place?.chamber ?? '',
    position: place?.position ?? 'upright',
    angleDeg: place?.angleDeg ?? 90,
    lengthMm: front.heightMm ?? 0,
    diameterMm: front.lengthMm ?? 0,
  }
  const room = { lengthMm: surrounding?.lengthMm ?? cellMm, widthMm: surrounding?.widthMm ?? cellMm }
  const seen = placeRod(rod, room)
  return (
    <RodShape
      x={middle}
      y={floorY - (seen.heightMm / 2) * pxPerMm}
      lengthPx={seen.seenLengthMm * pxPerMm}
      thickPx={rod.diameterMm * pxPerMm}
      angleDeg={seen.seenAngleDeg}
      verdict={verdict ?? undefined}
    />
  )
}

function Body({ kind, piece, front, space }: Omit<SwapCellProps, 'surrounding'> & { readonly front: Front }) {
  const { middle, floorY, pxPerMm, highMm } = space
  const width = Math.max(2, (front.lengthMm ?? 0) * pxPerMm)
  const height = Math.max(2, (front.heightMm ?? highMm / 4) * pxPerMm)
  const waterMm = kind === 'tank' ? readSide(piece.specs, 'waterLineMm') : null
  const isDashed = piece.verdict === null || front.heightMm === null
  return (
    <>
      {waterMm !== null && (
        <rect
          x={middle - width / 2}
          y={floorY - waterMm * pxPerMm}
          width={width}
          height={waterMm * pxPerMm}
          className="fill-water"
        />
      )}
      <rect
        x={middle - width / 2}
        y={floorY - height}
        width={width}
        height={height}
        strokeWidth="2"
        fillOpacity={waterMm === null ? 0.75 : 0}
        strokeDasharray={isDashed ? '5 4' : undefined}
        className={`fill-sheet ${piece.verdict === null ? 'stroke-ink-soft' : outlines[piece.verdict]}`}
      />
    </>
  )
}

/** One piece from the front in what surrounds it, with its letter under it. */
export function SwapCell({ kind, piece, surrounding, space }: SwapCellProps) {
  const { middle, floorY, cellPx } = space
  const front = frontOf(kind, piece.specs)
  const isRod = kind === 'heater' && front.lengthMm !== null && front.heightMm !== null
  const isGone = piece.verdict === null
  return (
    <g>
      {surrounding && <Around surrounding={surrounding} space={space} />}
      {isRod ? (
        <Rod piece={piece} front={front} surrounding={surrounding} space={space} />
      ) : front.lengthMm === null ? (
        <text x={middle} y={floorY - 12} textAnchor="middle" fontSize={labelPx} className="fill-ink-soft">
          ?
        </text>
      ) : (
        <Body kind={kind} piece={piece} front={front} space={space} />
      )}
      <text
        x={middle}
        y={floorY + 24}
        textAnchor="middle"
        fontSize={labelPx + 2}
        fontWeight="700"
        className={isGone ? 'fill-ink-soft' : 'fill-ink'}
      >
        {isGone ? longestThatFits(['gone', '×'], cellPx - 4, labelPx + 2) : piece.letter}
      </text>
    </g>
  )
}
