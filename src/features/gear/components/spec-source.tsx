import type { Attribute } from '#shared/kinds/types'
import type { Provenance } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { printDate } from '../../../lib/print-date'

const sources = { measured: 'measured', maker: 'its maker’s figure', estimate: 'an estimate' } as const

export function printPlusMinus(attribute: Attribute, { plusMinus }: Provenance, printer: Printer): string | null {
  if (attribute.type !== 'measure' || plusMinus === undefined) return null
  return `± ${printer.difference(plusMinus, attribute.unit)}`
}

/** Who says so, since when, and what backs it. */
export function SpecSource({ provenance }: { readonly provenance: Provenance | undefined }) {
  if (!provenance) return <span>source not recorded</span>
  const { source, evidence, date, author } = provenance
  return (
    <>
      <strong className="font-semibold text-ink">{sources[source]}</strong>, {printDate(date)}, {author}
      {evidence !== undefined && <span className="block break-words">{evidence}</span>}
    </>
  )
}
