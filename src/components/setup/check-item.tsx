import { Link } from 'react-router-dom'
import { labelSetupPath } from '#shared/engine/assumptions'
import type { Plan } from '#shared/engine/setup/plan'
import type { Check } from '#shared/engine/types'
import type { Printer } from '#shared/units/print'
import { Gauge } from '../drawings/gauge'
import { findScaleUnit } from '../drawings/scale-unit'
import { sayCloseCall } from './say-close-call'
import { VerdictIcon } from '../ui/verdict-icon'
import { outcomeVerdicts, verdictTextClasses } from '../../lib/verdicts'

export interface CheckItemProps {
  readonly check: Check
  readonly plan: Plan
  readonly printer: Printer
  /** Drawn once its list is open: a closed list of gauges weighs more than the page around it. */
  readonly hasGauge: boolean
  /** Where its numbers are worked out, if they are. */
  readonly workingHref?: string | undefined
}

const bases = { physics: 'Computed', standard: 'Standard', practice: 'Practice' } as const
const outcomeWords = { pass: 'passes', change: 'needs a change', fail: 'fails', nodata: 'not enough data' } as const

/** One check in full: what was measured, the limit, where the rule is from, and what it rests on. */
export function CheckItem({ check, plan, printer, hasGauge, workingHref }: CheckItemProps) {
  const { label, outcome, measured, limit, unit, margin, message, basis, assumed = [] } = check
  const note = sayCloseCall(check)
  const canonical = findScaleUnit(unit)
  const isDrawn = typeof measured === 'number' && limit !== null
  const limitText =
    limit === null
      ? null
      : typeof limit === 'number'
        ? printer.measure(limit, canonical)
        : printer.pair(limit, canonical)
  return (
    <li className="grid gap-x-6 gap-y-2 border-t border-rule py-3 md:grid-cols-[minmax(0,1fr)_16rem]">
      <div className="min-w-0 text-sm">
        <p className="flex flex-wrap items-center gap-x-2">
          <VerdictIcon verdict={outcomeVerdicts[outcome]} size={15} isDecorative />
          <strong>{label}</strong>
          <span className={`font-semibold ${verdictTextClasses[outcomeVerdicts[outcome]]}`}>
            {outcomeWords[outcome]}
          </span>
        </p>
        <p className="mt-1">{message}</p>
        {isDrawn && (
          <p className="mt-1 font-mono text-xs text-ink-soft">
            measured {printer.measure(measured, canonical)} · limit {limitText}
            {note !== undefined && ` · ${note}`}
          </p>
        )}
        <p className="mt-1 text-xs text-ink-soft">
          {bases[basis.type]}: {basis.source}
        </p>
        {workingHref !== undefined && outcome !== 'nodata' && (
          <p className="mt-1 text-xs print:hidden">
            <Link
              to={workingHref}
              aria-label={`Show the working: ${label}`}
              className="link inline-block min-h-6 py-0.5"
            >
              Show the working
            </Link>
          </p>
        )}
        {assumed.length > 0 && (
          <p className="mt-1 text-xs text-ink-soft">
            Rests on what is assumed: {assumed.map((path) => labelSetupPath(path, plan)).join(', ')}.
          </p>
        )}
      </div>
      {isDrawn && hasGauge && (
        <Gauge
          label={label}
          unit={canonical}
          printer={printer}
          value={measured}
          limit={limit}
          margin={margin}
          outcome={outcome}
          note={note}
        />
      )}
    </li>
  )
}
