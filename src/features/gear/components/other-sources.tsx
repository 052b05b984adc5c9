import { printValue } from '#shared/kinds/print-value'
import type { Attribute } from '#shared/kinds/types'
import type { Gear } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { printPlusMinus, SpecSource } from './spec-source'

export interface OtherSourcesProps {
  readonly attribute: Attribute
  readonly gear: Gear
  readonly printer: Printer
}

/** What else is said of a value, by rank: measured before its maker's figure before an estimate, the newest first. */
export function OtherSources({ attribute, gear, printer }: OtherSourcesProps) {
  const others = (gear.sources[attribute.key] ?? []).filter(({ isUsed }) => !isUsed)
  const isDisputed = gear.disputed.includes(attribute.key)
  if (others.length === 0 && !isDisputed) return null
  return (
    <div className="mt-1 text-sm">
      {isDisputed && <p className="font-semibold text-changes">Sources disagree about it; a moderator settles it.</p>}
      {others.length > 0 && (
        <details>
          <summary className="inline-flex min-h-8 items-center hover:text-action">
            {others.length === 1 ? 'One other source' : `${others.length} other sources`}
          </summary>
          <ol className="space-y-2 border-l-[1.5px] border-rule pl-3">
            {others.map((other, at) => (
              <li key={at} className="text-ink-soft">
                <span className="font-mono text-ink">{printValue(attribute, other.value, printer)}</span>{' '}
                {printPlusMinus(attribute, other, printer)} <SpecSource provenance={other} />
              </li>
            ))}
          </ol>
        </details>
      )}
    </div>
  )
}
