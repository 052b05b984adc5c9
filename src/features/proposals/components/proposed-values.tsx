import { getKind, isKindKey } from '#shared/kinds/index'
import { printValue } from '#shared/kinds/print-value'
import type { Attribute } from '#shared/kinds/types'
import type { Proposal } from '#shared/schemas/proposals'
import type { Printer } from '#shared/units/print'
import { printDate } from '../../../lib/print-date'

const sourceWords = { measured: 'measured', maker: 'its maker’s figure', estimate: 'an estimate' } as const
const stateWords = {
  change: null,
  conflict: 'Somebody else changed this since. The moderator chooses between the two.',
  settled: 'On record already.',
  shadowed: 'Kept as a further source: a better one is in use.',
} as const

interface RowProps {
  readonly attribute: Attribute
  readonly proposal: Proposal
  readonly printer: Printer
}

function ValueRow({ attribute, proposal, printer }: RowProps) {
  const { key, label } = attribute
  const proposed = proposal.values[key] ?? null
  const field = proposal.fields[key]
  const decided = proposal.decision?.fields[key]
  const show = (value: unknown) =>
    value === undefined || value === null ? 'not known' : printValue(attribute, value, printer)
  const flags = proposal.flags.filter(({ path }) => path.split('.')[0] === key)
  const state = field && stateWords[field.state]
  return (
    <div className="grid gap-x-6 gap-y-1 border-t border-rule py-3 sm:grid-cols-[minmax(0,14rem)_minmax(0,1fr)]">
      <dt className="font-semibold first-letter:uppercase">{label}</dt>
      <dd className="min-w-0">
        <span className="font-mono text-[0.94em]">
          {field?.base && (
            <>
              <span className="sr-only">from </span>
              <span className="text-ink-soft">{show(field.base.value)}</span> <span aria-hidden="true">→</span>{' '}
              <span className="sr-only">to </span>
            </>
          )}
          <strong className="font-semibold">{proposed === null ? 'taken away' : show(proposed.value)}</strong>
          {proposed?.plusMinus !== undefined && attribute.type === 'measure' && (
            <> ± {printer.difference(proposed.plusMinus, attribute.unit)}</>
          )}
        </span>
        {proposed && (
          <span className="block text-sm text-ink-soft">
            {proposed.raw !== undefined && <>typed as “{proposed.raw}”, </>}
            {sourceWords[proposed.source]}, {printDate(proposed.date)}
            {proposed.evidence !== undefined && <>: {proposed.evidence}</>}
          </span>
        )}
        {flags.map(({ path, rule, reason }) => (
          <span key={`${path} ${rule}`} className="block text-sm">
            Looked unlikely. {reason === null ? 'No reason was given.' : `You wrote: ${reason}`}
          </span>
        ))}
        {state && proposal.decision?.decision !== 'approve' && (
          <span className="block text-sm font-semibold">{state}</span>
        )}
        {decided && (
          <span className="block text-sm font-semibold">
            {decided.decision === 'approve' ? 'Taken over.' : `Not taken over: ${decided.words ?? 'no reason given'}`}
          </span>
        )}
      </dd>
    </div>
  )
}

const identityLabels = {
  brand: 'brand',
  model: 'model',
  status: 'status',
  gtin: 'barcode number (GTIN)',
  notes: 'notes',
} as const

/** What is proposed: beside it what it was changed from, what backs it, and what became of it. */
export function ProposedValues({ proposal, printer }: { readonly proposal: Proposal; readonly printer: Printer }) {
  const attributes = isKindKey(proposal.kind)
    ? getKind(proposal.kind).attributes.filter(({ key }) => key in proposal.values)
    : []
  const identity = Object.entries(proposal.identity) as [keyof typeof identityLabels, string | null][]
  return (
    <dl>
      {identity.map(([key, text]) => (
        <div
          key={key}
          className="grid gap-x-6 gap-y-1 border-t border-rule py-3 sm:grid-cols-[minmax(0,14rem)_minmax(0,1fr)]"
        >
          <dt className="font-semibold first-letter:uppercase">{identityLabels[key]}</dt>
          <dd className="min-w-0 break-words">{text === null ? 'taken away' : text.replace(/<[^>]*>/g, ' ').trim()}</dd>
        </div>
      ))}
      {attributes.map((attribute) => (
        <ValueRow key={attribute.key} attribute={attribute} proposal={proposal} printer={printer} />
      ))}
    </dl>
  )
}
