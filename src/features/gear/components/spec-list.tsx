import type { Attribute, Role } from '#shared/kinds/types'
import type { Gear } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { printValue } from '#shared/kinds/print-value'
import { roleTitles } from '../../../lib/role-titles'
import { OtherSources } from './other-sources'
import { SpecActions } from './spec-actions'
import { printPlusMinus, SpecSource } from './spec-source'

export interface SpecListProps {
  readonly role: Role
  readonly attributes: readonly Attribute[]
  readonly gear: Gear
  readonly printer: Printer
  readonly onReport: (attribute: Attribute) => void
}

/** Values of one role, each with its ±, and who says so. */
export function SpecList({ role, attributes, gear, printer, onReport }: SpecListProps) {
  const shown = attributes.filter((attribute) => attribute.role === role && gear.specs[attribute.key] !== undefined)
  if (shown.length === 0) return null
  return (
    <section className="mt-8">
      <h2>{roleTitles[role]}</h2>
      <dl className="mt-2">
        {shown.map((attribute) => {
          const provenance = gear.provenance[attribute.key]
          const plusMinus = provenance && printPlusMinus(attribute, provenance, printer)
          return (
            <div
              key={attribute.key}
              className="grid gap-x-6 border-t border-rule py-2 sm:grid-cols-[minmax(0,1fr)_minmax(0,1.2fr)] lg:grid-cols-[14rem_minmax(0,1fr)_minmax(0,1fr)]"
            >
              <dt className="first-letter:uppercase">{attribute.label}</dt>
              <dd className="font-mono text-[0.94em]">
                {printValue(attribute, gear.specs[attribute.key], printer)}
                {plusMinus && <span className="text-ink-soft"> {plusMinus}</span>}
              </dd>
              <dd className="text-sm text-ink-soft sm:col-start-2 lg:col-start-auto">
                <SpecSource provenance={provenance} />
                <OtherSources attribute={attribute} gear={gear} printer={printer} />
              </dd>
              <dd className="sm:col-start-2 lg:col-span-2">
                <SpecActions gear={gear} attribute={attribute} printer={printer} onReport={onReport} />
              </dd>
            </div>
          )
        })}
      </dl>
    </section>
  )
}
