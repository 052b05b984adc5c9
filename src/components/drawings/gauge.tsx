import { useId } from 'react'
import type { Check, Outcome, Zone } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import type { CanonicalUnit } from '#shared/units/units'
import { outcomeVerdicts, verdictWords } from '../../lib/verdicts'
import { nearestLimit, zonesFromLimit } from './gauge-zones'
import { ZoneBand, ZonePatterns } from './patterns'
import { ScaleAxis } from './scale-axis'
import { fitDomain, percent, placePercent, placeZone } from './scale-domain'
import { useContainerWidth } from './use-container-width'

export interface GaugeProps {
  readonly label: string
  readonly unit: CanonicalUnit
  readonly printer: Printer
  /** Canonical, like the limit. Null: not known, and the gauge stands empty. */
  readonly value: number | null
  readonly limit: Check['limit']
  readonly margin: number | null
  readonly outcome: Outcome
  /** "a close call, 93 % sure" */
  readonly note?: string | undefined
  /** Without them the far side of the limit is hatched. */
  readonly zones?: readonly Zone[]
  readonly min?: number
  readonly max?: number
  readonly size?: 'small' | 'large'
}

const fills = { pass: 'fill-fits', change: 'fill-changes', fail: 'fill-no', nodata: 'fill-unknown' } as const

function anchorAt(share: number): 'start' | 'middle' | 'end' {
  if (share < 18) return 'start'
  return share > 82 ? 'end' : 'middle'
}

/** One check as a tick scale: the limit marked, the value placed on it, the margin between them shaded. */
export function Gauge(props: GaugeProps) {
  const { label, unit, printer, value, limit, margin, outcome, note, size = 'large' } = props
  const id = useId()
  const [box, widthPx] = useContainerWidth<HTMLDivElement>(size === 'small' ? 200 : 480)
  const limits = limit === null ? [] : typeof limit === 'number' ? [limit] : limit
  const zones = props.zones ?? zonesFromLimit(value, limit, margin, outcome)
  const [low, high] = fitDomain([...limits, ...(value === null ? [] : [value])], 0.35)
  const domain = [props.min ?? low, props.max ?? high] as const
  const place = (at: number) => placePercent(at, domain)
  const axisY = size === 'small' ? 34 : 52
  const near = value !== null && limit !== null ? nearestLimit(value, limit) : null
  // A value just beside its limit needs more decimals than usual to be told from it.
  const [valueText, nearText] =
    value !== null && near !== null
      ? printer.apart(value, near, unit)
      : [value === null ? 'not known' : printer.measure(value, unit), '']
  const print = (at: number) => (at === near ? nearText : printer.measure(at, unit))
  const limitWords = limit === null ? '' : typeof limit === 'number' ? print(limit) : printer.pair(limit, unit)
  const limitMiddle = limits.length > 0 ? place(limits.reduce((sum, at) => sum + at, 0) / limits.length) : 0
  const words = [
    `${label}: ${valueText}`,
    limitWords && `limit ${limitWords}`,
    // Where nothing limits it, nothing was judged.
    (limit !== null || outcome !== 'pass') && verdictWords[outcomeVerdicts[outcome]].toLowerCase(),
    note,
  ]
  return (
    <div ref={box} className="px-4">
      <svg
        role="img"
        aria-label={words.filter(Boolean).join(', ')}
        width="100%"
        height={axisY + (size === 'small' ? 18 : 24)}
        overflow="visible"
        className="block"
      >
        <ZonePatterns id={id} />
        {zones.map((zone) => {
          const band = placeZone(zone, domain)
          return (
            band && (
              <ZoneBand key={`${zone.from}`} id={id} outcome={zone.outcome} {...band} y={axisY - 14} height={14} />
            )
          )
        })}
        {value !== null && near !== null && (
          <rect
            x={percent(Math.min(place(value), place(near)))}
            width={percent(Math.abs(place(value) - place(near)))}
            y={axisY - 7}
            height={7}
            opacity="0.45"
            className={fills[outcome]}
          />
        )}
        <ScaleAxis
          domain={domain}
          unit={unit}
          printer={printer}
          widthPx={widthPx}
          y={axisY}
          hasLabels={size === 'large'}
        />
        {limits.map((at) => (
          <g key={at} aria-hidden="true">
            <line
              x1={percent(place(at))}
              x2={percent(place(at))}
              y1={size === 'small' ? axisY - 14 : 16}
              y2={axisY + (size === 'small' ? 5 : 0)}
              strokeWidth="2.5"
              className="stroke-action"
            />
            {size === 'large' && (
              <text
                x={percent(place(at))}
                y="12"
                textAnchor={anchorAt(place(at))}
                fontSize="12"
                className="fill-action"
              >
                {print(at)}
              </text>
            )}
          </g>
        ))}
        {size === 'small' && (
          <text
            x={percent(limitMiddle)}
            y={axisY + 17}
            textAnchor={anchorAt(limitMiddle)}
            fontSize="12"
            aria-hidden="true"
            className="fill-action"
          >
            {limitWords}
          </text>
        )}
        {value === null && (
          <text x="0" y={axisY - 19} fontSize="12" aria-hidden="true" className="fill-unknown">
            {valueText}
          </text>
        )}
        {value !== null && (
          <g aria-hidden="true">
            <svg x={percent(place(value))} y={axisY} overflow="visible">
              <path d="M0 0v-12m-5.5-6h11L0-8Z" strokeWidth="1.5" className="fill-ink stroke-ink" />
            </svg>
            <text
              x={percent(place(value))}
              dx={size === 'small' ? 0 : place(value) > 60 ? -10 : 10}
              y={size === 'small' ? axisY - 22 : axisY - 19}
              textAnchor={size === 'small' ? anchorAt(place(value)) : place(value) > 60 ? 'end' : 'start'}
              fontSize="12"
              fontWeight="700"
              strokeWidth="4"
              paintOrder="stroke"
              className="fill-ink stroke-paper"
            >
              {valueText}
            </text>
          </g>
        )}
      </svg>
    </div>
  )
}
