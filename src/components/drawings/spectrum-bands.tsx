import type { SpectrumDrawing } from '#shared/engine/drawings/spectrum'
import type { Printer } from '#shared/units/print'
import { assignRows } from './assign-rows'
import { labelPx } from './dimension-layout'
import { DrawingSheet } from './drawing-sheet'
import { Legend } from './legend'
import { ScaleAxis } from './scale-axis'
import { monoWidth } from './text-width'
import { useContainerWidth } from './use-container-width'

export interface SpectrumBandsProps {
  readonly drawing: SpectrumDrawing
  readonly printer: Printer
}

const sheet = { sidePx: 30, topPx: 76, bottomPx: 196, heightPx: 228, bracketY: 28, defaultPx: 400 } as const
const blueNm = [400, 500] as const
const seenNm = [400, 700] as const

const sayBlue = ({ blueShare, wantedBlueShare }: SpectrumDrawing, printer: Printer) =>
  `${printer.measure(blueShare, 'fraction')} of its photons are blue, ${printer.pair(blueNm, 'nm')}; corals want at least ${printer.measure(wantedBlueShare, 'fraction')}`

/** Photons by wavelength: the area of a band is its share. */
export function SpectrumBands({ drawing, printer }: SpectrumBandsProps) {
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(sheet.defaultPx)
  const { bands } = drawing
  const domain = [
    Math.min(seenNm[0], ...bands.map(({ fromNm }) => fromNm)),
    Math.max(seenNm[1], ...bands.map(({ toNm }) => toNm)),
  ] as const
  const plotPx = Math.max(80, widthPx - 2 * sheet.sidePx)
  const xOf = (nm: number) => sheet.sidePx + ((nm - domain[0]) / (domain[1] - domain[0])) * plotPx
  // A single line of the spectrum is drawn as a band of one nanometre.
  const boxes = bands.map(({ fromNm, toNm, share }) => {
    const wideNm = Math.max(1, toNm - fromNm)
    return { fromNm, toNm: fromNm + wideNm, share, density: share / wideNm }
  })
  const densest = Math.max(...boxes.map(({ density }) => density))
  const tallOf = (density: number) => (densest > 0 ? density / densest : 0) * (sheet.bottomPx - sheet.topPx)
  const texts = boxes.map(({ share }) => printer.measure(share, 'fraction'))
  const rows = assignRows(
    boxes.map(({ fromNm, toNm }, at) => {
      const half = monoWidth(texts[at] ?? '', labelPx) / 2 + 3
      const middle = (xOf(fromNm) + xOf(toNm)) / 2
      return [middle - half, middle + half]
    }),
  )
  const described = bands.map(
    ({ fromNm, toNm, share }) => `${printer.pair([fromNm, toNm], 'nm')} ${printer.measure(share, 'fraction')}`,
  )
  const [blueFrom, blueTo] = [xOf(blueNm[0]), xOf(blueNm[1])]

  return (
    <DrawingSheet
      frame={frame}
      title="Spectrum: its photons by wavelength"
      description={`Share of photons by band: ${described.join(', ')}. ${sayBlue(drawing, printer)}.`}
      widthPx={widthPx}
      heightPx={sheet.heightPx}
      isInteractive={false}
      legend={
        <Legend
          items={[
            {
              key: 'blue',
              swatch: (
                <rect x="1" y="1" width="20" height="12" strokeWidth="1.5" className="fill-action-soft stroke-ink" />
              ),
              text: sayBlue(drawing, printer),
            },
          ]}
        />
      }
    >
      <g aria-hidden="true">
        <path
          d={`M${blueFrom} ${sheet.bracketY + 6}V${sheet.bracketY}H${blueTo}V${sheet.bracketY + 6}`}
          fill="none"
          strokeWidth="1.5"
          className="stroke-ink"
        />
        <text
          x={Math.max((blueFrom + blueTo) / 2, 12 + monoWidth(`blue ${texts[0]}`, labelPx) / 2)}
          y={sheet.bracketY - 8}
          textAnchor="middle"
          fontSize={labelPx}
          fontWeight="600"
          className="fill-ink"
        >
          blue {printer.measure(drawing.blueShare, 'fraction')}
        </text>
        {boxes.map(({ fromNm, toNm, share, density }) => {
          const tall = tallOf(density)
          const box = { x: xOf(fromNm), y: sheet.bottomPx - tall, width: xOf(toNm) - xOf(fromNm), height: tall }
          const from = Math.max(box.x, blueFrom)
          const to = Math.min(box.x + box.width, blueTo)
          return (
            <g key={`${fromNm} ${toNm} ${share}`}>
              <rect {...box} className="fill-water" />
              {to > from && <rect {...box} x={from} width={to - from} className="fill-action-soft" />}
              <rect {...box} fill="none" strokeWidth="1.5" className="stroke-ink" />
            </g>
          )
        })}
        {boxes.map(({ fromNm, toNm, share, density }, at) => (
          <text
            key={`${fromNm} ${toNm} ${share}`}
            x={(xOf(fromNm) + xOf(toNm)) / 2}
            y={sheet.bottomPx - tallOf(density) - 7 - (rows[at] ?? 0) * 14}
            textAnchor="middle"
            fontSize={labelPx}
            strokeWidth="4"
            paintOrder="stroke"
            className="fill-ink stroke-sheet"
          >
            {texts[at]}
          </text>
        ))}
      </g>
      <svg x={sheet.sidePx} width={plotPx} height={sheet.heightPx} overflow="visible">
        <ScaleAxis domain={domain} unit="nm" printer={printer} widthPx={plotPx} y={sheet.bottomPx} />
      </svg>
    </DrawingSheet>
  )
}
