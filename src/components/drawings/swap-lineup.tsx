import type { Specs, Verdict } from '#shared/engine/types'
import type { KindKey } from '#shared/kinds/index'
import type { Printer } from '#shared/units/print'
import { placeRod } from './place-rod'
import { RodShape } from './rod-shape'
import { DrawingSheet } from './drawing-sheet'
import { labelPx } from './dimension-layout'
import { gridStepMm } from './tank-layout'
import type { RodDrawing } from './tank-drawing'
import { longestThatFits } from './text-width'
import { useContainerWidth } from './use-container-width'

/** One of those that are drawn side by side. */
export interface LinedUp {
  readonly letter: string
  readonly name: string
  readonly specs: Specs
  /** Null: what is gone. */
  readonly verdict: Verdict | null
  readonly place?: Pick<RodDrawing, 'chamber' | 'position' | 'angleDeg'> | undefined
}

/** What all of them have to do with, seen from the front: water of a chamber around them, or a length over or under them. */
export interface Surrounding {
  readonly name: string
  readonly lengthMm: number
  /** Left out: a length alone, drawn under the pieces. */
  readonly heightMm?: number
  /** Front to back, for rods that lean that way. */
  readonly widthMm?: number
}

export interface SwapLineupProps {
  readonly kind: KindKey
  readonly pieces: readonly LinedUp[]
  readonly surrounding: Surrounding | null
  readonly printer: Printer
}

const abovePx = 30
const belowPx = 34
const gapPx = 22
const tallestPx = 230
const edgePx = 12

const frontKeys: Readonly<Partial<Record<KindKey, readonly [string, string]>>> = {
  tank: ['outerLengthMm', 'outerHeightMm'],
  stand: ['topLengthMm', 'heightMm'],
  heater: ['diameterMm', 'lengthMm'],
}

const read = (specs: Specs, key: string): number | null => {
  const value = specs[key]?.value
  return typeof value === 'number' ? value : null
}

interface Front {
  readonly lengthMm: number | null
  readonly heightMm: number | null
}

function frontOf(kind: KindKey, specs: Specs): Front {
  const [across, up] = frontKeys[kind] ?? ['lengthMm', 'heightMm']
  return { lengthMm: read(specs, across), heightMm: read(specs, up) }
}

/** Whether any of them has a size that can be drawn from the front. */
export const canLineUp = (kind: KindKey, pieces: readonly LinedUp[]): boolean =>
  pieces.some(({ specs }) => frontOf(kind, specs).lengthMm !== null)

/** The drawing in words. */
export function describeLineup({ kind, pieces, surrounding, printer }: SwapLineupProps): string {
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

const outlines = { fits: 'stroke-fits', changes: 'stroke-changes', no: 'stroke-no', unknown: 'stroke-unknown' } as const

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
        {pieces.map(({ letter, verdict, place }, at) => {
          const front = fronts[at] ?? { lengthMm: null, heightMm: null }
          const x = startX + at * (cellPx + gapPx)
          const middle = x + cellPx / 2
          const around = surrounding && {
            x: middle - (surrounding.lengthMm * pxPerMm) / 2,
            width: surrounding.lengthMm * pxPerMm,
          }
          const width = (front.lengthMm ?? 0) * pxPerMm
          const height = (front.heightMm ?? highMm / 4) * pxPerMm
          const stroke = verdict === null ? 'stroke-ink-soft' : outlines[verdict]
          const rod: RodDrawing | null =
            kind === 'heater' && front.lengthMm !== null && front.heightMm !== null
              ? {
                  chamber: place?.chamber ?? '',
                  position: place?.position ?? 'upright',
                  angleDeg: place?.angleDeg ?? 90,
                  lengthMm: front.heightMm,
                  diameterMm: front.lengthMm,
                  ...(verdict !== null && { verdict }),
                }
              : null
          const seen =
            rod && placeRod(rod, { lengthMm: surrounding?.lengthMm ?? cellMm, widthMm: surrounding?.widthMm ?? cellMm })
          const word = longestThatFits(verdict === null ? ['gone', '×'] : [letter], cellPx + gapPx - 4, labelPx + 2)
          return (
            <g key={letter}>
              {around && surrounding.heightMm !== undefined && (
                <>
                  <rect
                    {...around}
                    y={floorY - surrounding.heightMm * pxPerMm}
                    height={surrounding.heightMm * pxPerMm}
                    className="fill-water"
                  />
                  <path
                    d={`M${around.x} ${floorY - surrounding.heightMm * pxPerMm - 8}V${floorY}h${around.width}V${floorY - surrounding.heightMm * pxPerMm - 8}`}
                    fill="none"
                    strokeWidth="1.5"
                    className="stroke-ink"
                  />
                </>
              )}
              {around && surrounding.heightMm === undefined && (
                <path d={`M${around.x} ${floorY + 6}h${around.width}`} strokeWidth="3" className="stroke-action" />
              )}
              {rod && seen ? (
                <RodShape
                  x={middle}
                  y={floorY - (seen.heightMm / 2) * pxPerMm}
                  lengthPx={seen.seenLengthMm * pxPerMm}
                  thickPx={rod.diameterMm * pxPerMm}
                  angleDeg={seen.seenAngleDeg}
                  {...(verdict !== null && { verdict })}
                />
              ) : front.lengthMm === null ? (
                <text x={middle} y={floorY - 12} textAnchor="middle" fontSize={labelPx} className="fill-ink-soft">
                  ?
                </text>
              ) : (
                <rect
                  x={middle - width / 2}
                  y={floorY - height}
                  width={Math.max(2, width)}
                  height={Math.max(2, height)}
                  strokeWidth="2"
                  fillOpacity="0.75"
                  strokeDasharray={verdict === null || front.heightMm === null ? '5 4' : undefined}
                  className={`fill-sheet ${stroke}`}
                />
              )}
              <text
                x={middle}
                y={floorY + 24}
                textAnchor="middle"
                fontSize={labelPx + 2}
                fontWeight="700"
                className={verdict === null ? 'fill-ink-soft' : 'fill-ink'}
              >
                {word}
              </text>
            </g>
          )
        })}
      </g>
    </DrawingSheet>
  )
}
