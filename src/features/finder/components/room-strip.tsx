import { useId } from 'react'
import { assignRows } from '../../../components/drawings/assign-rows'
import { ScaleAxis } from '../../../components/drawings/scale-axis'
import { fitDomain, placePercent } from '../../../components/drawings/scale-domain'
import { TextTarget } from '../../../components/drawings/text-target'
import { monoWidth } from '../../../components/drawings/text-width'
import { useContainerWidth } from '../../../components/drawings/use-container-width'
import type { Finder } from '../hooks/use-finder'

export interface RoomStripProps {
  readonly finder: Finder
  readonly onEdit: (path: string, target: Element) => void
  readonly editHref: (path: string) => string
}

const sidePx = 20
const rowPx = 26
const rows = 3
const axisY = rows * rowPx + 14
const heightPx = axisY + 30
const labelPx = 12

/** Coldest, usual and warmest room, and the water that the heater has to hold, on one scale. */
export function RoomStrip({ finder, onEdit, editHref }: RoomStripProps) {
  const { plan, printer, given } = finder
  const id = useId()
  const [frame, widthPx] = useContainerWidth<HTMLDivElement>(760)
  const { room, goals } = plan
  const points = [
    { path: 'room.coldestC', name: 'Coldest room', word: 'coldest', at: room.coldestC },
    { path: 'room.temperatureC', name: 'Usual room', word: 'usual', at: room.temperatureC },
    { path: 'goals.temperatureC', name: 'Water', word: 'water', at: goals.temperatureC },
    { path: 'room.warmestC', name: 'Warmest room', word: 'warmest', at: room.warmestC },
  ].sort((a, b) => a.at - b.at)
  const domain = fitDomain([...points.map(({ at }) => at), room.coldestC - 2, room.warmestC + 2], 0)
  const insidePx = widthPx - 2 * sidePx
  const labels = points.map((point) => {
    const text = `${point.word} ${printer.temperature(point.at)}`
    const textPx = monoWidth(text, labelPx)
    const markX = (placePercent(point.at, domain) / 100) * insidePx
    return { ...point, text, markX, x: Math.min(Math.max(0, markX - textPx / 2), insidePx - textPx), textPx }
  })
  const rowOf = assignRows(labels.map(({ x, textPx }) => [x - 8, x + textPx + 8]))
  const rowY = (at: number) => 12 + (rowOf[at] ?? 0) * rowPx
  const coldX = labels.find(({ path }) => path === 'room.coldestC')?.markX ?? 0
  const waterX = labels.find(({ path }) => path === 'goals.temperatureC')?.markX ?? 0
  return (
    <figure className="mt-3 min-w-0">
      <div ref={frame} className="overflow-hidden border border-rule bg-sheet">
        <p aria-hidden="true" className="px-3 pt-2 text-sm text-ink-soft">
          The room and the water
        </p>
        <svg
          role="group"
          aria-label="The room and the water, on one temperature scale"
          aria-describedby={id}
          width="100%"
          height={heightPx}
          className="block"
        >
          <svg x={sidePx} width={insidePx} height={heightPx} overflow="visible">
            {waterX > coldX && (
              <rect
                x={coldX}
                y={axisY - 9}
                width={waterX - coldX}
                height={9}
                className="fill-water"
                aria-hidden="true"
              />
            )}
            <ScaleAxis domain={domain} unit="C" printer={printer} widthPx={insidePx} y={axisY} />
            {labels.map(({ path, markX }, at) => (
              <line
                key={path}
                x1={markX}
                x2={markX}
                y1={rowY(at) + 10}
                y2={axisY + 6}
                strokeWidth="2"
                strokeDasharray={given.has(path) ? undefined : '4 3'}
                className={path === 'goals.temperatureC' ? 'stroke-action' : 'stroke-ink'}
                aria-hidden="true"
              />
            ))}
            {labels.map(({ path, text, name, x, textPx, at: celsius }, at) => (
              <g key={path}>
                {/* A line from a row above passes behind the label, not through it. */}
                <rect x={x - 3} y={rowY(at) - 9} width={textPx + 6} height={19} className="fill-sheet" />
                <TextTarget
                  edits={{ onEdit, editHref }}
                  x={x}
                  y={rowY(at)}
                  text={text}
                  name={`${name} ${printer.temperature(celsius)}`}
                  isGiven={given.has(path)}
                  path={path}
                />
              </g>
            ))}
          </svg>
        </svg>
      </div>
      <figcaption id={id} className="sr-only">
        {labels
          .map(({ name, path, at }) => `${name} ${printer.temperature(at)}${given.has(path) ? '' : ', assumed'}.`)
          .join(' ')}
      </figcaption>
    </figure>
  )
}
