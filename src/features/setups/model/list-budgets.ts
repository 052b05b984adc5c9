import type { Check, Outcome, Report } from '#shared/engine/types'
import { findScaleUnit } from '../../../components/drawings/scale-unit'
import type { CanonicalUnit } from '#shared/units/units'

/** One thing that the setup uses of what it has, ready for a gauge. */
export interface BudgetLine {
  readonly key: string
  readonly label: string
  readonly unit: CanonicalUnit
  readonly value: number
  readonly limit: Check['limit']
  readonly margin: number | null
  readonly outcome: Outcome
  readonly message: string
}

const labels: Readonly<Record<string, string>> = {
  plugs: 'Plugs and outlets',
  powerW: 'Power without pause',
  heatW: 'Heat on the coldest night',
  massKg: 'Filled weight',
  floorKPa: 'Pressure on the floor',
}

/** Checks that judge what a budget adds up: where one of them refuses, the budget does not call it a mere change. */
const judgedBy: Readonly<Record<string, string>> = { massKg: 'stand.load', heatW: 'heater.power' }

/** Budgets in the order in which they are asked about, then what each pump moves. */
export function listBudgets({ budgets, items }: Report, nameOf: (id: string) => string): readonly BudgetLine[] {
  const summed = Object.keys(labels).flatMap((key): BudgetLine[] => {
    const budget = budgets[key]
    if (!budget) return []
    const { used, limit, unit, message } = budget
    const isKept = limit === null || used <= limit
    const isRefused = items.some(({ checks }) =>
      checks.some(({ id, outcome }) => id === judgedBy[key] && outcome === 'fail'),
    )
    return [
      {
        key,
        label: labels[key] ?? key,
        unit: findScaleUnit(unit),
        value: used,
        limit,
        margin: limit === null || limit === 0 ? null : (limit - used) / limit,
        outcome: isKept ? 'pass' : isRefused ? 'fail' : 'change',
        message,
      },
    ]
  })
  const flows = items.flatMap(({ id, checks }) =>
    checks.flatMap(({ id: check, unit, measured, limit, margin, outcome, message }): BudgetLine[] =>
      check.endsWith('.flow') && typeof measured === 'number'
        ? [
            {
              key: `${id} ${check}`,
              label: `Flow: ${nameOf(id)}`,
              unit: findScaleUnit(unit),
              value: measured,
              limit,
              margin,
              outcome,
              message,
            },
          ]
        : [],
    ),
  )
  return [...summed, ...flows]
}
