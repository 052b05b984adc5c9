import type { Printer } from '#shared/units/print'
import type { Worksheet, Working } from '#shared/engine/worksheets/types'
import { printStepValue } from '../model/print-result'

export interface SheetStepsProps {
  readonly sheet: Worksheet
  readonly working: Working
  readonly printer: Printer
}

const bases = { physics: 'Computed', standard: 'Standard', practice: 'Common practice' } as const

/** The working: each formula, the numbers put in, and where it is from. */
export function SheetSteps({ sheet, working, printer }: SheetStepsProps) {
  const { basis } = sheet
  return (
    <section aria-labelledby="sheet-steps">
      <h2 id="sheet-steps">The working</h2>
      <p className="mt-1 max-w-prose text-sm text-ink-soft">
        Formulas are in SI units{printer.system === 'us' ? '; each value is in yours beside it' : ''}.{' '}
        {bases[basis.type]}: {basis.source}.
      </p>
      <ol className="mt-3">
        {working.steps.map((step) => (
          <li key={step.title} className="border-t border-rule py-3">
            <p className="flex flex-wrap justify-between gap-x-6">
              <strong className="font-semibold">{step.title}</strong>
              <span className="ml-auto text-right font-mono font-semibold">{printStepValue(step, printer)}</span>
            </p>
            <p className="mt-1 text-sm break-words text-ink-soft">{step.formula}</p>
            <p className="mt-1 font-mono text-sm break-words">{step.text}</p>
            {step.source && <p className="mt-1 text-xs text-ink-soft">{step.source}</p>}
          </li>
        ))}
      </ol>
    </section>
  )
}
