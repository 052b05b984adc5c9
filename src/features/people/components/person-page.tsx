import { Link } from 'react-router-dom'
import { getAttribute, isKindKey } from '#shared/kinds/index'
import { printValue } from '#shared/kinds/print-value'
import type { Person } from '#shared/schemas/people'
import { EmptyState } from '../../../components/ui/empty-state'
import { paths } from '../../../config/paths'
import { printDate } from '../../../lib/print-date'
import { usePrinter } from '../../../lib/use-printer'

type Measured = Person['recent'][number]

function Measurement({ measured }: { readonly measured: Measured }) {
  const printer = usePrinter()
  const { gear, key, value, at, revision } = measured
  const attribute = isKindKey(gear.kind) ? getAttribute(gear.kind, key) : undefined
  return (
    <li className="grid gap-x-6 py-3 sm:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_auto]">
      <Link to={paths.gear(gear.slug)} className="link inline-block min-h-6 font-semibold">
        {gear.brand} {gear.model}
      </Link>
      <p>
        {attribute?.label ?? key}
        {attribute && <span className="font-mono"> {printValue(attribute, value, printer)}</span>}
      </p>
      <p className="font-mono text-xs leading-6 text-ink-soft">
        revision {revision}, {printDate(at)}
      </p>
    </li>
  )
}

function Count({ value, label }: { readonly value: number; readonly label: string }) {
  return (
    <div className="flex flex-col-reverse">
      <dt className="text-sm text-ink-soft">{label}</dt>
      <dd className="font-mono text-2xl">{value}</dd>
    </div>
  )
}

/** What everybody may see of somebody. */
export function PersonPage({ person }: { readonly person: Person }) {
  const { name, role, since, isDemo, accepted, recent, can } = person
  return (
    <>
      <h1 className="[overflow-wrap:anywhere]">{name}</h1>
      <p className="mt-1 text-ink-soft">
        {role === 'member' ? 'Contributes' : `Contributes, ${role}`} since {printDate(since)}
        {isDemo && '. An invented person of the demo data'}
      </p>
      {can.administer && (
        <p className="mt-3">
          <Link to={`${paths.admin}?q=${encodeURIComponent(name)}`} className="link inline-block min-h-6">
            Look after this account
          </Link>
        </p>
      )}
      <dl className="mt-6 flex flex-wrap gap-x-10 gap-y-4">
        <Count value={accepted.revisions} label="accepted revisions" />
        <Count value={accepted.pieces} label="pieces of gear" />
        <Count value={accepted.measured} label="measured values" />
      </dl>
      <h2 className="mt-10">Newest measurements</h2>
      {recent.length === 0 ? (
        <div className="mt-4">
          <EmptyState title="Nothing measured yet">What {name} measures shows here once it is accepted.</EmptyState>
        </div>
      ) : (
        <ul className="mt-2 divide-y divide-rule">
          {recent.map((measured) => (
            <Measurement key={`${measured.gear.slug} ${measured.revision} ${measured.key}`} measured={measured} />
          ))}
        </ul>
      )}
    </>
  )
}
