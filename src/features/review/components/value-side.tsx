import type { ReactNode } from 'react'
import type { Attribute } from '#shared/kinds/types'
import type { Printer } from '#shared/units/print'
import type { RecordedValue } from '../model/list-fields'
import { printDate } from '../../../lib/print-date'
import { sourceWords } from '../../../lib/source-words'

export interface ValueSideProps {
  readonly title: string
  readonly attribute: Attribute
  /** Null: there is no value on this side. */
  readonly side: RecordedValue | null
  readonly text: string | null
  readonly emptyText: string
  readonly printer: Printer
  readonly isProposed?: boolean
  readonly children?: ReactNode
}

function printPlusMinus(attribute: Attribute, plusMinus: number | undefined, printer: Printer): string | null {
  if (attribute.type !== 'measure' || plusMinus === undefined) return null
  return `± ${printer.difference(plusMinus, attribute.unit)}`
}

/** Who says so and since when, as far as it was said. */
function describeOrigin({ source, date, author, reviewer, revision }: RecordedValue): string {
  return [
    source && sourceWords[source],
    date && printDate(date),
    author,
    reviewer && `approved by ${reviewer}`,
    revision && `revision ${revision}`,
  ]
    .filter(Boolean)
    .join(', ')
}

/** One side of a field: the value in the reader's units, what was typed, and who says so. */
export function ValueSide(props: ValueSideProps) {
  const { title, attribute, side, text, emptyText, printer, isProposed = false, children } = props
  const plusMinus = side && printPlusMinus(attribute, side.plusMinus, printer)
  const origin = side && describeOrigin(side)
  return (
    <div className={`min-w-0 border-l-[3px] pl-3 ${isProposed ? 'border-action' : 'border-rule'}`}>
      <p className="text-sm text-ink-soft">{title}</p>
      {side === null ? (
        <p className="font-semibold">{emptyText}</p>
      ) : (
        <p className="text-lg break-words">
          <span className="font-mono">{text}</span>
          {plusMinus && <span className="font-mono text-ink-soft"> {plusMinus}</span>}
        </p>
      )}
      {side?.raw !== undefined && (
        <p className="text-sm">
          typed <span className="font-mono break-words">“{side.raw}”</span>
        </p>
      )}
      {origin && <p className="text-sm text-ink-soft">{origin}</p>}
      {children}
    </div>
  )
}
