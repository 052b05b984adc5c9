import { Link } from 'react-router-dom'
import type { Attribute } from '#shared/kinds/types'
import type { Gear } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { correctHref } from '../correct-href'
import { ConfirmValue } from './confirm-value'

export interface SpecActionsProps {
  readonly gear: Gear
  readonly attribute: Attribute
  readonly printer: Printer
  readonly onReport: (attribute: Attribute) => void
}

/** What a reader can do about one value. */
export function SpecActions({ gear, attribute, printer, onReport }: SpecActionsProps) {
  const { key, label } = attribute
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 text-sm text-ink-soft print:hidden">
      <ConfirmValue slug={gear.slug} attribute={attribute} count={gear.confirmations[key] ?? 0} printer={printer} />
      <Link
        to={correctHref(gear.slug, attribute)}
        className="link inline-flex min-h-8 items-center"
        aria-label={`Correct the ${label}`}
      >
        Correct this
      </Link>
      <button
        type="button"
        className="link min-h-8"
        aria-label={`Something wrong with the ${label}?`}
        onClick={() => onReport(attribute)}
      >
        Something wrong here?
      </button>
    </div>
  )
}
