import { Gauge } from '../../../components/drawings/gauge'
import type { SetupReport } from '../hooks/use-setup-report'
import { listBudgets } from '../model/list-budgets'

/** What the whole setup uses of what it has, each on the same gauge. */
export function BudgetGauges({ shown }: { readonly shown: SetupReport }) {
  const { report, printer, nameOf } = shown
  return (
    <ul className="grid gap-x-8 gap-y-6 sm:grid-cols-2 lg:grid-cols-3">
      {listBudgets(report, nameOf).map(({ key, message, ...gauge }) => (
        <li key={key} className="min-w-0">
          <h3 className="font-heading font-bold break-words">{gauge.label}</h3>
          <div className="mt-2">
            <Gauge {...gauge} min={0} printer={printer} />
          </div>
          <p className="mt-1 text-sm text-ink-soft">{message}</p>
        </li>
      ))}
    </ul>
  )
}
