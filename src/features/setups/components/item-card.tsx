import { Link } from 'react-router-dom'
import type { ItemReport } from '#shared/engine/types'
import { getKind } from '#shared/kinds/index'
import { CautionList } from '../../../components/setup/caution-list'
import { CheckList } from '../../../components/setup/check-list'
import { writeWorkingHref } from '../../../components/setup/working-href'
import { DecidingGauge } from '../../../components/setup/deciding-gauge'
import { findDecidingCheck } from '../../../components/setup/deciding-check'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { VerdictBadge } from '../../../components/ui/verdict-badge'
import { buttonClass } from '../../../components/ui/button-class'
import { paths } from '../../../config/paths'
import { describeSpecs } from '../../../lib/describe-specs'
import type { SetupReport } from '../hooks/use-setup-report'
import { MissingMeasures } from './missing-measures'

export interface ItemCardProps {
  readonly item: ItemReport
  readonly shown: SetupReport
  /** Said above for all. */
  readonly saidAbove: ReadonlySet<string>
}

/** One piece with its verdict, what it asks for, and every check behind that. */
export function ItemCard({ item, shown, saidAbove }: ItemCardProps) {
  const { id, kind, gear, verdict, checks, quantity, specs } = item
  const { nameOf, plan, printer, visit } = shown
  const asks = checks.filter(({ outcome }) => outcome !== 'pass')
  const deciding = findDecidingCheck(checks)
  const bare = Object.fromEntries(Object.entries(specs).map(([key, value]) => [key, value?.value]))
  const about = describeSpecs(kind, bare, printer)
  const cautions = item.cautions.filter((caution) => !saidAbove.has(caution))
  const goneHref = writeSetupHref(paths.swap(id), { ...visit.raw, [`items.${id}.state`]: 'gone' }, printer.system)
  return (
    <li id={`item-${id}`} className="border-b border-rule py-5">
      <article className="grid gap-x-6 gap-y-3 md:grid-cols-[minmax(0,1fr)_13rem]">
        <div className="min-w-0">
          <h3 className="font-heading text-lg leading-snug font-bold">
            {quantity > 1 && `${quantity} × `}
            {gear ? (
              <Link to={paths.gear(gear.slug)} className="underline-offset-4 hover:text-action hover:underline">
                {nameOf(id)}
              </Link>
            ) : (
              nameOf(id)
            )}
          </h3>
          <p className="text-sm text-ink-soft">
            {[gear && getKind(kind).label, about].filter(Boolean).join(': ') || 'Nothing is said of it.'}
          </p>
          <p className="mt-1">
            <VerdictBadge verdict={verdict} />
          </p>
          {asks.length > 0 && (
            <ul className="mt-1 list-disc space-y-0.5 pl-5">
              {asks.map(({ id: check, message }) => (
                <li key={check}>{message}</li>
              ))}
            </ul>
          )}
          <CautionList cautions={cautions} />
          <MissingMeasures kind={kind} checks={asks.filter(({ outcome }) => outcome === 'nodata')} />
        </div>
        <div className="flex min-w-0 flex-col items-start gap-3">
          {deciding && (
            <div className="w-full">
              <DecidingGauge check={deciding} printer={printer} />
            </div>
          )}
          <Link
            to={goneHref}
            aria-label={`It is gone: what replaces ${nameOf(id)}?`}
            className={`print:hidden ${buttonClass({ size: 'sm' })}`}
          >
            It is gone
          </Link>
        </div>
      </article>
      <div className="mt-3 print:hidden">
        <CheckList
          checks={checks}
          plan={plan}
          printer={printer}
          workingHrefOf={(check) => writeWorkingHref(check, visit.raw, printer.system, { item: id })}
        />
      </div>
    </li>
  )
}
