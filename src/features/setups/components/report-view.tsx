import { useEffect, useState } from 'react'
import { Link, useNavigate } from 'react-router-dom'
import { CautionBox } from '../../../components/ui/caution-box'
import { Popover } from '../../../components/ui/popover'
import { VerdictIcon } from '../../../components/ui/verdict-icon'
import { StandingCautions } from '../../../components/setup/standing-cautions'
import { EditFields } from '../../../components/setup/edit-fields'
import { findEditTarget } from '../../../components/setup/edit-target'
import { fieldId } from '../../../components/setup/field-groups'
import { writeSetupHref } from '../../../components/setup/setup-href'
import { paths } from '../../../config/paths'
import { writeSetupLink } from '#shared/schemas/setup-link'
import { keepLastSetup } from '../../../lib/last-setup'
import { verdictTextClasses, verdictWords } from '../../../lib/verdicts'
import type { SetupReport } from '../hooks/use-setup-report'
import { writeFormHref } from '../link/read-form-visit'
import { describeReport } from '../model/describe-report'
import { AssumptionList } from './assumption-list'
import { BudgetGauges } from './budget-gauges'
import { GoneList } from './gone-list'
import { ItemCard } from './item-card'
import { MissingList } from './missing-list'
import { LoadDrawings, TankDrawings } from './setup-drawings'
import { ShareBar } from './share-bar'
import { ShoppingList } from './shopping-list'
import { UndoNote } from './undo-note'

interface Editing {
  readonly path: string
  readonly anchor: Element
}

/** Cautions of several pieces alike, said once. */
function findRepeated(shown: SetupReport): ReadonlySet<string> {
  const all = shown.report.items.flatMap(({ cautions }) => cautions)
  return new Set(all.filter((caution, at) => all.indexOf(caution) !== at))
}

/** A whole setup judged: the verdict, what is missing, the drawings, the budgets, every piece, and what was assumed. */
export function ReportView({ shown }: { readonly shown: SetupReport }) {
  const navigate = useNavigate()
  const [editing, setEditing] = useState<Editing | null>(null)
  const { report, visit, plan, printer, hrefOf, nameOf } = shown
  const { raw } = visit
  const { system } = printer
  useEffect(() => keepLastSetup(writeSetupLink(Object.entries(raw), system)), [raw, system])
  const target = editing && findEditTarget(editing.path, plan)
  const formHref = writeFormHref(raw, system)
  const editHref = (path: string) =>
    `${formHref}#${fieldId(path === 'tank.chambers' ? `tank.chambers.${plan.tank.chambers.length}.lengthMm` : path)}`
  const edits = { onEdit: (path: string, anchor: Element) => setEditing({ path, anchor }), editHref }
  const repeated = findRepeated(shown)
  return (
    <>
      <h1 className="break-words">{raw.name ?? 'Your setup'}</h1>
      <div className="mt-3 flex items-start gap-3">
        <VerdictIcon verdict={report.verdict} size={32} isDecorative />
        <p className="max-w-prose text-lg">
          <strong className={verdictTextClasses[report.verdict]}>{verdictWords[report.verdict]}.</strong>{' '}
          {describeReport(report)}
        </p>
      </div>
      <ShareBar href={hrefOf(raw)} formHref={formHref} />
      <UndoNote shown={shown} />
      <section className="mt-10">
        <h2>What is missing</h2>
        <div className="mt-2">
          <MissingList shown={shown} />
        </div>
      </section>
      <GoneList shown={shown} />
      <section className="mt-10">
        <h2>The tank</h2>
        <p className="mt-1 flex flex-wrap items-baseline justify-between gap-x-6 gap-y-1">
          <span>
            {nameOf('tank')}: {printer.volume(plan.tank.ratedL)}
          </span>
          <Link to={writeSetupHref(paths.swap('tank'), raw, system)} className="link text-sm print:hidden">
            The tank is gone: what replaces it?
          </Link>
        </p>
        <div className="mt-3">
          <TankDrawings shown={shown} {...edits} />
        </div>
      </section>
      <section className="mt-10">
        <h2>What it uses of what it has</h2>
        <div className="mt-4">
          <BudgetGauges shown={shown} />
        </div>
        <div className="mt-8">
          <LoadDrawings shown={shown} />
        </div>
      </section>
      <section className="mt-10">
        <h2>{report.items.length === 1 ? 'The piece in it' : `The ${report.items.length} pieces in it`}</h2>
        {report.items.length === 0 && (
          <p className="mt-2 max-w-prose text-ink-soft">
            None yet.{' '}
            <Link to={`${formHref}#gear`} className="link">
              Add what you have
            </Link>
            , and each is checked against the tank and against the others.
          </p>
        )}
        {repeated.size > 0 && (
          <div className="mt-3">
            <CautionBox title="For several of them:">{[...repeated].join(' ')}</CautionBox>
          </div>
        )}
        <ul className="mt-3 border-t border-rule">
          {report.items.map((item) => (
            <ItemCard key={item.id} item={item} shown={shown} saidAbove={repeated} />
          ))}
        </ul>
      </section>
      <section className="mt-10">
        <h2>Assumed until you say</h2>
        <p className="mt-1 max-w-prose text-sm text-ink-soft">
          Press a value to change it, or confirm it; both only change the link. What verdicts rest on comes first.
        </p>
        <div className="mt-3">
          <AssumptionList shown={shown} {...edits} />
        </div>
      </section>
      <section className="mt-10 print:break-before-page">
        <h2>Shopping list</h2>
        <div className="mt-2">
          <ShoppingList shown={shown} />
        </div>
      </section>
      <StandingCautions />
      {target && (
        <Popover anchor={editing.anchor} onClose={() => setEditing(null)} label={target.title}>
          <EditFields
            key={editing.path}
            raw={raw}
            plan={plan}
            printer={printer}
            target={target}
            onChange={(next) => void navigate(hrefOf(next), { preventScrollReset: true })}
            onDone={() => setEditing(null)}
          />
        </Popover>
      )}
    </>
  )
}
