import { Link } from 'react-router-dom'
import type { Attribute } from '#shared/kinds/types'
import type { Provenance } from '#shared/schemas/gear'
import type { Printer } from '#shared/units/print'
import { paths } from '../../../config/paths'
import { apiBase } from '../../../lib/api-client'
import { printDate } from '../../../lib/print-date'

const sources = { measured: 'measured', maker: 'its maker’s figure', estimate: 'an estimate' } as const
const formerMember = 'a former member'

export function printPlusMinus(attribute: Attribute, { plusMinus }: Provenance, printer: Printer): string | null {
  if (attribute.type !== 'measure' || plusMinus === undefined) return null
  return `± ${printer.difference(plusMinus, attribute.unit)}`
}

/** Whoever measured it, with the way to what else they did. What was imported has a name alone. */
function Author({ provenance: { author, reviewer } }: { readonly provenance: Provenance }) {
  if (reviewer === undefined || author === formerMember) return author
  return (
    <Link to={paths.person(author)} className="link">
      {author}
    </Link>
  )
}

function Files({ files = [] }: Pick<Provenance, 'files'>) {
  if (files.length === 0) return null
  return (
    <span className="mt-1 flex flex-wrap gap-2 print:hidden">
      {files.map(({ id, kind, caption }, at) => {
        const href = `${apiBase}/evidence/${encodeURIComponent(id)}`
        return (
          <a key={id} href={href} className="link" target="_blank" rel="noopener">
            {kind === 'photo' ? (
              <img
                src={`${href}/thumbnail`}
                alt={caption ?? `Photo ${at + 1} that backs it`}
                width={64}
                height={48}
                loading="lazy"
                className="h-12 w-16 border border-rule object-cover"
              />
            ) : (
              (caption ?? 'document (PDF)')
            )}
          </a>
        )
      })}
    </span>
  )
}

/** Who says so, since when, and what backs it. */
export function SpecSource({ provenance }: { readonly provenance: Provenance | undefined }) {
  if (!provenance) return <span>source not recorded</span>
  const { source, evidence, date, files } = provenance
  return (
    <>
      <strong className="font-semibold text-ink">{sources[source]}</strong>, {printDate(date)},{' '}
      <Author provenance={provenance} />
      {evidence !== undefined && <span className="block break-words">{evidence}</span>}
      <Files files={files} />
    </>
  )
}
