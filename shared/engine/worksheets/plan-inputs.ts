import { listAssumptions } from '../assumptions'
import { hasAreas } from '../checks/shape'
import { findContradictions } from '../setup/contradictions'
import type { Plan } from '../setup/plan'
import { resolve } from '../setup/resolve'
import type { Assumption, Setup } from '../types'
import type { Printer } from '../../units/print'
import type { Refused, WorksheetField } from './types'

const refuse = (path: string, detail: string): Refused => ({ ok: false, problems: [{ path, detail }] })

/** The setup with its defaults, or what is wrong with it: by the worksheet's own fields where it asks for the same. */
export function planInputs(setup: Setup, words: Printer, fields: readonly WorksheetField[] = []): Plan | Refused {
  const ownPath = (path: string) => fields.find(({ setupPath }) => setupPath === path)?.path ?? path
  const problems = findContradictions({ ...setup, units: words.system })
  if (problems.length > 0)
    return { ok: false, problems: problems.map(({ path, detail }) => ({ path: ownPath(path), detail })) }
  const plan = resolve(setup)
  if (!hasAreas(plan))
    return refuse('tank.shape', `Areas of a ${plan.tank.shape.replaceAll('-', ' ')} tank cannot be computed yet.`)
  return plan
}

export const isPlan = (found: Plan | Refused): found is Plan => 'tank' in found

/** The defaults that a worksheet's result rests on, by the beginnings of their paths, under the worksheet's own names. */
export function listUsed(
  plan: Plan,
  uses: readonly string[],
  words: Printer,
  fields: readonly WorksheetField[] = [],
): readonly Assumption[] {
  return listAssumptions(plan, words)
    .filter(({ key }) => uses.some((path) => key === path || key.startsWith(`${path}.`)))
    .map((one) => ({ ...one, key: fields.find(({ setupPath }) => setupPath === one.key)?.path ?? one.key }))
}

/** A worksheet's own default, said as the setup's are. */
export const assume = (key: string, value: number | string | boolean, label: string, printed: string): Assumption => ({
  key,
  value,
  message: `${label}: ${printed}, assumed.`,
})
