import { Link } from 'react-router-dom'
import { EditLink } from '../../../components/setup/edit-link'
import { listAssumed } from '../../../components/setup/assumed'
import { changeRaw } from '../../../components/setup/edit-raw'
import { Disclosure } from '../../../components/ui/disclosure'
import type { SetupReport } from '../hooks/use-setup-report'
import { capitalise } from '../../../lib/capitalise'

export interface AssumptionListProps {
  readonly shown: SetupReport
  readonly onEdit: (path: string, target: Element) => void
  readonly editHref: (path: string) => string
}

const shownAtOnce = 8
/** Everything that was assumed, what verdicts rest on first; each is confirmed or changed with one press. */
export function AssumptionList({ shown, onEdit, editHref }: AssumptionListProps) {
  const { plan, printer, report, visit, hrefOf } = shown
  const telling = new Set(report.items.flatMap(({ checks }) => checks.flatMap(({ assumed = [] }) => assumed)))
  const all = listAssumed(plan, printer, telling)
  if (all.length === 0) return <p>Nothing: you have said everything that a check asks.</p>
  const toLine = ({ path, label, shown: text, exact }: (typeof all)[number]) => {
    const isPair = path === 'goals.turnoverPerHour'
    const [from = '', to = ''] = exact.split(',')
    const confirmed = isPair ? { [`${path}.0`]: from, [`${path}.1`]: to } : { [path]: exact }
    return (
      <li
        key={path}
        className="grid grid-cols-[minmax(0,1fr)_auto] items-baseline gap-x-3 border-b border-rule py-1.5 text-sm"
      >
        <span className="min-w-0">{capitalise(label)}</span>
        <EditLink
          href={editHref(path)}
          name={`${capitalise(label)}, ${text}, assumed: change`}
          path={path}
          onEdit={(anchor) => onEdit(path, anchor)}
          className="assumed min-h-6 text-right font-mono text-[0.94em] text-action"
        >
          {text}
        </EditLink>
        <Link
          to={hrefOf(changeRaw(visit.raw, confirmed))}
          preventScrollReset
          aria-label={`That is right: ${label}, ${text}`}
          className="link col-start-2 min-h-6 justify-self-end print:hidden"
        >
          That is right
        </Link>
      </li>
    )
  }
  const [first, rest] = [all.slice(0, shownAtOnce), all.slice(shownAtOnce)]
  return (
    <>
      <ul className="gap-x-8 md:columns-2 [&>li]:break-inside-avoid">{first.map(toLine)}</ul>
      {rest.length > 0 && (
        <Disclosure summary={`${rest.length} more`}>
          <ul className="gap-x-8 md:columns-2 [&>li]:break-inside-avoid">{rest.map(toLine)}</ul>
        </Disclosure>
      )}
    </>
  )
}
