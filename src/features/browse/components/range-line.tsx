import { percent, placePercent } from '../../../components/drawings/scale-domain'
import type { Printer } from '#shared/units/print'
import type { CanonicalUnit } from '#shared/units/units'
import type { Range } from '../../../lib/ranges'

export interface RangeLineProps {
  readonly bounds: readonly [number | null, number | null]
  readonly range: Range
  readonly unit: CanonicalUnit
  readonly printer: Printer
}

/** The catalogue's least and most as a dimension line, what is asked for drawn over it. */
export function RangeLine({ bounds: [min, max], range, unit, printer }: RangeLineProps) {
  if (min === null || max === null) return <div className="h-9" />
  const isSingle = min === max
  const domain = [min, isSingle ? min + 1 : max] as const
  const place = (value: number) => percent(placePercent(value, domain))
  const isAsked = range.from !== null || range.to !== null
  const [from, to] = [range.from ?? min, range.to ?? max]
  return (
    <div className="pt-1">
      <div className="flex justify-between gap-2 font-mono text-xs text-ink-soft">
        <span>{printer.measure(min, unit)}</span>
        {!isSingle && <span>{printer.measure(max, unit)}</span>}
      </div>
      <svg width="100%" height="12" overflow="visible" aria-hidden="true" className="block">
        <line x1="0" x2="100%" y1="6" y2="6" strokeWidth="1" className="stroke-ink-soft" />
        <line x1="0.5" x2="0.5" y1="1" y2="11" strokeWidth="1" className="stroke-ink-soft" />
        <svg x="100%" overflow="visible">
          <line x1="-0.5" x2="-0.5" y1="1" y2="11" strokeWidth="1" className="stroke-ink-soft" />
        </svg>
        {isAsked && from <= to && (
          <line x1={place(from)} x2={place(to)} y1="6" y2="6" strokeWidth="4" className="stroke-action" />
        )}
      </svg>
    </div>
  )
}
