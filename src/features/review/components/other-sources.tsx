import { printValue } from '#shared/kinds/print-value'
import type { Attribute } from '#shared/kinds/types'
import type { SourceOfValue } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { Disclosure } from '../../../components/ui/disclosure'
import { printDate } from '../../../lib/print-date'
import { sourceWords } from '../../../lib/source-words'
import { FieldBacking } from './field-backing'

export interface OtherSourcesProps {
  readonly attribute: Attribute
  readonly sources: readonly SourceOfValue[]
  readonly printer: Printer
}

/** Everything that is on record about a value, the source in use first. */
export function OtherSources({ attribute, sources, printer }: OtherSourcesProps) {
  if (sources.length === 0) return null
  return (
    <div className="mt-3">
      <Disclosure summary={`${sources.length} sources on record`}>
        <ul className="space-y-2 text-sm">
          {sources.map((source) => (
            <li key={`${source.revision} ${source.author}`}>
              <span className="font-mono">{printValue(attribute, source.value, printer)}</span>{' '}
              {source.isUsed && <strong className="font-semibold">in use</strong>}
              <span className="block text-ink-soft">
                {sourceWords[source.source]}, {printDate(source.date)}, {source.author}, revision {source.revision}
              </span>
              <FieldBacking evidence={source.evidence} files={source.files ?? []} of={attribute.label} />
            </li>
          ))}
        </ul>
      </Disclosure>
    </div>
  )
}
