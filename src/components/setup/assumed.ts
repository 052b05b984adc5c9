import { labelSetupPath, printSetupValue } from '#shared/engine/assumptions'
import type { Plan } from '#shared/engine/setup/plan'
import { findSetupField } from '#shared/kinds/setup-fields'
import type { Printer } from '#shared/units/print'

export interface Assumed {
  readonly path: string
  readonly label: string
  readonly shown: string
  /** As it would be typed to say the same. */
  readonly exact: string
}

/** What stands in for a field that nobody filled; undefined where nothing does. */
export function readAssumed(path: string, plan: Plan, printer: Printer): Assumed | undefined {
  const value = plan.assumed.get(path)
  if (value === undefined) return undefined
  const attribute = findSetupField(path)?.attribute
  const shown = printSetupValue(path, value, printer) ?? String(value)
  const exact =
    attribute?.type === 'measure' && typeof value === 'number'
      ? printer.measure(value, attribute.unit, { exact: true })
      : Array.isArray(value)
        ? value.join(',') || 'none'
        : typeof value === 'boolean'
          ? value
            ? 'yes'
            : 'no'
          : String(value)
  return { path, label: labelSetupPath(path, plan), shown, exact }
}

/** Everything assumed, those first that some answer rests on. */
export function listAssumed(plan: Plan, printer: Printer, telling: ReadonlySet<string>): readonly Assumed[] {
  const all = [...plan.assumed.keys()].flatMap((path) => readAssumed(path, plan, printer) ?? [])
  const weigh = ({ path }: Assumed) => (telling.has(path) ? 0 : 1)
  return all.toSorted((a, b) => weigh(a) - weigh(b))
}
