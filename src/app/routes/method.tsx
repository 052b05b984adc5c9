import { Link } from 'react-router-dom'
import { getRules } from '#shared/engine/checks/index'
import { worksheets } from '#shared/engine/worksheets/registry'
import { getKind, kindKeys } from '#shared/kinds/index'
import { CautionBox } from '../../components/ui/caution-box'
import { paths } from '../../config/paths'
import { DefaultTable } from '../../features/method/components/default-table'
import { RuleTable } from '../../features/method/components/rule-table'
import { ThresholdTable } from '../../features/method/components/threshold-table'
import { VerdictTable } from '../../features/method/components/verdict-table'
import type { Page } from '../page-route'

function MethodPage() {
  return (
    <>
      <h1>How every answer is made</h1>
      <p className="mt-3 max-w-prose">
        This page is printed from the tables that the answers are computed with. A rule that is not here is not applied.
      </p>
      <section className="mt-10">
        <h2>The four verdicts</h2>
        <VerdictTable />
      </section>
      <section className="mt-12">
        <h2>Checks, kind by kind</h2>
        {kindKeys.map((kind) => (
          <section key={kind} id={kind} className="mt-6">
            <h3 className="font-heading text-lg font-bold first-letter:uppercase">{getKind(kind).plural}</h3>
            <div className="mt-2">
              <RuleTable kind={kind} rules={getRules(kind).rules} />
            </div>
          </section>
        ))}
      </section>
      <section className="mt-12">
        <h2>Worksheets</h2>
        <p className="mt-2 max-w-prose">
          Every calculation by itself, with the formula, your numbers put in, and its source.
        </p>
        <ul className="mt-2 list-disc space-y-1 pl-5">
          {worksheets.map(({ name, title }) => (
            <li key={name}>
              <Link to={paths.worksheet(name)} className="link">
                {title}
              </Link>
            </li>
          ))}
        </ul>
      </section>
      <section className="mt-12">
        <h2>Numbers that decide</h2>
        <ThresholdTable />
      </section>
      <section className="mt-12">
        <h2>What is assumed until you say</h2>
        <DefaultTable />
      </section>
      <section className="mt-12 space-y-3">
        <h2>Cautions</h2>
        <CautionBox title="Mains and salt water.">
          Residual-current (ground-fault) protection, drip loops, no overloaded strips; local electrical codes and
          licensed electricians decide.
        </CautionBox>
        <CautionBox title="Weight.">
          Weight and floor load are information. A structural engineer and local building rules decide for anything
          large or upstairs.
        </CautionBox>
        <CautionBox title="Heaters fail.">
          The temperature that a stuck-on heater would reach is shown; a second, independent cut-off is advised.
        </CautionBox>
        <CautionBox title="Estimates.">
          Light and heat figures come from models with stated assumptions. Measure before trusting livestock to them;
          its welfare comes first.
        </CautionBox>
      </section>
    </>
  )
}

export const page: Page = {
  Component: MethodPage,
  head: () => ({
    title: 'Method',
    description:
      'Every check, threshold, formula basis, default and source behind the answers, printed from the tables they are computed with.',
    canonical: paths.method,
  }),
}
