import { toShown, fromShown } from '#shared/units/convert'
import type { Printer } from '#shared/units/print'
import type { CanonicalUnit } from '#shared/units/units'
import { monoWidth } from './text-width'
import { niceTicks } from './ticks'
import { percent, placePercent, type Domain } from './scale-domain'

export interface ScaleAxisProps {
  readonly domain: Domain
  readonly unit: CanonicalUnit
  readonly printer: Printer
  readonly widthPx: number
  readonly y: number
  readonly hasLabels?: boolean
}

const fontPx = 12
const leastSpacingPx = 52
/** Few enough that their labels keep clear of each other on a phone, should its width never be measured. */
const mostTicks = 9

/** A ruler in the person's unit. Positions are percentages, so it stretches with its drawing without scripts. */
export function ScaleAxis({ domain, unit, printer, widthPx, y, hasLabels = true }: ScaleAxisProps) {
  const [low, high] = [toShown(domain[0], unit, printer.system), toShown(domain[1], unit, printer.system)]
  const label = (value: number) => printer.number(value, unit, { exact: true })
  const widest = Math.max(...domain.map((value) => monoWidth(printer.measure(value, unit), fontPx)))
  const most = Math.min(mostTicks, Math.max(3, Math.floor(widthPx / Math.max(leastSpacingPx, widest + 12))))
  const ticks = niceTicks(low, high, most, printer.unitLabel(unit) === 'in')
  const place = (shown: number) => percent(placePercent(fromShown(shown, unit, printer.system), domain))
  const first = ticks.major[0]
  return (
    <g aria-hidden="true">
      <line x1="0" x2="100%" y1={y} y2={y} strokeWidth="1.5" className="stroke-ink" />
      {ticks.minor.map((shown) => (
        <line
          key={shown}
          x1={place(shown)}
          x2={place(shown)}
          y1={y}
          y2={y + 3}
          strokeWidth="1"
          className="stroke-ink-soft"
        />
      ))}
      {ticks.major.map((shown) => (
        <line
          key={shown}
          x1={place(shown)}
          x2={place(shown)}
          y1={y}
          y2={y + 6}
          strokeWidth="1.5"
          className="stroke-ink"
        />
      ))}
      {hasLabels &&
        ticks.major.map((shown) => (
          <text key={shown} x={place(shown)} y={y + 19} textAnchor="middle" fontSize={fontPx} className="fill-ink">
            {label(fromShown(shown, unit, printer.system))}
            {shown === first && printer.unitLabel(unit) && ` ${printer.unitLabel(unit)}`}
          </text>
        ))}
    </g>
  )
}
