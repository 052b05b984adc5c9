import { fromShown, toShown } from '#shared/units/convert'
import type { Printer } from '#shared/units/print'
import type { CanonicalUnit } from '#shared/units/units'
import { niceTicks } from './ticks'

export interface HeadAxisProps {
  /** From 0 to this, upwards. */
  readonly most: number
  readonly unit: CanonicalUnit
  readonly printer: Printer
  readonly x: number
  readonly topPx: number
  readonly bottomPx: number
  /** Hairlines lead from the ticks to here. */
  readonly toX: number
}

const mostTicks = 5

/** An upright ruler in the person's unit, its labels to the left. */
export function HeadAxis({ most, unit, printer, x, topPx, bottomPx, toX }: HeadAxisProps) {
  const ticks = niceTicks(0, toShown(most, unit, printer.system), mostTicks)
  const place = (shown: number) => bottomPx - (fromShown(shown, unit, printer.system) / most) * (bottomPx - topPx)
  return (
    <g aria-hidden="true">
      {ticks.major.map((shown) => (
        <g key={shown}>
          <line x1={x} x2={toX} y1={place(shown)} y2={place(shown)} strokeWidth="1" className="stroke-grid" />
          <line x1={x - 5} x2={x} y1={place(shown)} y2={place(shown)} strokeWidth="1.5" className="stroke-ink" />
          {shown > 0 && (
            <text x={x - 8} y={place(shown) + 4} textAnchor="end" fontSize="12" className="fill-ink">
              {printer.number(fromShown(shown, unit, printer.system), unit, { exact: true })}
            </text>
          )}
        </g>
      ))}
      <line x1={x} x2={x} y1={topPx} y2={bottomPx} strokeWidth="1.5" className="stroke-ink" />
    </g>
  )
}
