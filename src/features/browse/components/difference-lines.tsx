import { percent } from '../../../components/drawings/scale-domain'
import type { GearItem } from '#shared/schemas/gear'
import { toShown } from '#shared/units/convert'
import type { Printer } from '#shared/units/print'
import type { MeasureDifference } from '../model/compare-pieces'
import { unknownText } from '../../../lib/describe-filter'
import { PieceLetter } from './piece-letter'

export interface DifferenceLinesProps {
  readonly difference: MeasureDifference
  readonly pieces: readonly GearItem[]
  readonly printer: Printer
}

const betterWords = { more: 'more is better', less: 'less is better' } as const

/** Where the lines begin. The zero of a temperature scale means nothing: theirs begin a little below the coldest. */
function findStart(known: readonly number[], isTemperature: boolean): number {
  const [least, most] = [Math.min(...known), Math.max(...known)]
  return isTemperature ? least - (most - least || 1) / 3 : Math.min(0, least)
}

/** One measure of each piece as a dimension line, all from one start and to one scale. */
export function DifferenceLines({ difference: { attribute, values }, pieces, printer }: DifferenceLinesProps) {
  const { label, unit, better } = attribute
  const shown = values.map((value) => (value === null ? null : toShown(value, unit, printer.system)))
  const known = shown.filter((value) => value !== null)
  const least = findStart(known, unit === 'C')
  const span = Math.max(...known) - least || 1
  return (
    <div className="min-w-0">
      <h4 className="text-sm font-semibold">
        <span className="inline-block first-letter:uppercase">{label}</span>
        {better && <span className="font-normal text-ink-soft">, {betterWords[better]}</span>}
      </h4>
      <ul className="mt-1 space-y-1">
        {pieces.map((piece, at) => {
          const value = values[at] ?? null
          const share = ((shown[at] ?? least) - least) / span
          return (
            <li key={piece.slug} className="grid grid-cols-[1.25rem_minmax(0,1fr)_7.25rem] items-center gap-2.5">
              <PieceLetter at={at} />
              <svg width="100%" height="14" overflow="visible" aria-hidden="true" className="block stroke-ink">
                {value === null ? (
                  <line
                    x1="0"
                    x2="100%"
                    y1="7"
                    y2="7"
                    strokeWidth="1.5"
                    strokeDasharray="4 3"
                    className="stroke-ink-soft"
                  />
                ) : (
                  <>
                    <line x1="0" x2={percent(100 * share)} y1="7" y2="7" strokeWidth="1.5" />
                    {['0', percent(100 * share)].map((end, index) => (
                      <svg key={index} x={end} overflow="visible">
                        <path d="M-4 11 4 3" strokeWidth="1.5" />
                        <path d="M0 1v12" strokeWidth="1" opacity="0.6" />
                      </svg>
                    ))}
                  </>
                )}
              </svg>
              {value === null ? (
                <span className="text-right text-xs text-ink-soft">{unknownText}</span>
              ) : (
                <span className="text-right font-mono text-sm tabular-nums">{printer.measure(value, unit)}</span>
              )}
            </li>
          )
        })}
      </ul>
    </div>
  )
}
